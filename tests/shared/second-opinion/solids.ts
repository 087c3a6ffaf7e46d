import type { Vec3 } from '#shared/core/frame.ts';
import type { Bar, Plate } from '#shared/core/plan.ts';
import { crossSection } from './sticks.ts';
import { emptyTally, type Tally } from './tally.ts';

const SLICES = 4000;

/** Slices of a bar square to its axis; its width lies level, its height upright. */
export function sliceBar(bar: Bar): Tally {
  const tally = emptyTally();
  tally.pieces = 1;
  const axis = bar.to.map((end, i) => end - (bar.from[i] ?? 0)) as Vec3;
  tally.length = Math.hypot(...axis);
  const level = Math.hypot(axis[0], axis[1]);
  const across: Vec3 = level === 0 ? [0, 1, 0] : [-axis[1] / level, axis[0] / level, 0];
  const upright: Vec3 = cross(axis, across).map((v) => v / tally.length) as Vec3;
  for (let k = 0; k < SLICES; k++) {
    const share = (k + 0.5) / SLICES;
    const width = bar.width[0] + (bar.width[1] - bar.width[0]) * share;
    const height = bar.height[0] + (bar.height[1] - bar.height[0]) * share;
    const spread = Math.sqrt(bar.profile === 'rectangle' ? 12 : 16);
    const volume = (crossSection(bar, width, height) * tally.length) / SLICES;
    for (const [a, b] of [
      [1, 1],
      [1, -1],
      [-1, 1],
      [-1, -1],
    ] as const) {
      tally.volume.add(
        volume / 4,
        [0, 1, 2].map(
          (i) =>
            (bar.from[i] ?? 0) +
            (axis[i] ?? 0) * share +
            (a * width * (across[i] ?? 0)) / spread +
            (b * height * (upright[i] ?? 0)) / spread,
        ) as Vec3,
      );
    }
  }
  return tally;
}

const cross = (a: Vec3, b: Vec3): Vec3 => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];

/** Upright slabs of a plate's outline, inside and outside told apart by counting its edges. */
export function slicePlate(plate: Plate): Tally {
  const tally = emptyTally();
  tally.pieces = plate.count;
  const xs = plate.outline.map(([x]) => x);
  const [left, right] = [Math.min(...xs), Math.max(...xs)];
  const dx = (right - left) / SLICES;
  for (let k = 0; k < SLICES; k++) {
    const x = left + (k + 0.5) * dx;
    const hits = crossings(plate.outline, x);
    for (let j = 0; j + 1 < hits.length; j += 2) {
      const [low = 0, high = 0] = [hits[j], hits[j + 1]];
      const area = (high - low) * dx * plate.count * (1 - plate.cutout);
      const spread = (high - low) / Math.sqrt(12);
      for (const z of [(low + high) / 2 - spread, (low + high) / 2 + spread]) {
        tally.area.add(area / 2, [x, plate.y, z]);
        tally.volume.add((area / 2) * plate.thickness, [x, plate.y, z]);
      }
    }
  }
  return tally;
}

function crossings(outline: [number, number][], x: number): number[] {
  return outline
    .flatMap(([x0, z0], i) => {
      const [x1, z1] = outline[(i + 1) % outline.length] ?? [x0, z0];
      return x0 <= x !== x1 <= x ? [z0 + ((z1 - z0) * (x - x0)) / (x1 - x0)] : [];
    })
    .sort((a, b) => a - b);
}
