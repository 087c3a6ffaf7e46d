import { useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { NumberField } from '#client/components/ui/number-field.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import { AskWhy } from '#client/components/why/ask-why.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import { ballastFor } from '#shared/core/ballast.ts';
import type { Vec3 } from '#shared/core/frame.ts';
import { roundTo } from '#shared/format/numbers.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import { withBallast } from './ballast-edit.ts';

interface TipWeightProps {
  workspace: Workspace;
  /** the model's balance point */
  at: Vec3;
  /** starboard wing tip */
  tip: Vec3;
}

/** Sideways less than this, mm, is level. */
const LEVEL = 0.05;

/** The tip weight that brings the balance point to the plane of symmetry, put at the model's own arm. */
export function TipWeight({ workspace, at, tip }: TipWeightProps) {
  const { result, edit, canEdit } = workspace;
  const mass = result.totals.mass;
  const [chosen, setChosen] = useState<number | null>(null);
  const say = useToast();
  const units = useUnits();
  const [x, y] = at;
  if (Math.abs(y) < LEVEL) {
    return (
      <section aria-label="Ballast, side to side">
        <h2 className="caption">Side to side</h2>
        <p className="mt-1">Port and starboard balance; no tip weight is needed.</p>
      </section>
    );
  }
  const arm = chosen ?? -Math.sign(y) * roundTo(tip[1], 1);
  const found = ballastFor(mass, y, 0, arm);
  const needed = 'mass' in found ? roundTo(found.mass, 2) : null;
  const heavy = y > 0 ? 'starboard' : 'port';
  const light = y > 0 ? 'port' : 'starboard';
  const grams = (value: number) => units.format(value, 'mass', { fine: true });
  const fit = () => {
    if (needed === null) return;
    edit((p) => withBallast(p, `Tip weight, ${light}`, needed, [x, arm, tip[2]]), 'fit tip weight');
    say(`${grams(needed)} fitted at the ${light} tip. Undo takes it out again.`);
  };

  return (
    <section aria-label="Ballast, side to side">
      <h2 className="caption">Side to side</h2>
      <p className="mt-1">
        The balance point lies {units.format(Math.abs(y), 'length')} to {heavy}.
      </p>
      <div className="mt-2 max-w-xs">
        <NumberField
          label="At y, starboard +"
          quantity="length"
          inline
          value={arm}
          min={LIMITS.coordinateMm.min}
          max={LIMITS.coordinateMm.max}
          onChange={(value) => value !== null && setChosen(value)}
          keepRoom
        />
      </div>
      {needed === null ? (
        <p>Weight there makes it worse: choose a place to {light}.</p>
      ) : (
        <p>
          <strong className="text-heading font-semibold">
            <AskWhy inText question={{ of: 'tipWeight', arm }}>
              {grams(needed)}
            </AskWhy>
          </strong>{' '}
          at the {light} wing brings it to the middle
          <span className="text-graphite">
            ; on the balance arm ({units.format(x, 'length')}) it leaves fore and aft alone.
          </span>
        </p>
      )}
      {canEdit && needed !== null && needed > 0 && (
        <Button className="mt-2 print:hidden" onClick={fit}>
          Fit it
        </Button>
      )}
    </section>
  );
}
