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
  mac: number;
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

export interface Inertia {
  xx: number;
  yy: number;
  zz: number;
}

export interface Totals {
  mass: number;
  u: number;
  /** null when nothing has a mass */
  at: Vec3 | null;
  wingMass: number;
  byGroup: Record<string, number>;
  /** about axes through the balance point, g·mm² */
  inertia: Inertia | null;
}

export interface Balance {
  /** mm aft of the datum */
  x: number | null;
  u: number | null;
  percentMac: number | null;
  uPercentMac: number | null;
  /** mm aft of the datum; null where there is no tailplane */
  neutralPoint: number | null;
  /** fraction of MAC */
  staticMargin: number | null;
}

export interface Loading {
  /** g/dm² of projected wing area */
  wing: number | null;
  /** dm², wing and tailplane projected, carried through the fuselage */
  classArea: number | null;
  /** g/dm² */
  classLoading: number | null;
}

export interface Speeds {
  /** m/s */
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
