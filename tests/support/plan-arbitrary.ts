import fc from 'fast-check';
import type { Bar, Item, Panel, Part, Plan, Plate, Solid, Surface } from '#shared/core/plan.ts';
import { MATERIALS } from './plans.ts';

/** Any plan that the schema accepts: extremes, reversed ranges and misfits included. */
const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const length = fc.oneof(number(0.001, 20_000), number(1, 300), fc.constantFrom(0.001, 20_000));
const station = fc.oneof(number(0, 20_000), number(0, 600), fc.constantFrom(0, 500));
const coordinate = fc.oneof(number(-20_000, 20_000), number(-200, 800), fc.constant(0));
const pair = (value: fc.Arbitrary<number>) => fc.tuple(value, value);
const place = fc.oneof(number(-1, 2), number(0, 1));
const side = fc.constantFrom('both' as const, 'port' as const, 'starboard' as const, undefined);
const wood = fc.constantFrom('balsa', 'hard', 'ply');
const size = pair(fc.oneof(number(0, 20_000), number(0, 20)));
const removed = number(0, 0.9);
const range = { from: station, to: station };

const points = fc
  .array(fc.tuple(number(-0.5, 1.5), number(-1, 1)), { minLength: 5, maxLength: 12 })
  .map((list) => ({ name: 'Odd', points: list }));
const section = fc.oneof(
  fc.constantFrom({ naca: '0012' }, { naca: '4409' }, { naca: '9999' }, { naca: '2001' }, { naca: '0401' }),
  length.map((flat) => ({ flat })),
  points,
);
const panel: fc.Arbitrary<Panel> = fc.record({
  span: length,
  rootChord: length,
  tipChord: fc.oneof(length, fc.constant(0)),
  sweep: coordinate,
  dihedral: fc.oneof(number(-90, 90), fc.constantFrom(0, 90, -90)),
  rootSection: section,
  tipSection: section,
});

const partOf = (mirrored: boolean): fc.Arbitrary<Part> => {
  const base = {
    name: fc.constant('Part'),
    id: fc.constant('part'),
    side: mirrored ? side : fc.constant(undefined),
  };
  const woody = { ...base, material: wood };
  return fc.oneof(
    fc.record({
      ...woody,
      kind: fc.constant('ribs' as const),
      stations: fc.array(station, { minLength: 1, maxLength: 8 }),
      thickness: length,
      lightening: removed,
    }),
    fc.record({
      ...woody,
      ...range,
      kind: fc.constant('ribs' as const),
      count: fc.integer({ min: 1, max: 12 }),
      thickness: length,
      lightening: removed,
    }),
    fc.record({
      ...woody,
      ...range,
      kind: fc.constant('strip' as const),
      at: pair(place),
      seat: fc.constantFrom(
        'top' as const,
        'bottom' as const,
        'middle' as const,
        'nose' as const,
        'tail' as const,
      ),
      width: size,
      height: size,
      profile: fc.constantFrom('rectangle' as const, 'triangle' as const, 'round' as const, 'tube' as const),
      wall: length,
      letIn: fc.boolean(),
    }),
    fc.record({
      ...woody,
      ...range,
      kind: fc.constant('skin' as const),
      start: place,
      end: place,
      seat: fc.constantFrom('top' as const, 'bottom' as const, 'wrap' as const),
      thickness: length,
    }),
    fc.record({
      ...woody,
      ...range,
      kind: fc.constant('capStrips' as const),
      start: place,
      end: place,
      seat: fc.constantFrom('top' as const, 'bottom' as const, 'both' as const),
      width: length,
      thickness: length,
    }),
    fc.record({ ...woody, ...range, kind: fc.constant('web' as const), at: pair(place), thickness: length }),
    fc.record({
      ...base,
      material: fc.constantFrom('balsa', 'hard'),
      kind: fc.constant('tipBlock' as const),
      length,
      hollow: removed,
    }),
    fc.record({ ...woody, kind: fc.constant('sheet' as const), thickness: length, cutout: removed }),
    fc.record({
      ...base,
      ...range,
      material: fc.constant('tissue'),
      kind: fc.constantFrom('covering' as const, 'finish' as const),
      seat: fc.constantFrom('top' as const, 'bottom' as const, 'both' as const),
      overlap: number(0, 1),
    }),
    fc.record({
      ...base,
      material: fc.constant('glue'),
      kind: fc.constant('glue' as const),
      method: fc.constantFrom('share' as const, 'joints' as const),
      share: number(0, 1),
      layers: number(0, 20),
    }),
  );
};

const surface: fc.Arbitrary<Surface> = fc.boolean().chain((mirrored) =>
  fc.record({
    key: fc.constant('surface'),
    role: fc.constantFrom('wing' as const, 'tailplane' as const, 'fin' as const),
    apex: fc.tuple(coordinate, coordinate, coordinate),
    mirrored: fc.constant(mirrored),
    panels: fc.array(panel, { minLength: 1, maxLength: 4 }),
    parts: fc
      .array(partOf(mirrored), { maxLength: 10 })
      .map((parts) => parts.map((p, i) => ({ ...p, id: `p${i}` }))),
  }),
);

const vec3 = fc.tuple(coordinate, coordinate, coordinate);
const item: fc.Arbitrary<Item> = fc.record({
  id: fc.constant('item'),
  name: fc.constant('Item'),
  group: fc.constantFrom('gear', 'ballast'),
  mass: fc.oneof(number(0, 100_000), fc.constant(0)),
  u: fc.oneof(number(0, 10), fc.constant(undefined)),
  at: vec3,
});
const bar: fc.Arbitrary<Bar> = fc.record({
  id: fc.constant('bar'),
  name: fc.constant('Bar'),
  group: fc.constant('fuselage'),
  material: fc.constantFrom('balsa', 'hard'),
  shape: fc.constant('bar' as const),
  from: vec3,
  to: vec3,
  width: size,
  height: size,
  profile: fc.constantFrom('rectangle' as const, 'round' as const, 'tube' as const),
  wall: length,
});
const plate: fc.Arbitrary<Plate> = fc.record({
  id: fc.constant('plate'),
  name: fc.constant('Plate'),
  group: fc.constant('fuselage'),
  material: wood,
  shape: fc.constant('plate' as const),
  outline: fc.array(fc.tuple(coordinate, coordinate), { minLength: 3, maxLength: 9 }),
  thickness: length,
  count: fc.integer({ min: 1, max: 4 }),
  y: coordinate,
  cutout: removed,
});
const solid: fc.Arbitrary<Solid> = fc.oneof(bar, plate);
const numbered = <T extends { id: string }>(rows: T[]) =>
  rows.map((row, i) => ({ ...row, id: `${row.id}${i}` }));

export const anyPlan: fc.Arbitrary<Plan> = fc.record({
  version: fc.constant(1 as const),
  name: fc.constant('Any'),
  materials: fc.constant(MATERIALS),
  surfaces: fc.array(surface, { maxLength: 4 }).map((list) => list.map((s, i) => ({ ...s, key: `s${i}` }))),
  items: fc.array(item, { maxLength: 4 }).map(numbered),
  solids: fc.array(solid, { maxLength: 4 }).map(numbered),
  target: fc.oneof(
    fc.record({ percentMac: number(-500, 500), tolerance: number(0, 100) }),
    fc.constant(undefined),
  ),
  flight: fc.oneof(
    fc.record({ clMax: number(0.01, 5), airDensity: number(0.01, 3), loadFactor: number(0.1, 100) }),
    fc.constant(undefined),
  ),
});
