import { Button } from '#client/components/ui/button.tsx';
import { Select } from '#client/components/ui/select.tsx';
import { TextField } from '#client/components/ui/text-field.tsx';
import { LIMITS } from '#shared/schemas/limits.ts';
import { BENCH_ORDERS, type BenchView } from './bench-view.ts';

interface BenchToolsProps {
  view: BenchView;
  onView: (view: BenchView) => void;
  selecting: boolean;
  onSelecting: (selecting: boolean) => void;
}

const IN_USE = [
  { value: 'no', label: 'In use' },
  { value: 'only', label: 'Archived' },
] as const;

/** What of the bench is looked at, in which order, and whether several are to be picked. */
export function BenchTools({ view, onView, selecting, onSelecting }: BenchToolsProps) {
  const order = BENCH_ORDERS.findIndex(
    ({ sort, direction }) => sort === view.sort && direction === view.direction,
  );
  return (
    <>
      <div className="w-52 max-sm:w-full">
        <TextField
          label="Search by name"
          type="search"
          keepRoom={false}
          value={view.search}
          maxLength={LIMITS.name.max}
          onChange={(event) => onView({ ...view, search: event.target.value })}
        />
      </div>
      <div className="w-56 max-sm:flex-1 max-sm:basis-40">
        <Select
          label="Order"
          keepRoom={false}
          value={String(order)}
          options={BENCH_ORDERS.map(({ label }, i) => ({ value: String(i), label }))}
          onValue={(value) => {
            const chosen = BENCH_ORDERS[Number(value)];
            if (chosen) onView({ ...view, sort: chosen.sort, direction: chosen.direction });
          }}
        />
      </div>
      <div className="w-28">
        <Select
          label="Shown"
          keepRoom={false}
          value={view.archived}
          options={IN_USE}
          onValue={(value) => onView({ ...view, archived: value === 'only' ? 'only' : 'no' })}
        />
      </div>
      <Button aria-pressed={selecting} onClick={() => onSelecting(!selecting)}>
        {selecting ? 'Stop selecting' : 'Select'}
      </Button>
    </>
  );
}
