/** A value at `from` and one at `to`, linear in s between them. */
export type Pair = [atFrom: number, atTo: number];
/** The half of a mirrored surface that a part is on. */
export type Side = 'both' | 'port' | 'starboard';
/** The faces of the section that a part lies on. */
export type Face = 'top' | 'bottom' | 'both';
/** A strip's place on the section; a `nose` or `tail` strip is the surface's edge. */
export type StripSeat = 'top' | 'bottom' | 'middle' | 'nose' | 'tail';
/** A strip's cross-section; a triangle's thick edge looks forward. */
export type StripProfile = 'rectangle' | 'triangle' | 'round' | 'tube';

/**
 * What all parts have. In every part `from` and `to` are stations, mm, both ends included; `start` and `end` are
 * x/c; lengths, widths and thicknesses are mm.
 */
interface PartBase {
  id: string;
  name: string;
  /** key into the plan's materials */
  material: string;
  /** the surface's key if not given */
  group?: string | undefined;
  /** `both` if not given */
  side?: Side | undefined;
}

/** Ribs of one thickness. */
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

/** A spar, stringer or edge. */
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

/** Sheeting. */
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

/** Strips over the edges of the ribs that lie in their range. */
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

/** A shear web between the ribs, grain upright. */
export interface Web extends PartBase {
  kind: 'web';
  from: number;
  to: number;
  /** x/c */
  at: Pair;
  thickness: number;
}

/** Half an ellipsoid on the last section. */
export interface TipBlock extends PartBase {
  kind: 'tipBlock';
  /** beyond the last station */
  length: number;
  /** share hollowed out, 0–0.9 */
  hollow: number;
}

/** A plate of the surface's whole planform. */
export interface Sheet extends PartBase {
  kind: 'sheet';
  thickness: number;
  /** share cut out, 0–0.9 */
  cutout: number;
}

/** Tissue, film, dope and the like, by area. */
export interface Covering extends PartBase {
  kind: 'covering' | 'finish';
  from: number;
  to: number;
  seat: Face;
  /** share added for overlaps and seams */
  overlap: number;
}

/** Glue by a share of the wood, or by the area of all joints. */
export interface Glue extends PartBase {
  kind: 'glue';
  method: 'share' | 'joints';
  /** of the surface's wood mass, for `share` */
  share?: number | undefined;
  /** times that the joints are coated, for `joints`; 1 if not given */
  layers?: number | undefined;
}

/** Whatever a surface is built of. */
export type Part = Ribs | Strip | Skin | CapStrips | Web | TipBlock | Sheet | Covering | Glue;
/** What a part is. */
export type PartKind = Part['kind'];
