import { Button } from '#client/components/ui/button.tsx';
import { Checkbox } from '#client/components/ui/checkbox.tsx';
import { NumberField } from '#client/components/ui/number-field.tsx';
import { LIMITS } from '#shared/schemas/limits.ts';
import type { FlightDraft } from './draft.ts';
import { FingerFields } from './finger-fields.tsx';
import { Step } from './step.tsx';
import { SupportFields } from './support-fields.tsx';
import type { ChangeDraft } from './use-draft.ts';

interface WeighStepProps {
  draft: FlightDraft;
  change: ChangeDraft;
}

/** The model on its supports, or on a finger. */
export function WeighStep({ draft, change }: WeighStepProps) {
  const { kind, supports } = draft;
  const more = () =>
    change({
      supports: [
        ...supports,
        { name: `Support ${supports.length + 1}`, reading: null, tare: 0, x: null, y: 0 },
      ],
    });
  return (
    <Step title="Weigh it">
      <div role="radiogroup" aria-label="How it is weighed" className="mt-2 flex">
        {(['supports', 'finger'] as const).map((one) => (
          <button
            key={one}
            type="button"
            role="radio"
            aria-checked={kind === one}
            onClick={() => change({ kind: one })}
            className="min-h-11 flex-1 border border-ink px-3 font-semibold text-ink not-first:border-l-0 aria-checked:bg-ink aria-checked:text-on-ink"
          >
            {one === 'supports' ? 'On two supports' : 'On a finger'}
          </button>
        ))}
      </div>
      <p className="mt-2 text-note text-graphite">
        {kind === 'supports'
          ? 'Everything aboard, level fore and aft, both supports on a scale each, or one scale and a block of the same height, in turn.'
          : 'Mass on one scale; then the place under the wing at which it just tips forward, and the one at which it just tips aft.'}
      </p>
      {kind === 'supports' ? (
        <>
          {supports.map((one, i) => (
            <SupportFields
              key={i}
              support={one}
              sideways={draft.sideways}
              onChange={(next) => change({ supports: supports.map((old, k) => (k === i ? next : old)) })}
              onRemove={
                supports.length > 2
                  ? () => change({ supports: supports.filter((_, k) => k !== i) })
                  : undefined
              }
            />
          ))}
        </>
      ) : (
        <FingerFields finger={draft.finger} onChange={(finger) => change({ finger })} />
      )}
      <details className="mt-2">
        <summary className="opens flex min-h-11 items-center text-note font-semibold">
          Scale, tape{kind === 'supports' && ', sideways, more supports'}
        </summary>
        <div className="grid grid-cols-2 gap-x-4">
          <NumberField
            label="Scale’s smallest step"
            quantity="mass"
            value={draft.resolution}
            above={0}
            max={100}
            onChange={(value) => value !== null && value > 0 && change({ resolution: value })}
          />
          {kind === 'supports' && (
            <NumberField
              label="A place is known to ±"
              quantity="length"
              value={draft.ux}
              min={0}
              max={100}
              onChange={(value) => value !== null && value >= 0 && change({ ux: value })}
            />
          )}
        </div>
        {kind === 'supports' && (
          <div className="flex flex-wrap items-center gap-x-4">
            <Checkbox
              label="Weigh sideways too"
              checked={draft.sideways}
              onValue={(sideways) => change({ sideways })}
              className="min-h-11"
            />
            <Button variant="plain" onClick={more} disabled={supports.length >= LIMITS.supports.max}>
              One more support
            </Button>
          </div>
        )}
      </details>
    </Step>
  );
}
