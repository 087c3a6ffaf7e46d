import type { Lump } from '../lump.ts';

/** What one part of one half measures. The lump is in mm³, or in mm² where the material is sold by area. */
export interface Measure {
  pieces: number;
  /** mm, all pieces */
  length: number | null;
  /** mm², all pieces */
  area: number | null;
  /** mm³, all pieces; null where only an area is known */
  volume: number | null;
  lump: Lump;
}

/** What the material is known by: its density, kg/m³ (`volume`), or its areal mass, g/m² (`area`). */
export type Basis = 'volume' | 'area';
