import { NumberField } from '#client/components/ui/number-field.tsx';
import { Select } from '#client/components/ui/select.tsx';
import { LIMITS } from '#shared/schemas/limits.ts';
import type { FlightDraft } from './draft.ts';
import type { ChangeDraft } from './use-draft.ts';
import { basesOf, type RangeSources, type WantedRange } from './wanted-range.ts';

const BASES: Record<WantedRange['basis'], string> = {
  plan: 'the drawing’s balance range',
  static_margin: 'a static margin',
  typed: 'two places of my own',
};
const PLACE = { min: LIMITS.coordinateMm.min, max: LIMITS.coordinateMm.max };

interface RangeStepProps {
  draft: FlightDraft;
  change: ChangeDraft;
  sources: RangeSources;
}

/** What the balance point is held against. */
export function RangeFields({ draft, change, sources }: RangeStepProps) {
  const bases = basesOf(sources);
  const basis = draft.basis !== null && bases.includes(draft.basis) ? draft.basis : bases[0];
  const { margins, typed } = draft;
  return (
    <details className="mt-1" open={basis === 'typed' || undefined}>
      <summary className="opens flex min-h-11 items-center text-note font-semibold">
        The range is {BASES[basis ?? 'typed']}
      </summary>
      <Select
        label="Hold it against"
        value={basis}
        options={bases.map((value) => ({ value, label: BASES[value] }))}
        onValue={(value) => change({ basis: bases.find((one) => one === value) ?? null })}
      />
      {basis === 'static_margin' && (
        <div className="grid grid-cols-2 gap-x-4">
          <NumberField
            label="At least"
            quantity="ratio"
            unit="percent"
            value={margins.least}
            min={-0.5}
            max={1}
            hint="of the mean chord"
            onChange={(least) => least !== null && change({ margins: { ...margins, least } })}
          />
          <NumberField
            label="At most"
            quantity="ratio"
            unit="percent"
            value={margins.most}
            min={-0.5}
            max={1}
            hint="ahead of neutral"
            onChange={(most) => most !== null && change({ margins: { ...margins, most } })}
          />
        </div>
      )}
      {basis === 'typed' && (
        <div className="grid grid-cols-2 gap-x-4">
          <NumberField
            label="Forward end"
            quantity="length"
            value={typed.from}
            {...PLACE}
            hint="aft of the datum"
            onChange={(from) => change({ typed: { ...typed, from } })}
          />
          <NumberField
            label="Aft end"
            quantity="length"
            value={typed.to}
            {...PLACE}
            hint="aft of the datum"
            error={
              typed.from !== null && typed.to !== null && typed.to < typed.from
                ? 'Lies ahead of the forward end.'
                : undefined
            }
            onChange={(to) => change({ typed: { ...typed, to } })}
          />
        </div>
      )}
    </details>
  );
}
