import type { Vec3 } from './frame.ts';
import type { Notice } from './notices.ts';

/** Planform of one surface, both halves of a mirrored one. mm, mm². `null` where it does not exist. */
export interface Planform {
  areaDeveloped: number;
  areaProjected: number;
  /** tip to tip, projected, tip blocks in */
  span: number;
  /** span² / areaProjected; null for a surface that casts no shadow */
  aspectRatio: number | null;
  /** mean aerodynamic chord */
  mac: number;
  /** where its leading edge lies, mm aft of the datum, and how far out on the half */
  xLeMac: number;
  yMac: number;
}

/** One part, item or solid; a mirrored part is one line holding both halves. */
export interface Line {
  /** `<surface>/<id>`, `item/<id>` or `solid/<id>` */
  id: string;
  name: string;
  group: string;
  /** key of the surface, null for items and solids */
  surface: string | null;
  /** key of the material, null for items */
  material: string | null;
  pieces: number;
  /** all pieces together, mm; null where a length says nothing */
  length: number | null;
  /** all pieces together, mm²; null where an area says nothing */
  area: number | null;
  /** mm³; null where the part is known by its area or its mass only */
  volume: number | null;
  /** g */
  mass: number;
  /** standard uncertainty of the mass, g */
  u: number;
  /** centre of mass */
  at: Vec3;
  /** mass × x about the datum, g·mm */
  moment: number;
}

/** Moments of inertia about the body axes through the balance point, g·mm². */
export interface Inertia {
  xx: number;
  yy: number;
  zz: number;
}

/** The whole model. */
export interface Totals {
  /** g */
  mass: number;
  /** standard uncertainty of the mass, g */
  u: number;
  /** balance point; null when nothing has a mass */
  at: Vec3 | null;
  /** parts of all wings, g */
  wingMass: number;
  /** g, by the group of the lines */
  byGroup: Record<string, number>;
  inertia: Inertia | null;
}

/** Where the model balances. `null` where there is no mass, or no wing to tell it by. */
export interface Balance {
  /** mm aft of the datum */
  x: number | null;
  /** standard uncertainty of x, mm */
  u: number | null;
  /** x in % of the wing's mean aerodynamic chord, and its standard uncertainty */
  percentMac: number | null;
  uPercentMac: number | null;
  /** mm aft of the datum; null where there is no tailplane */
  neutralPoint: number | null;
  /** fraction of MAC */
  staticMargin: number | null;
}

/** Mass by area; `null` without the area. */
export interface Loading {
  /** g/dm² of projected wing area */
  wing: number | null;
  /** dm², wing and tailplane projected, carried through the fuselage */
  classArea: number | null;
  /** g/dm² */
  classLoading: number | null;
}

/** Speeds of flight; `null` without mass or wing. */
export interface Speeds {
  /** m/s, at the greatest lift coefficient */
  stall: number | null;
  /** on the MAC, at the stall speed */
  reynolds: number | null;
}

/** The spar where a station cuts it. */
export interface SparStation {
  /** mm from the root */
  s: number;
  /** bending moment, N·mm */
  moment: number;
  /** MPa, in the outer fibre of the strip nearest to its strength */
  stress: number;
  /** strength over stress */
  margin: number;
}

/** Bending of the spar along the half span. */
export interface Spar {
  stations: SparStation[];
  /** station of the least margin, mm from the root; null where no strip carries */
  worst: number | null;
}

/** What `estimate(plan)` answers; the body of the answer of `POST /api/estimates`. */
export interface Estimate {
  planform: Record<string, Planform>;
  lines: Line[];
  totals: Totals;
  balance: Balance;
  loading: Loading;
  speeds: Speeds;
  spar: Spar;
  notices: Notice[];
}
