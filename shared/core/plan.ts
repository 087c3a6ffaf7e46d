import type { Vec3 } from './frame.ts';

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

export type MaterialCategory = 'wood' | 'composite' | 'metal' | 'sheet' | 'covering' | 'finish' | 'adhesive';

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

export type SurfaceRole = 'wing' | 'tailplane' | 'fin';

export interface Surface {
  key: string;
  role: SurfaceRole;
  /** root leading edge of the starboard half */
  apex: Vec3;
  mirrored: boolean;
  /** root to tip */
  panels: Panel[];
  parts: Part[];
}

export interface Panel {
  /** along the panel as laid on the board, mm */
  span: number;
  rootChord: number;
  tipChord: number;
  /** how far aft the tip's leading edge lies of the root's, mm */
  sweep: number;
  /** degrees from the horizontal; a fin stands at 90 */
  dihedral: number;
  rootSection: SectionSpec;
  tipSection: SectionSpec;
}

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

/** A value at `from` and one at `to`, linear in s between them. */
export type Pair = [atFrom: number, atTo: number];
export type Side = 'both' | 'port' | 'starboard';
export type Face = 'top' | 'bottom' | 'both';
export type StripSeat = 'top' | 'bottom' | 'middle' | 'nose' | 'tail';
export type StripProfile = 'rectangle' | 'triangle' | 'round' | 'tube';

interface PartBase {
  id: string;
  name: string;
  material: string;
  group?: string | undefined;
  side?: Side | undefined;
}

export interface Ribs extends PartBase {
  kind: 'ribs';
  /** either the stations themselves … */
  stations?: number[] | undefined;
  /** … or equal steps, both ends included */
  from?: number | undefined;
  to?: number | undefined;
  count?: number | undefined;
  thickness: number;
  /** share removed, 0–0.9 */
  lightening: number;
}

export interface Strip extends PartBase {
  kind: 'strip';
  from: number;
  to: number;
  /** x/c of its centre line; not needed for `nose` and `tail` */
  at?: Pair | undefined;
  seat: StripSeat;
  /** along x, mm */
  width: Pair;
  /** along z, mm */
  height: Pair;
  profile: StripProfile;
  /** wall of a tube, mm */
  wall?: number | undefined;
  /** lies in a notch of the ribs; not needed for `nose` and `tail`, where the rib ends */
  letIn?: boolean | undefined;
}

export interface Skin extends PartBase {
  kind: 'skin';
  from: number;
  to: number;
  start: number;
  end: number;
  /** `wrap`: from `start` on top, forward round the nose, to `end` on the bottom */
  seat: 'top' | 'bottom' | 'wrap';
  thickness: number;
}

export interface CapStrips extends PartBase {
  kind: 'capStrips';
  from: number;
  to: number;
  start: number;
  end: number;
  seat: Face;
  width: number;
  thickness: number;
}

export interface Web extends PartBase {
  kind: 'web';
  from: number;
  to: number;
  at: Pair;
  thickness: number;
}

export interface TipBlock extends PartBase {
  kind: 'tipBlock';
  length: number;
  /** share hollowed out, 0–0.9 */
  hollow: number;
}

export interface Sheet extends PartBase {
  kind: 'sheet';
  thickness: number;
  /** share cut out, 0–0.9 */
  cutout: number;
}

export interface Covering extends PartBase {
  kind: 'covering' | 'finish';
  from: number;
  to: number;
  seat: Face;
  /** share added for overlaps and seams */
  overlap: number;
}

export interface Glue extends PartBase {
  kind: 'glue';
  method: 'share' | 'joints';
  /** of the surface's wood mass, for `share` */
  share?: number | undefined;
  /** for `joints` */
  layers?: number | undefined;
}

export type Part = Ribs | Strip | Skin | CapStrips | Web | TipBlock | Sheet | Covering | Glue;
export type PartKind = Part['kind'];

/** Whatever has a mass and an arm. */
export interface Item {
  id: string;
  name: string;
  group: string;
  mass: number;
  /** standard uncertainty, g */
  u?: number | undefined;
  at: Vec3;
}

interface SolidBase {
  id: string;
  name: string;
  group: string;
  material: string;
}

export interface Bar extends SolidBase {
  shape: 'bar';
  from: Vec3;
  to: Vec3;
  width: Pair;
  height: Pair;
  profile: 'rectangle' | 'round' | 'tube';
  wall?: number | undefined;
}

export interface Plate extends SolidBase {
  shape: 'plate';
  /** closed outline in x, z */
  outline: [x: number, z: number][];
  thickness: number;
  count: number;
  /** plane of the plate, or of the middle of several */
  y: number;
  /** share cut out, 0–0.9 */
  cutout: number;
}

export type Solid = Bar | Plate;

/** Wanted balance, ± in % of mean aerodynamic chord. */
export interface Target {
  percentMac: number;
  tolerance: number;
}

export interface Flight {
  clMax?: number | undefined;
  /** kg/m³ */
  airDensity?: number | undefined;
  loadFactor?: number | undefined;
}
