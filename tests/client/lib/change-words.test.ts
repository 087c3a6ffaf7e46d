import { describe, expect, it } from 'vitest';
import { changeSentence, changesInWords } from '#client/lib/change-words.ts';
import { planChanges } from '#shared/core/plan-changes.ts';
import type { Plan } from '#shared/core/plan.ts';
import { INCH_CHOICES, unitsOf, USUAL_UNITS, type Units } from '#shared/format/units.ts';
import { planChange } from '#shared/schemas/glider-save.ts';
import { demoPlan } from '#tests/support/plans.ts';

const plan = demoPlan('dunlin');
const plain = (text: string) => text.replaceAll('\u202f', ' ');
function told(change: (plan: Plan) => void, units: Units = USUAL_UNITS): string {
  const after = structuredClone(plan);
  change(after);
  return plain(changeSentence(changesInWords(planChanges(plan, after), after.materials, units)));
}
const wing = (after: Plan) => after.surfaces[0]!;
const ribs = (after: Plan) => wing(after).parts.find(({ id }) => id === 'ribs-inner')!;

describe('changes in words', () => {
  it('name the part, the field, both values and the unit once', () => {
    expect(told((p) => Object.assign(ribs(p), { thickness: 2.4 }))).toBe(
      'Ribs, inner panel thickness 2 → 2.4 mm',
    );
  });

  it('tell several fields of one part together, and name the surface where it is not the wing', () => {
    expect(
      told((p) => {
        Object.assign(ribs(p), { thickness: 3, lightening: 0.25 });
        Object.assign(p.surfaces[1]!.parts[0]!, { thickness: 1.2 });
      }),
    ).toBe('Ribs, inner panel thickness 2 → 3 mm, cut out 0 → 25 %; Ribs (tailplane) thickness 1 → 1.2 mm');
  });

  it('follow the reader to inches, in fractions where stock is one', () => {
    const inches = unitsOf(INCH_CHOICES);
    expect(told((p) => Object.assign(ribs(p), { thickness: 3.175 }), inches)).toMatch(
      /thickness 0\.079 → 1\/8 in$/,
    );
  });

  it('tell a single coordinate, a panel, a wood by its name', () => {
    expect(told((p) => (wing(p).apex = [5, 0, 0]))).toBe('Wing root leading edge x 0 → 5 mm');
    expect(told((p) => (wing(p).panels[0]!.rootChord = 160))).toMatch(
      /^Wing, panel 1 root chord \S+ → 160 mm$/,
    );
    const other = Object.keys(plan.materials).find((key) => key !== ribs(plan).material)!;
    expect(told((p) => (ribs(p).material = other))).toContain(
      `material ${plan.materials[ribs(plan).material]!.name} → ${plan.materials[other]!.name}`,
    );
  });

  it('tell what came, what went and what only changed places', () => {
    expect(told((p) => p.items.splice(0, 1))).toBe(`${plan.items[0]!.name} removed`);
    expect(told((p) => p.items.push({ ...p.items[0]!, id: 'new', name: 'Tow hook' }))).toBe('Tow hook added');
    expect(told((p) => wing(p).parts.reverse())).toBe('Wing parts put in another order');
  });

  it('tell the wanted balance and the name of the glider by themselves', () => {
    expect(told((p) => (p.target = { ...p.target!, percentMac: 50 }))).toBe(
      'Wanted balance 52.0 → 50.0 % MAC',
    );
    expect(told((p) => (p.name = 'Dunlin II'))).toBe('Name Dunlin → Dunlin II');
  });

  it('never tell two values apart by the same words', () => {
    const item = plan.items[0]!;
    const words = told((p) => (p.items[0]!.mass = item.mass + 0.02));
    const [from, to] = words.replace(`${item.name} mass `, '').split(' → ');
    expect(from).not.toBe(to?.replace(' g', ''));
  });

  it('can be made from what the log keeps', () => {
    const changes = planChanges(plan, { ...plan, name: 'x' }).map((change) => planChange.parse(change));
    expect(changeSentence(changesInWords(changes, {}, USUAL_UNITS))).toBe('Name Dunlin → x');
  });
});
