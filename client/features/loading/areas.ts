import { loadingOf } from '#shared/core/loading.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { Estimate } from '#shared/core/result.ts';

/** One way to count the area, and the loading on it. */
export interface AreaRow {
  key: 'projected' | 'developed' | 'class';
  name: string;
  note: string;
  /** mm² */
  area: number | null;
  /** g/dm² */
  loading: number | null;
}

const MM2_PER_DM2 = 10_000;

/** The wing's area by each definition, and the class area, with the loading on each. */
export function areaRows(plan: Pick<Plan, 'surfaces'>, { planform, totals, loading }: Estimate): AreaRow[] {
  const wings = plan.surfaces.filter(({ role }) => role === 'wing').map(({ key }) => planform[key]);
  const sum = (field: 'areaProjected' | 'areaDeveloped') =>
    wings.length === 0 ? null : wings.reduce((all, one) => all + (one?.[field] ?? 0), 0);
  const on = (area: number | null) => (area === null ? null : loadingOf(totals.mass, area));
  const projected = sum('areaProjected');
  const developed = sum('areaDeveloped');
  const classArea = loading.classArea === null ? null : loading.classArea * MM2_PER_DM2;
  return [
    {
      key: 'projected',
      name: 'Wing, projected',
      note: 'as seen from above: what flies, and what the speeds are made from',
      area: projected,
      loading: on(projected),
    },
    {
      key: 'developed',
      name: 'Wing, developed',
      note: 'as laid on the board, dihedral not counted',
      area: developed,
      loading: on(developed),
    },
    {
      key: 'class',
      name: 'Class area',
      note: 'wing and tailplane projected, carried through the fuselage; fin not counted',
      area: classArea,
      loading: loading.classLoading,
    },
  ];
}
