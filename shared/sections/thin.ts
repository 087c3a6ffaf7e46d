type Point = readonly [number, number];

/** Distance of a point from the stretch between two others. */
function off([px, pz]: Point, [ax, az]: Point, [bx, bz]: Point): number {
  const [dx, dz] = [bx - ax, bz - az];
  const square = dx * dx + dz * dz;
  const f = square > 0 ? Math.min(1, Math.max(0, ((px - ax) * dx + (pz - az) * dz) / square)) : 0;
  return Math.hypot(px - ax - f * dx, pz - az - f * dz);
}

/**
 * A line with the points left out that lie within a tolerance of what is left (Ramer 1972, Douglas and Peucker 1973).
 * Its ends stay.
 * @example thin([[0, 0], [1, 0.001], [2, 0]], 0.01) // → [[0, 0], [2, 0]]
 */
export function thin<P extends Point>(line: readonly P[], tolerance: number): P[] {
  const keep = new Set([0, line.length - 1]);
  const open: [number, number][] = [[0, line.length - 1]];
  for (let stretch = open.pop(); stretch; stretch = open.pop()) {
    const [from, to] = stretch;
    const [a, b] = [line[from], line[to]];
    if (!a || !b) continue;
    let [farthest, most] = [-1, tolerance];
    for (let i = from + 1; i < to; i++) {
      const point = line[i];
      const far = point ? off(point, a, b) : 0;
      if (far > most) [farthest, most] = [i, far];
    }
    if (farthest < 0) continue;
    keep.add(farthest);
    open.push([from, farthest], [farthest, to]);
  }
  return line.filter((_, i) => keep.has(i));
}

/** Finest and coarsest tolerance, shares of the chord, and the step between those tried. */
const FINEST = 1e-7;
const STEP = 1.5;

/** Lines thinned alike, as little as it takes to leave no more than `most` points of them together. */
export function thinnedTo<P extends Point>(
  lines: readonly (readonly P[])[],
  most: number,
): { lines: P[][]; tolerance: number } {
  let tolerance = FINEST;
  let thinned = lines.map((line) => thin(line, tolerance));
  while (thinned.reduce((sum, line) => sum + line.length, 0) > most) {
    tolerance *= STEP;
    thinned = lines.map((line) => thin(line, tolerance));
  }
  return { lines: thinned, tolerance };
}
