import { useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { NumberField } from '#client/components/ui/number-field.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import type { Beam } from '#shared/core/beam.ts';
import type { Plan, Target } from '#shared/core/plan.ts';
import { formatNumber, NARROW_SPACE, roundTo } from '#shared/format/numbers.ts';

interface WantedFieldsProps {
  workspace: Workspace;
  beam: Beam;
}

const withTarget = (plan: Plan, target: Target): Plan => ({ ...plan, target });

/** The balance point that is asked for, typed or taken from a range of static margins. */
export function WantedFields({ workspace, beam }: WantedFieldsProps) {
  const { plan, edit, canEdit } = workspace;
  const { target } = plan;
  const percentMac = beam.balance.percentMac;
  if (percentMac === null) return null;
  return (
    <section aria-label="Wanted balance point">
      <h2 className="caption">Wanted balance point</h2>
      {target ? (
        <div className="mt-2 grid max-w-sm grid-cols-2 gap-x-4">
          <NumberField
            label="Point, % MAC"
            quantity="percentMac"
            value={target.percentMac}
            min={-500}
            max={500}
            readOnly={!canEdit}
            onChange={(value) =>
              value !== null && edit((p) => withTarget(p, { ...target, percentMac: value }), 'wanted balance')
            }
          />
          <NumberField
            label="Give or take"
            quantity="percentMac"
            value={target.tolerance}
            min={0}
            max={100}
            readOnly={!canEdit}
            onChange={(value) =>
              value !== null &&
              edit((p) => withTarget(p, { ...target, tolerance: value }), 'balance tolerance')
            }
          />
        </div>
      ) : (
        canEdit && (
          <Button
            className="mt-2"
            onClick={() =>
              edit(
                (p) => withTarget(p, { percentMac: roundTo(percentMac, 0), tolerance: 2 }),
                'wanted balance',
              )
            }
          >
            Ask for a balance point
          </Button>
        )
      )}
      <MarginRange workspace={workspace} beam={beam} />
    </section>
  );
}

/** Where the balance point may lie for a range of static margins. */
function MarginRange({ workspace, beam }: WantedFieldsProps) {
  const { edit, canEdit } = workspace;
  const units = useUnits();
  const [least, setLeast] = useState(0.05);
  const [most, setMost] = useState(0.15);
  const { neutralPoint, chord } = beam;
  if (neutralPoint === null || !chord) return null;
  const mac = chord.to - chord.from;
  const aft = neutralPoint - Math.min(least, most) * mac;
  const fore = neutralPoint - Math.max(least, most) * mac;
  const percentOf = (x: number) => (100 * (x - chord.from)) / mac;
  const ask = () =>
    edit(
      (p) =>
        withTarget(p, {
          percentMac: roundTo((percentOf(fore) + percentOf(aft)) / 2, 1),
          tolerance: roundTo((percentOf(aft) - percentOf(fore)) / 2, 1),
        }),
      'wanted balance from margin',
    );
  return (
    <div>
      <div className="grid max-w-sm grid-cols-2 gap-x-4">
        <NumberField
          label="Margin, least"
          quantity="fineShare"
          value={least}
          min={-1}
          max={2}
          onChange={(value) => value !== null && setLeast(value)}
        />
        <NumberField
          label="Margin, most"
          quantity="fineShare"
          value={most}
          min={-1}
          max={2}
          onChange={(value) => value !== null && setMost(value)}
        />
      </div>
      <p>
        These margins ask for {formatNumber(percentOf(fore), 1)}–{formatNumber(percentOf(aft), 1)}
        {NARROW_SPACE}% MAC, {units.format(fore, 'length', { bare: true })}–{units.format(aft, 'length')}.
      </p>
      {canEdit && (
        <Button variant="plain" className="mt-1 -ml-2 print:hidden" onClick={ask}>
          Ask for this range
        </Button>
      )}
    </div>
  );
}
