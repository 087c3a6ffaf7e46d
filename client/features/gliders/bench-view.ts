import type { ArchivedFilter, GliderDirection, GliderOrder } from '#shared/schemas/glider.ts';

/** What of the bench is looked at, and in which order. It stands in the page's address. */
export interface BenchView {
  search: string;
  sort: GliderOrder;
  direction: GliderDirection;
  archived: ArchivedFilter;
}

/** Newest changes first, names and masses from their beginning. */
const USUAL_DIRECTION: Record<GliderOrder, GliderDirection> = { changed: 'down', name: 'up', mass: 'up' };

export const BENCH_ORDERS: readonly { sort: GliderOrder; direction: GliderDirection; label: string }[] = [
  { sort: 'changed', direction: 'down', label: 'Last change, newest first' },
  { sort: 'changed', direction: 'up', label: 'Last change, oldest first' },
  { sort: 'name', direction: 'up', label: 'Name, A to Z' },
  { sort: 'name', direction: 'down', label: 'Name, Z to A' },
  { sort: 'mass', direction: 'up', label: 'Mass, lightest first' },
  { sort: 'mass', direction: 'down', label: 'Mass, heaviest first' },
];

export function viewOf(params: URLSearchParams): BenchView {
  const sort = BENCH_ORDERS.find((order) => order.sort === params.get('sort'))?.sort ?? 'changed';
  const asked = params.get('direction');
  return {
    search: params.get('search') ?? '',
    sort,
    direction: asked === 'up' || asked === 'down' ? asked : USUAL_DIRECTION[sort],
    archived: params.get('archived') === 'only' ? 'only' : 'no',
  };
}

/** The address of a view; what is as usual is left out. */
export function paramsOf({ search, sort, direction, archived }: BenchView): URLSearchParams {
  const params = new URLSearchParams();
  if (search !== '') params.set('search', search);
  if (sort !== 'changed') params.set('sort', sort);
  if (direction !== USUAL_DIRECTION[sort]) params.set('direction', direction);
  if (archived === 'only') params.set('archived', 'only');
  return params;
}

/** Another press on the same heading turns the order round. */
export function sortedBy(view: BenchView, sort: GliderOrder): BenchView {
  const turned = view.direction === 'up' ? 'down' : 'up';
  return { ...view, sort, direction: view.sort === sort ? turned : USUAL_DIRECTION[sort] };
}
