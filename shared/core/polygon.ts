/** A corner. */
export type Point = readonly [x: number, z: number];

/** What an outline encloses, in the powers of its unit. */
export interface PolygonIntegrals {
  /** never negative, whichever way round the points run */
  area: number;
  /** null where there is no area */
  centroid: [x: number, z: number] | null;
  /** ∫x² and ∫z² over the area about the origin */
  secondX: number;
  secondZ: number;
}

/**
 * Area, centroid and second moments of a polygon (P. Bourke, "Calculating the area and centroid of a polygon",
 * 1988) given by its corners in order, in the powers of their unit; it closes by itself. All noughts, and no
 * centroid, where it holds no area; one that crosses itself is not for this.
 * @example polygonIntegrals([[0, 0], [6, 0], [0, 3]]).area // → 9
 * @example polygonIntegrals([[0, 0], [6, 0], [0, 3]]).centroid // → [2, 1]
 */
export function polygonIntegrals(points: readonly Point[]): PolygonIntegrals {
  // About the first corner, so that a small plate far from the datum loses no digits.
  const [ox, oz] = points[0] ?? [0, 0];
  let twice = 0;
  let [mx, mz, xx, zz] = [0, 0, 0, 0];
  points.forEach((point, i) => {
    const next = points[(i + 1) % points.length] ?? point;
    const [x0, z0, x1, z1] = [point[0] - ox, point[1] - oz, next[0] - ox, next[1] - oz];
    const cross = x0 * z1 - x1 * z0;
    twice += cross;
    mx += (x0 + x1) * cross;
    mz += (z0 + z1) * cross;
    xx += (x0 * x0 + x0 * x1 + x1 * x1) * cross;
    zz += (z0 * z0 + z0 * z1 + z1 * z1) * cross;
  });
  const sign = Math.sign(twice);
  const area = (sign * twice) / 2;
  if (area === 0) return { area: 0, centroid: null, secondX: 0, secondZ: 0 };
  const [cx, cz] = [mx / (3 * twice), mz / (3 * twice)];
  return {
    area,
    centroid: [ox + cx, oz + cz],
    secondX: (sign * xx) / 12 + area * (2 * ox * cx + ox * ox),
    secondZ: (sign * zz) / 12 + area * (2 * oz * cz + oz * oz),
  };
}
