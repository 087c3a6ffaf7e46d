import { useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { NumberField } from '#client/components/ui/number-field.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import { AskWhy } from '#client/components/why/ask-why.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import { balanceAfter, ballastFor } from '#shared/core/ballast.ts';
import type { Beam } from '#shared/core/beam.ts';
import type { Vec3 } from '#shared/core/frame.ts';
import { roundTo } from '#shared/format/numbers.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import { spareBallast, withBallast, withLess } from './ballast-edit.ts';
import { placeOf } from './verdict.ts';

interface BallastSolverProps {
  workspace: Workspace;
  beam: Beam;
  /** foremost place of the plan */
  nose: Vec3;
}

/** How much at a chosen arm brings the balance point to the wanted one. */
export function BallastSolver({ workspace, beam, nose }: BallastSolverProps) {
  const { plan, result, edit, canEdit } = workspace;
  const [chosen, setChosen] = useState<number | null>(null);
  const say = useToast();
  const units = useUnits();
  const arm = chosen ?? nose[0];
  const mass = result.totals.mass;
  const from = beam.balance.x;
  const to = beam.pivot;
  const fine = mass < 20;
  const grams = (value: number) => units.format(value, 'mass', { fine });
  const found = ballastFor(mass, from, to, arm);
  const needed = 'mass' in found ? roundTo(found.mass, fine ? 2 : 1) : null;
  const spare = from < to ? spareBallast(plan.items, mass, from, to) : null;
  // Never more than there is: rounding must not ask for it.
  const takeOff = spare && Math.min(spare.item.mass, roundTo(spare.takeOff, fine ? 2 : 1));

  const fit = () => {
    if (needed === null || needed === 0) return;
    edit(
      (p) => withBallast(p, arm === nose[0] ? 'Nose ballast' : 'Ballast', needed, [arm, 0, nose[2]]),
      'fit ballast',
    );
    say(`${grams(needed)} fitted ${placeOf(arm, units)}. Undo takes it out again.`);
  };
  const take = () => {
    if (!spare || takeOff === null) return;
    edit((p) => withLess(p, spare.item.id, takeOff), 'take ballast off');
    say(`${grams(takeOff)} taken off ${spare.item.name}.`);
  };

  return (
    <section aria-label="Ballast, fore and aft">
      <h2 className="caption">Ballast, fore and aft</h2>
      <div className="mt-2 max-w-xs">
        <NumberField
          label="At arm"
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
        <p>{refusal(found, arm, to, grams)}</p>
      ) : needed === 0 ? (
        <p>Nothing to add: it balances {beam.wanted ? 'on the wanted point' : 'where it does'}.</p>
      ) : (
        <p>
          <strong className="text-heading font-semibold">
            <AskWhy inText question={{ of: 'ballast', arm, to }}>
              {grams(needed)}
            </AskWhy>
          </strong>{' '}
          {placeOf(arm, units)} brings it to {units.format(balanceAfter(mass, from, needed, arm), 'length')}
          <span className="text-graphite">; then {grams(mass + needed)} in all.</span>
        </p>
      )}
      <div className="mt-2 flex flex-wrap gap-2 print:hidden">
        {canEdit && needed !== null && needed > 0 && (
          <Button variant="primary" onClick={fit}>
            Fit it
          </Button>
        )}
        {canEdit && spare && takeOff !== null && takeOff > 0 && (
          <Button onClick={take}>
            Take {grams(takeOff)} off {spare.item.name}
          </Button>
        )}
      </div>
    </section>
  );
}

function refusal(
  found: ReturnType<typeof ballastFor>,
  arm: number,
  to: number,
  grams: (value: number) => string,
): string {
  if ('mass' in found) return '';
  if (found.refused === 'at_wanted_point')
    return 'At the wanted balance point itself no mass moves the balance. Choose another arm.';
  const side = arm < to ? 'ahead of' : 'behind';
  const heavy = arm < to ? 'nose-heavy' : 'tail-heavy';
  const less =
    found.takeOff === null
      ? 'and nothing that could come off there would be enough.'
      : `${grams(found.takeOff)} would have to come off there instead.`;
  return `No ballast ${side} the wanted point helps: the model is ${heavy} already; ${less}`;
}
