import { Button } from '#client/components/ui/button.tsx';
import { NumberField } from '#client/components/ui/number-field.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { BallastChoice } from '#shared/core/field/ballast-pieces.ts';
import type { FieldFigures } from '#shared/core/field/field-account.ts';
import { loadingOf, speedAt } from '#shared/core/loading.ts';
import type { Plan } from '#shared/core/plan.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import { ballastAdvice, refusalWords, usualPlace } from './ballast-advice.ts';
import type { FlightDraft } from './draft.ts';
import { FittedList } from './fitted-list.tsx';
import { PiecesFields } from './pieces-fields.tsx';
import type { ChangeDraft } from './use-draft.ts';
import type { FieldFacts } from './use-flight.ts';
import type { WantedRange } from './wanted-range.ts';

interface BallastStepProps {
  draft: FlightDraft;
  change: ChangeDraft;
  facts: FieldFacts;
  plan: Plan;
  flown: FieldFigures;
  range: WantedRange | null;
  gliderId: string;
}

/** What to put in, where, from what is at hand; and what is in already. */
export function BallastStep({ draft, change, facts, plan, flown, range, gliderId }: BallastStepProps) {
  const units = useUnits();
  const { terms, sources } = facts;
  const at = draft.at ?? terms?.ballastAt ?? usualPlace(plan);
  const pieces = draft.pieces ?? terms?.pieces ?? [];
  const aboard = draft.ballast.reduce((sum, { mass }) => sum + mass, 0);
  const advice = range && ballastAdvice({ flown, range, at, pieces, terms, aboard });
  const found = advice && !('refused' in advice) ? advice : null;
  const place = `${units.format(Math.abs(at), 'length')} ${at < 0 ? 'ahead of' : 'aft of'} the datum`;
  const fit = (choice: BallastChoice) => {
    const named = choice.pieces.map(({ id, mass }) => ({
      name: pieces.find((piece) => piece.id === id)?.name ?? 'Putty or lead',
      mass,
      x: at,
      y: 0,
    }));
    // What is in the model is no longer at hand.
    const left = draft.pieces ?? terms?.pieces ?? null;
    const rest = left?.flatMap((piece) => {
      const taken = choice.pieces.find(({ id }) => id === piece.id)?.mass ?? 0;
      return piece.mass - taken > 1e-6 ? [{ ...piece, mass: piece.mass - taken }] : [];
    });
    change({ ballast: [...draft.ballast, ...named], pieces: rest ?? null });
  };
  return (
    <div className="mt-4">
      {found && found.ballast > 0 && (
        <>
          <p className="text-heading font-semibold">
            Add {units.format(found.ballast, 'mass')}, {place}
          </p>
          {pieces.length > 0 && <p>{piecesWords(found, pieces, units)}</p>}
          <p className="text-graphite">{thenWords(found, sources.wing?.area ?? null, plan, units)}</p>
          <Button variant="primary" className="mt-2 min-h-12 w-full sm:w-auto" onClick={() => fit(found)}>
            It is fitted
          </Button>
        </>
      )}
      {found?.ballast === 0 && <p className="font-semibold">No ballast is needed.</p>}
      {found !== null && found.missing > 0 && (
        <p className="mt-1">
          Its class asks for {units.format(found.missing, 'mass')} more: put them at the balance point, where
          they move nothing.
        </p>
      )}
      {advice && 'refused' in advice && <p className="font-semibold">{refusalWords(advice, at, units)}</p>}
      <FittedList draft={draft} change={change} />
      <details className="mt-1">
        <summary className="opens flex min-h-11 items-center text-note font-semibold">
          Elsewhere, and the pieces at hand
        </summary>
        <NumberField
          label="Ballast goes in at"
          quantity="length"
          value={at}
          min={LIMITS.coordinateMm.min}
          max={LIMITS.coordinateMm.max}
          hint="aft of the datum; ahead of it is a minus"
          onChange={(value) => value !== null && change({ at: value })}
        />
        <PiecesFields
          pieces={pieces}
          onChange={(next) => change({ pieces: next })}
          terms={terms}
          at={at}
          gliderId={gliderId}
        />
      </details>
    </div>
  );
}

function piecesWords(
  { pieces: taken }: BallastChoice,
  pieces: readonly { id: string; name: string }[],
  units: ReturnType<typeof useUnits>,
): string {
  const names = taken.map(
    ({ id, mass }) =>
      `${pieces.find((piece) => piece.id === id)?.name ?? id} (${units.format(mass, 'mass')})`,
  );
  return `From what is at hand: ${names.join(', ')}.`;
}

function thenWords(
  { mass, x }: BallastChoice,
  area: number | null,
  plan: Plan,
  units: ReturnType<typeof useUnits>,
): string {
  const loading = area === null ? null : loadingOf(mass, area);
  const stall =
    area === null ? null : speedAt(mass, area, plan.flight?.clMax ?? 1, plan.flight?.airDensity ?? 1.225);
  return [
    `Then it balances at ${units.format(x, 'length')}, ${units.format(mass, 'mass')}`,
    ...(loading === null ? [] : [units.format(loading, 'loading')]),
    ...(stall === null ? [] : [`stall ${units.format(stall, 'speed')}`]),
  ].join(', ');
}
