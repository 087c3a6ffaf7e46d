import type { Vec3 } from './frame.ts';
import type { Pair, Part } from './plan-parts.ts';

export type {
  CapStrips,
  Covering,
  Face,
  Glue,
  Pair,
  Part,
  PartKind,
  Ribs,
  Sheet,
  Side,
  Skin,
  Strip,
  StripProfile,
  StripSeat,
  TipBlock,
  Web,
} from './plan-parts.ts';

/**
 * The plan: the document that the estimate is made from. Units and axes: `frame.ts`. The same document is the
 * body of `POST /api/estimates`, the JSON export, and every saved state. Its validation is
 * `shared/schemas/plan.ts`; a type test holds the two together.
 */
export interface Plan {
  version: 1;
  name: string;
  /** Snapshot of every material used, by its key, so that an old plan computes to the same figures for ever. */
  materials: Record<string, PlanMaterial>;
  surfaces: Surface[];
  items: Item[];
  solids: Solid[];
  target?: Target | undefined;
  flight?: Flight | undefined;
}

/** What a material is; only `wood` counts for wood trials, for glue by share and for humidity. */
export type MaterialCategory = 'wood' | 'composite' | 'metal' | 'sheet' | 'covering' | 'finish' | 'adhesive';

/** A material as it was when the plan was made; at least one of `density`, `areal` and `spread`. */
export interface PlanMaterial {
  name: string;
  category: MaterialCategory;
  /** kg/m³ */
  density?: number | undefined;
  /** g/m², for what is sold by area */
  areal?: number | undefined;
  /** dry g per m² of joint */
  spread?: number | undefined;
  /** relative standard deviation of the figure above */
  cv: number;
  /** wood: moisture fraction at which the density holds */
  moistureAtDensity?: number | undefined;
  /** bending modulus, GPa */
  modulus?: number | undefined;
  /** bending strength, MPa */
  strength?: number | undefined;
  source?: string | undefined;
}

/** What a surface does: wings and tailplanes carry, fins stand. */
export type SurfaceRole = 'wing' | 'tailplane' | 'fin';

/** A wing, a tailplane or a fin with the parts that it is built of. */
export interface Surface {
  /** first half of its lines' ids; the group of its parts that name none */
  key: string;
  role: SurfaceRole;
  /** root leading edge of the starboard half */
  apex: Vec3;
  /** whether there is a port half too */
  mirrored: boolean;
  /** root to tip */
  panels: Panel[];
  parts: Part[];
}

/** A piece of a surface with straight edges; its section goes over from one end's to the other's. */
export interface Panel {
  /** along the panel as laid on the board, mm */
  span: number;
  /** mm */
  rootChord: number;
  tipChord: number;
  /** how far aft the tip's leading edge lies of the root's, mm */
  sweep: number;
  /** degrees from the horizontal; a fin stands at 90 */
  dihedral: number;
  rootSection: SectionSpec;
  tipSection: SectionSpec;
}

/** How a section is given. */
export type SectionSpec = NacaSpec | FlatSpec | PointsSpec;
/** A four-digit section, NACA Report 460. */
export interface NacaSpec {
  naca: string;
}
/** A plate of that thickness in mm. */
export interface FlatSpec {
  flat: number;
}
/** x/c, z/c round from the trailing edge over the top, the nose and the underside. */
export interface PointsSpec {
  name: string;
  points: [number, number][];
}

/** Whatever has a mass and an arm. */
export interface Item {
  id: string;
  name: string;
  group: string;
  /** g */
  mass: number;
  /** standard uncertainty, g */
  u?: number | undefined;
  at: Vec3;
}

/** Axes and units of the points: `frame.ts`. */
interface SolidBase {
  id: string;
  name: string;
  group: string;
  /** key into the plan's materials */
  material: string;
}

/** A stick, block or tube, straight from one point to another. */
export interface Bar extends SolidBase {
  shape: 'bar';
  from: Vec3;
  to: Vec3;
  /** across, at `from` and at `to`, mm */
  width: Pair;
  height: Pair;
  profile: 'rectangle' | 'round' | 'tube';
  /** of a tube, mm */
  wall?: number | undefined;
}

/** A flat piece, or several alike, upright along the model. */
export interface Plate extends SolidBase {
  shape: 'plate';
  /** closed outline in x, z */
  outline: [x: number, z: number][];
  /** mm */
  thickness: number;
  count: number;
  /** plane of the plate, or of the middle of several */
  y: number;
  /** share cut out, 0–0.9 */
  cutout: number;
}

/** What is built outside the surfaces. */
export type Solid = Bar | Plate;

/** Wanted balance and how far off it may lie, both in % of mean aerodynamic chord. */
export interface Target {
  percentMac: number;
  tolerance: number;
}

/** What flight is reckoned with. */
export interface Flight {
  /** greatest lift coefficient; 1 if not given */
  clMax?: number | undefined;
  /** kg/m³; 1.225 if not given */
  airDensity?: number | undefined;
  /** times the weight, for the spar; 1 if not given */
  loadFactor?: number | undefined;
}
