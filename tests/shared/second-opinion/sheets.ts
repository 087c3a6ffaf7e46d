import type { Covering, Sheet, Skin, TipBlock } from '#shared/core/plan.ts';
import { FACES, type FaceName } from './contour.ts';
import { put, type Heap } from './heap.ts';
import { reach, tipBlockOf, type Half } from './half.ts';
import { depth, middle, NEAR, placeAt, walk } from './place.ts';
import { slicesOf, tipSlices } from './slices.ts';
import { emptyTally, putBoth, type Tally } from './tally.ts';

/** Bands of the developed face, a sheet being so thin that it lies in the section's own line. */
export function sliceSkin(half: Half, skin: Skin): Tally {
  const tally = emptyTally();
  tally.pieces = 1;
  for (const { ds, place } of slicesOf(half, skin)) {
    for (const face of FACES) {
      const limits = reach(skin, face);
      if (!limits) continue;
      walk(place, face, ...limits, (bit) => {
        putBoth(tally, half.hand, place, bit.length * ds, skin.thickness, bit);
      });
    }
  }
  return tally;
}

/** Bands of the whole face, and of the tip block's, which is the last section shrinking towards its centroid. */
export function sliceCovering(half: Half, covering: Covering): Tally {
  const tally = emptyTally();
  tally.pieces = 1;
  const share = 1 + covering.overlap;
  const faces = FACES.filter((face) => covering.seat === face || covering.seat === 'both');
  for (const { ds, place } of slicesOf(half, covering)) {
    for (const face of faces) {
      walk(place, face, 0, 1, (bit) => put(tally.area, half.hand, place, bit.length * ds * share, bit));
    }
  }
  const block = tipBlockOf(half);
  if (block && covering.to >= half.tip - NEAR) addTipFaces(tally.area, half, block, faces, share);
  return tally;
}

function addTipFaces(heap: Heap, half: Half, block: TipBlock, faces: FaceName[], share: number): void {
  const place = placeAt(half.surface, half.tip);
  const centroid = sectionCentroid(half);
  for (const { beyond, ds, scale } of tipSlices(block.length)) {
    for (const face of faces) {
      walk(place, face, 0, 1, (bit) =>
        put(heap, half.hand, place, bit.length * scale * ds * share, {
          x: centroid.x + (bit.x - centroid.x) * scale,
          rise: centroid.rise + (bit.rise - centroid.rise) * scale,
          beyond,
        }),
      );
    }
  }
}

/** Slices of the last section, shrinking like an ellipse. */
export function sliceTipBlock(half: Half, block: TipBlock): Tally {
  const tally = emptyTally();
  tally.pieces = 1;
  const place = placeAt(half.surface, half.tip);
  const { x, rise, area, spreadX, spreadRise } = sectionCentroid(half);
  for (const { beyond, ds, scale } of tipSlices(block.length)) {
    tally.length += ds;
    put(tally.volume, half.hand, place, area * scale ** 2 * ds * (1 - block.hollow), {
      x,
      rise,
      spreadX: spreadX * scale,
      spreadRise: spreadRise * scale,
      beyond,
    });
  }
  return tally;
}

/** The last section's area, centroid and root mean squares, by upright slabs. */
export function sectionCentroid(half: Half) {
  const place = placeAt(half.surface, half.tip);
  const sums = { area: 0, x: 0, rise: 0, xx: 0, zz: 0 };
  const slabs = 3000;
  for (let k = 0; k < slabs; k++) {
    const share = (k + 0.5) / slabs;
    const x = share * place.chord;
    const height = depth(place, share);
    const area = (height * place.chord) / slabs;
    const centre = middle(place, share);
    sums.area += area;
    sums.x += area * x;
    sums.rise += area * centre;
    sums.xx += area * x ** 2;
    sums.zz += area * (centre ** 2 + height ** 2 / 12);
  }
  const x = sums.x / sums.area;
  const rise = sums.rise / sums.area;
  const spreadX = Math.sqrt(Math.max(0, sums.xx / sums.area - x ** 2));
  const spreadRise = Math.sqrt(Math.max(0, sums.zz / sums.area - rise ** 2));
  return { area: sums.area, x, rise, spreadX, spreadRise };
}

/** The whole planform, tip block in, as a plate in the plane of the chords. */
export function sliceSheet(half: Half, sheet: Sheet): Tally {
  const tally = emptyTally();
  tally.pieces = 1;
  const kept = 1 - sheet.cutout;
  for (const { ds, place } of slicesOf(half, { from: 0, to: half.tip })) {
    const at = { x: place.chord / 2, rise: 0, spreadX: place.chord / Math.sqrt(12) };
    putBoth(tally, half.hand, place, place.chord * ds * kept, sheet.thickness, at);
  }
  const block = tipBlockOf(half);
  if (!block) return tally;
  const place = placeAt(half.surface, half.tip);
  const centroid = sectionCentroid(half);
  for (const { beyond, ds, scale } of tipSlices(block.length)) {
    const x = centroid.x + (place.chord / 2 - centroid.x) * scale;
    const at = { x, rise: 0, spreadX: (place.chord * scale) / Math.sqrt(12), beyond };
    putBoth(tally, half.hand, place, place.chord * scale * ds * kept, sheet.thickness, at);
  }
  return tally;
}
