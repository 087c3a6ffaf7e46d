import type { BuiltPart } from './built/as-built.ts';
import { startBuilt } from './built/as-built-state.ts';
import { sidedLines } from './built/sided-lines.ts';
import type { AssignProblem } from './cut/assign-account.ts';
import { estimate } from './estimate.ts';
import { halfOf } from './half.ts';
import type { CapStrips, Plan, Ribs, Skin, Strip, Surface, Web } from './plan.ts';
import { stationAt, surfaceLine } from './stations.ts';

const wood = { material: 'balsa', from: 0, to: 500 } as const;

/** Six ribs of 2 mm, 100 mm apart. */
export const EXAMPLE_RIBS: Ribs = {
  ...wood,
  id: 'ribs',
  name: 'Ribs',
  kind: 'ribs',
  count: 6,
  thickness: 2,
  lightening: 0,
};

/** A spar of 5 × 2 mm, let into the ribs under the top skin. */
export const EXAMPLE_SPAR: Strip = {
  ...wood,
  id: 'spar',
  name: 'Spar',
  kind: 'strip',
  seat: 'top',
  profile: 'rectangle',
  letIn: true,
  at: [0.25, 0.25],
  width: [5, 5],
  height: [2, 2],
};

/** Sheeting of 1 mm over the fore half of the top. */
export const EXAMPLE_SKIN: Skin = {
  ...wood,
  id: 'skin',
  name: 'Sheeting',
  kind: 'skin',
  seat: 'top',
  start: 0,
  end: 0.5,
  thickness: 1,
};

/** A web of 1 mm under the spar. It is not in the wing. */
export const EXAMPLE_WEB: Web = {
  ...wood,
  id: 'web',
  name: 'Web',
  kind: 'web',
  at: [0.25, 0.25],
  thickness: 1,
};

/** Cap strips of 4 × 1 mm on the aft half of the top. They are not on the wing. */
export const EXAMPLE_CAPS: CapStrips = {
  ...wood,
  id: 'caps',
  name: 'Cap strips',
  kind: 'capStrips',
  seat: 'top',
  start: 0.5,
  end: 1,
  width: 4,
  thickness: 1,
};

/**
 * The wing that examples are worked on where a function asks for more than a few numbers; nothing else uses it. Its
 * figures can be reckoned in the head: 1000 mm by 100 mm, without sweep or dihedral, everywhere 10 mm high.
 */
export const EXAMPLE_WING: Surface = {
  key: 'wing',
  role: 'wing',
  apex: [0, 0, 0],
  mirrored: true,
  panels: [
    {
      span: 500,
      rootChord: 100,
      tipChord: 100,
      sweep: 0,
      dihedral: 0,
      rootSection: { flat: 10 },
      tipSection: { flat: 10 },
    },
  ],
  parts: [EXAMPLE_RIBS, EXAMPLE_SPAR, EXAMPLE_SKIN],
};

/** The wing's starboard half laid out along its stations. */
export const EXAMPLE_LINE = surfaceLine(EXAMPLE_WING);

/** The starboard half with its parts; notices go nowhere. */
export const EXAMPLE_HALF = halfOf(EXAMPLE_WING, EXAMPLE_LINE, 'starboard', () => undefined);

/** The place of the second rib. */
export const EXAMPLE_STATION = stationAt(EXAMPLE_LINE, 100);

/** The wing on a boom of 5 × 5 mm, all of balsa of 100 kg/m³ ± 10 %, with 10 g in the nose: 19.256 g. */
export const EXAMPLE_PLAN: Plan = {
  version: 1,
  name: 'Plank',
  materials: { balsa: { name: 'Balsa', category: 'wood', density: 100, cv: 0.1, modulus: 1, strength: 8 } },
  surfaces: [EXAMPLE_WING],
  items: [{ id: 'nose', name: 'Nose weight', group: 'ballast', mass: 10, u: 0.1, at: [-20, 0, 0] }],
  solids: [
    {
      id: 'boom',
      name: 'Boom',
      group: 'fuselage',
      material: 'balsa',
      shape: 'bar',
      profile: 'rectangle',
      from: [0, 0, 0],
      to: [400, 0, 0],
      width: [5, 5],
      height: [5, 5],
    },
  ],
  target: { percentMac: 40, tolerance: 2 },
};

/** What that plan comes to. */
export const EXAMPLE_ESTIMATE = estimate(EXAMPLE_PLAN);

const EXAMPLE_HALF_PART = {
  line: 'wing/tip',
  name: 'Tip',
  group: 'wing',
  surface: 'wing',
  material: 'balsa',
  u: 0,
  estimated: 10,
  mass: 10,
  weighing: null,
} as const;

/** A part of 10 g half-way out on each half. */
export const EXAMPLE_PORT: BuiltPart = { ...EXAMPLE_HALF_PART, side: 'port', at: [50, -250, 0] };
export const EXAMPLE_STARBOARD: BuiltPart = { ...EXAMPLE_HALF_PART, side: 'starboard', at: [50, 250, 0] };

/** The account of that plan before anything was weighed. */
export const EXAMPLE_BUILT = startBuilt(sidedLines(EXAMPLE_PLAN), EXAMPLE_PLAN.materials);

const EXAMPLE_RIB = {
  line: 'wing/rib',
  name: 'Rib',
  number: null,
  surface: 'wing',
  form: 'sheet',
  length: 100,
  width: 10,
  thickness: 2,
  volume: 2000,
  y: 100,
  isSpar: false,
  grain: 'stiff',
  material: 'balsa',
  wood: 'balsa',
  density: 160,
} as const;
const EXAMPLE_SHEET = {
  form: 'sheet',
  length: 300,
  width: 75,
  thickness: 2,
  grainCut: 'C',
  wood: 'balsa',
} as const;

/** A rib on each half, and a light sheet and a heavier one that both could be cut from. */
export const EXAMPLE_ASSIGNMENT: AssignProblem = {
  parts: [
    { ...EXAMPLE_RIB, id: 'rib port', n: 0, side: 'port' },
    { ...EXAMPLE_RIB, id: 'rib starboard', n: 1, side: 'starboard' },
  ],
  stock: [
    { ...EXAMPLE_SHEET, id: '1', density: 100 },
    { ...EXAMPLE_SHEET, id: '2', density: 140 },
  ],
  terms: { aim: 'lightest', kerf: 1, massTolerance: null, momentTolerance: null },
  fixed: new Map(),
};
