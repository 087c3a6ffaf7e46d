import { useMemo } from 'react';
import { useUnits } from '#client/lib/units.ts';
import type { Plan, Surface } from '#shared/core/plan.ts';
import { closedNoseOf } from '#shared/core/torsion.ts';
import { formatNumber } from '#shared/format/numbers.ts';

/** A couple that one can picture: 1 N on an arm of 100 mm. */
const COUPLE = 100;

/** Torsional stiffness of a nose that sheeting and web close; says nothing where there is none. */
export function ClosedNoseNote({ plan, wing }: { plan: Plan; wing: Surface }) {
  const nose = useMemo(() => closedNoseOf(plan, wing), [plan, wing]);
  const units = useUnits();
  if (!nose) return null;
  const twist = (nose.twistPerCouple * COUPLE * 180) / Math.PI;
  return (
    <p className="text-note text-graphite">
      <span className="font-semibold text-pencil">The nose is closed by sheeting and web</span> from the root
      to {units.format(nose.to, 'length')}: a couple of 0.1{'\u202f'}N·m on its end twists it by{' '}
      {formatNumber(twist, 1)}°. By Bredt’s formula, 4A² ÷ Σ(s ÷ Gt), with G = 0.037 of the stiffness along
      the grain as for balsa (Wood Handbook, Table 5-1, from memory); to compare wings by, no more.
    </p>
  );
}
