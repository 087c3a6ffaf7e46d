import { useUnits } from '#client/lib/units.ts';

interface StationPickerProps {
  station: number;
  /** stations of the ribs, root to tip */
  ribs: readonly number[];
  length: number;
  onStation: (s: number) => void;
  label: string;
}

const STEP =
  'grid min-h-row min-w-row place-items-center rounded-md text-ink hover:bg-ink-wash aria-disabled:text-graphite aria-disabled:opacity-60';
/** Nearer than this, mm, the slider falls onto a rib. */
const SNAP = 2;

/** Chooses the station: a slider that falls onto ribs, and steps from rib to rib. */
export function StationPicker({ station, ribs, length, onStation, label }: StationPickerProps) {
  const units = useUnits();
  const before = ribs.findLast((s) => s < station - 1e-6);
  const after = ribs.find((s) => s > station + 1e-6);
  const slide = (value: number) => {
    const near = ribs.find((s) => Math.abs(s - value) <= SNAP);
    const isStepOff = near !== undefined && Math.abs(near - station) < 1e-6;
    onStation(near === undefined || isStepOff ? value : near);
  };
  return (
    <span className="flex max-w-full min-w-0 items-center gap-1">
      <Step label="Rib before" to={before} onStation={onStation} sign="‹" />
      <input
        type="range"
        aria-label={label}
        aria-valuetext={`${units.format(station, 'length')} from the root`}
        min={0}
        max={Math.max(1, Math.round(length))}
        step={1}
        value={Math.round(station)}
        onChange={(event) => slide(Math.min(length, Number(event.target.value)))}
        className="h-row w-40 min-w-0 shrink accent-ink sm:w-56"
      />
      <Step label="Next rib" to={after} onStation={onStation} sign="›" />
    </span>
  );
}

interface StepProps {
  label: string;
  to: number | undefined;
  onStation: (s: number) => void;
  sign: string;
}

function Step({ label, to, onStation, sign }: StepProps) {
  return (
    <button
      type="button"
      aria-label={label}
      title={label}
      aria-disabled={to === undefined}
      onClick={() => to !== undefined && onStation(to)}
      className={STEP}
    >
      {sign}
    </button>
  );
}
