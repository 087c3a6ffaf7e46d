import { rackKind, rackOrder, rackState, type RackOrder, type RackState } from '#shared/schemas/rack.ts';
import type { StockKind } from '#shared/schemas/stock-piece.ts';

/** What of the rack is looked at, and in which order. It stands in the page's address. */
export interface RackView {
  search: string;
  state: RackState;
  kind: StockKind | null;
  order: RackOrder;
  direction: 'asc' | 'desc';
}

export function viewOf(params: URLSearchParams): RackView {
  const state = rackState.safeParse(params.get('state'));
  const kind = rackKind.safeParse(params.get('kind'));
  const order = rackOrder.safeParse(params.get('order'));
  return {
    search: params.get('search') ?? '',
    state: state.data ?? 'onRack',
    kind: kind.data ?? null,
    order: order.data ?? 'number',
    direction: params.get('direction') === 'desc' ? 'desc' : 'asc',
  };
}

/** The address of a view, which the server is asked by too; what is as usual is left out. */
export function paramsOf({ search, state, kind, order, direction }: RackView): URLSearchParams {
  const params = new URLSearchParams();
  if (search !== '') params.set('search', search);
  if (state !== 'onRack') params.set('state', state);
  if (kind !== null) params.set('kind', kind);
  if (order !== 'number') params.set('order', order);
  if (direction !== 'asc') params.set('direction', direction);
  return params;
}

/** Another press on the same heading turns the order round. */
export function orderedBy(view: RackView, order: RackOrder): RackView {
  const turned = view.direction === 'asc' ? 'desc' : 'asc';
  return { ...view, order, direction: view.order === order ? turned : 'asc' };
}
