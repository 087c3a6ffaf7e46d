import { Select } from '#client/components/ui/select.tsx';
import { TextField } from '#client/components/ui/text-field.tsx';
import { rackOrder, rackState } from '#shared/schemas/rack.ts';
import { stockKind } from '#shared/schemas/stock-piece.ts';
import type { RackView } from './rack-view.ts';
import { KIND_WORDS, STATE_WORDS } from './words.ts';

const STATES = rackState.options.map((value) => ({
  value,
  label: value === 'onRack' ? 'On the rack' : STATE_WORDS[value],
}));
const KINDS = [
  { value: '', label: 'All kinds' },
  ...stockKind.options.map((value) => ({ value, label: KIND_WORDS[value] })),
];
const ORDERS: Record<RackView['order'], [asc: string, desc: string]> = {
  number: ['Number, oldest first', 'Number, newest first'],
  material: ['Material, A to Z', 'Material, Z to A'],
  density: ['Density, lightest first', 'Density, heaviest first'],
  mass: ['Mass, lightest first', 'Mass, heaviest first'],
  length: ['Length, shortest first', 'Length, longest first'],
  thickness: ['Thickness, thinnest first', 'Thickness, thickest first'],
};
const ORDER_OPTIONS = rackOrder.options.flatMap((order) => [
  { value: `${order} asc`, label: ORDERS[order][0] },
  { value: `${order} desc`, label: ORDERS[order][1] },
]);

interface RackToolsProps {
  view: RackView;
  onView: (view: RackView) => void;
}

/** What of the rack is shown, and in which order. */
export function RackTools({ view, onView }: RackToolsProps) {
  return (
    <div className="grid grid-cols-2 items-end gap-x-4 gap-y-3 sm:grid-cols-[11rem_10rem_14rem_minmax(10rem,20rem)]">
      <Select
        label="State"
        keepRoom={false}
        options={STATES}
        value={view.state}
        onValue={(value) => onView({ ...view, state: rackState.parse(value) })}
      />
      <Select
        label="Show"
        keepRoom={false}
        options={KINDS}
        value={view.kind ?? ''}
        onValue={(value) => onView({ ...view, kind: stockKind.safeParse(value).data ?? null })}
      />
      <Select
        label="Order"
        keepRoom={false}
        options={ORDER_OPTIONS}
        value={`${view.order} ${view.direction}`}
        onValue={(value) => {
          const [order, direction] = value.split(' ');
          onView({
            ...view,
            order: rackOrder.parse(order),
            direction: direction === 'desc' ? 'desc' : 'asc',
          });
        }}
      />
      <TextField
        label="Material, note or number"
        type="search"
        keepRoom={false}
        value={view.search}
        onChange={(event) => onView({ ...view, search: event.target.value })}
      />
    </div>
  );
}
