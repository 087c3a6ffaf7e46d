import type { TableMaterial } from '#client/lib/material-snapshot.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { Estimate } from '#shared/core/result.ts';
import type { Trial } from '#shared/core/wood-trial.ts';
import { woodGroups, type TrialWood, type WoodGroup } from '#shared/core/wood-groups.ts';

/** Grades of balsa from light to hard, by their keys in the materials table. */
const GRADES = ['balsa-contest', 'balsa-light', 'balsa-medium', 'balsa-medium-hard', 'balsa-hard'];

/** A wood group with what it weighs as drawn. */
export interface DrawnGroup extends WoodGroup {
  /** g */
  mass: number;
  /** key of the material that most of it is made of */
  main: string;
}

/** Woods to choose from, light to heavy: the plan's own figures go before the table's. */
export function woodsOf(plan: Pick<Plan, 'materials'>, table: readonly TableMaterial[]): TrialWood[] {
  const own = Object.entries(plan.materials).map(([key, material]) => ({ key, material }));
  const others = table.filter(({ key }) => !Object.hasOwn(plan.materials, key));
  return [...own, ...others]
    .filter(({ material }) => material.category === 'wood' && material.density !== undefined)
    .sort((a, b) => (a.material.density ?? 0) - (b.material.density ?? 0));
}

/** The plan's wood groups with their masses. */
export function drawnGroups(plan: Plan, { lines }: Pick<Estimate, 'lines'>): DrawnGroup[] {
  const massOf = new Map(lines.map(({ id, mass }) => [id, mass]));
  return woodGroups(plan).map((group) => {
    const masses = group.materials.map((material) => ({
      material,
      mass: group.members
        .filter((member) => member.material === material)
        .reduce((sum, { id }) => sum + (massOf.get(id) ?? 0), 0),
    }));
    const [main] = [...masses].sort((a, b) => b.mass - a.mass);
    return {
      ...group,
      mass: masses.reduce((sum, { mass }) => sum + mass, 0),
      main: main?.material ?? '',
    };
  });
}

/** The next lighter grade of balsa; null for the lightest, and for what is no grade of balsa. */
export function oneGradeLighter(key: string, woods: readonly TrialWood[]): TrialWood | null {
  const grade = GRADES[GRADES.indexOf(key) - 1];
  return woods.find((wood) => wood.key === grade) ?? null;
}

/** What to compare before anybody has chosen: as drawn, and the ribs (or else the heaviest balsa) a grade lighter. */
export function firstTrials(groups: readonly DrawnGroup[], woods: readonly TrialWood[]): Trial[] {
  const candidates = [...groups].sort(
    (a, b) => Number(b.key === 'ribs') - Number(a.key === 'ribs') || b.mass - a.mass,
  );
  for (const { key, main } of candidates) {
    const lighter = oneGradeLighter(main, woods);
    if (lighter) return [{ name: `One grade lighter ${key}`, materials: { [key]: lighter } }];
  }
  return [{ name: 'Trial 1', materials: {} }];
}
