import type { Vec3 } from './frame.ts';
import { addAmount, emptyLump, type Lump } from './lump.ts';
import type { Notice } from './notices.ts';
import { stripProfile } from './parts/strip.ts';
import type { Basis, Measure } from './parts/measure.ts';
import type { Bar, Plate, Solid } from './plan.ts';
import { polygonIntegrals } from './polygon.ts';

/** Three Gauss–Legendre points: exact for a cross-section that grows as a square along the bar. */
const GAUSS: readonly [node: number, weight: number][] = [
  [0.1127016653792583, 5 / 18],
  [0.5, 8 / 18],
  [0.8872983346207417, 5 / 18],
];

/** A stick, block or tube between two points: cross-section integrated along its own length. */
function measureBar(bar: Bar, notice: (notice: Notice) => void): Measure {
  const path = `solid/${bar.id}`;
  if (bar.profile === 'tube' && 2 * (bar.wall ?? 0) > Math.min(...bar.width, ...bar.height)) {
    notice({ code: 'tube_wall_too_thick', path });
  }
  const run = bar.to.map((v, i) => v - (bar.from[i] ?? 0));
  const length = Math.hypot(...run);
  const lump = emptyLump();
  for (const [share, weight] of GAUSS) {
    const width = bar.width[0] + share * (bar.width[1] - bar.width[0]);
    const height = bar.height[0] + share * (bar.height[1] - bar.height[0]);
    const { area } = stripProfile(bar.profile, width, height, bar.wall);
    const at = bar.from.map((v, i) => v + share * (run[i] ?? 0)) as Vec3;
    addAmount(lump, area * length * weight, at);
  }
  return { pieces: 1, length, area: null, volume: lump.amount, lump };
}

/** Plates of one outline in x and z: area × thickness × count, less what is cut out. */
function measurePlate(plate: Plate, basis: Basis, notice: (notice: Notice) => void): Measure {
  const outline = polygonIntegrals(plate.outline);
  if (!outline.centroid) notice({ code: 'outline_without_area', path: `solid/${plate.id}` });
  const left = plate.count * (1 - plate.cutout);
  const area = outline.area * left;
  const amount = basis === 'volume' ? area * plate.thickness : area;
  const [x, z] = outline.centroid ?? plate.outline[0] ?? [0, 0];
  const scale = outline.area > 0 ? amount / outline.area : 0;
  const lump: Lump = {
    amount,
    first: [amount * x, amount * plate.y, amount * z],
    second: [scale * outline.secondX, amount * plate.y ** 2, scale * outline.secondZ],
  };
  return { pieces: plate.count, length: null, area, volume: area * plate.thickness, lump };
}

/**
 * What a solid measures, mm, mm², mm³, in body axes: a bar by its cross-section along its own length, a plate by
 * its outline. `basis` says by what its material is sold; `notice` is told of a wall too thick for its tube and of
 * an outline without area.
 * @example measureSolid(EXAMPLE_PLAN.solids[0], 'volume', () => undefined).volume // → 10_000
 */
export function measureSolid(solid: Solid, basis: Basis, notice: (notice: Notice) => void): Measure {
  return solid.shape === 'bar' ? measureBar(solid, notice) : measurePlate(solid, basis, notice);
}
