import fc from 'fast-check';
import type { Item, Part, Plan, Surface } from '#shared/core/plan.ts';

/** One step of editing: leaves the plan that it is given as it is. */
export type PlanEdit = (plan: Plan) => Plan;

const step = fc.nat({ max: 1_000 });
const size = fc.integer({ min: 1, max: 90 }).map((n) => n / 10);
const pick = <T>(list: readonly T[], n: number): T | undefined => list[n % Math.max(1, list.length)];
const without = <T>(list: readonly T[], n: number): T[] => list.filter((_, i) => i !== n % list.length);
const turned = <T>(list: readonly T[], n: number): T[] => {
  const at = n % Math.max(1, list.length);
  return [...list.slice(at), ...list.slice(0, at)];
};

const onSurface = (n: number, change: (surface: Surface) => Surface): PlanEdit => {
  return (plan) => {
    const picked = pick(plan.surfaces, n);
    return { ...plan, surfaces: plan.surfaces.map((s) => (s === picked ? change(s) : s)) };
  };
};
const onPart = (n: number, m: number, change: (part: Part) => Part): PlanEdit =>
  onSurface(n, (surface) => {
    const picked = pick(surface.parts, m);
    return { ...surface, parts: surface.parts.map((p) => (p === picked ? change(p) : p)) };
  });
const resized = (part: Part, to: number): Part => {
  if ('thickness' in part) return { ...part, thickness: to };
  return part.kind === 'strip' ? { ...part, width: [to, to] } : { ...part, name: `${part.name} ${to}` };
};
const weight = (id: string, mass: number): Item => ({
  id,
  name: id,
  group: 'ballast',
  mass,
  at: [-100, 0, 0],
});

const edit: fc.Arbitrary<PlanEdit> = fc.oneof(
  fc.tuple(step, step, size).map(([n, m, to]) => onPart(n, m, (part) => resized(part, to))),
  fc.tuple(step, step).map(([n, m]) => onPart(n, m, (part) => ({ ...part, group: `group ${m % 3}` }))),
  fc.tuple(step, size).map(([n, to]) =>
    onSurface(n, (s) => ({
      ...s,
      panels: s.panels.map((p, i) => (i === n % s.panels.length ? { ...p, rootChord: to * 20 } : p)),
    })),
  ),
  step.map((n) => onSurface(n, (s) => ({ ...s, panels: [...s.panels, ...s.panels.slice(-1)] }))),
  step.map((n) => onSurface(n, (s) => ({ ...s, apex: [n, 0, 0] }))),
  fc.tuple(step, step).map(([n, m]) => onSurface(n, (s) => ({ ...s, parts: without(s.parts, m) }))),
  fc.tuple(step, step).map(([n, m]) => onSurface(n, (s) => ({ ...s, parts: turned(s.parts, m) }))),
  step.map((n): PlanEdit => (plan) => ({ ...plan, items: without(plan.items, n) })),
  fc.tuple(step, size).map(([n, mass]): PlanEdit => {
    return (plan) => {
      const id = `weight-${n}`;
      const items = plan.items.filter((item) => item.id !== id);
      return { ...plan, items: turned([...items, weight(id, mass)], n) };
    };
  }),
  step.map((n): PlanEdit => (plan) => ({ ...plan, solids: turned(plan.solids, n) })),
  size.map((to): PlanEdit => (plan) => ({ ...plan, target: { percentMac: to, tolerance: 2 } })),
  fc.constant<PlanEdit>(({ target: _, ...plan }) => plan),
);

/** A few edits, one after the other. */
export const edits: fc.Arbitrary<PlanEdit> = fc
  .array(edit, { minLength: 1, maxLength: 4 })
  .map((list) => (plan: Plan) => list.reduce((current, change) => change(current), plan));
