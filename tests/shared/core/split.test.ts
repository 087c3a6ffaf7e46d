import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { equalParts, splitPiece } from '#shared/core/split.ts';

const sheet = { length: 914, width: 76, thickness: 1.6 };

describe('a split piece', () => {
  it('keeps its other measures, and shares its mass by volume', () => {
    const found = splitPiece(sheet, 20, { along: 'width', wanted: [38], kerf: 0 });
    expect(found).toEqual({
      parts: [{ size: { length: 914, width: 38, thickness: 1.6 }, mass: 10 }],
      rest: { size: { length: 914, width: 38, thickness: 1.6 }, mass: 10 },
      lost: 0,
    });
  });

  it('pays a cut for each piece, but none at an end where nothing is left', () => {
    // 2 × 456 and one cut of 2 between them are 914: no cut behind the second.
    const found = splitPiece(sheet, null, { along: 'length', wanted: [456, 456], kerf: 2 });
    expect(found).toMatchObject({ rest: null, lost: 2 });
  });

  it('counts a rest thinner than a cut as lost', () => {
    expect(splitPiece(sheet, 20, { along: 'length', wanted: [913], kerf: 2 })).toMatchObject({
      rest: null,
      lost: 1,
    });
  });

  it('says by how much it is too short', () => {
    expect(splitPiece(sheet, 20, { along: 'length', wanted: [500, 415], kerf: 1 })).toEqual({ shortBy: 2 });
  });

  it('never gains length or mass, whatever is cut', () => {
    const measure = fc.double({ min: 1, max: 400, noNaN: true });
    fc.assert(
      fc.property(
        fc.array(measure, { minLength: 1, maxLength: 6 }),
        fc.double({ min: 0, max: 5, noNaN: true }),
        (wanted, kerf) => {
          const found = splitPiece(sheet, 20, { along: 'length', wanted, kerf });
          if ('shortBy' in found) {
            expect(found.shortBy).toBeGreaterThan(0);
            return;
          }
          const all = [...found.parts, ...(found.rest ? [found.rest] : [])];
          const length = all.reduce((sum, { size }) => sum + size.length, found.lost);
          const mass = all.reduce((sum, one) => sum + (one.mass ?? Number.NaN), 0);
          expect(length).toBeCloseTo(914, 9);
          expect(mass).toBeCloseTo((20 * (914 - found.lost)) / 914, 9);
        },
      ),
    );
  });
});

describe('equal parts', () => {
  it('use the whole piece up', () => {
    expect(splitPiece(sheet, 20, { along: 'width', wanted: equalParts(76, 4, 1), kerf: 1 })).toMatchObject({
      rest: null,
      lost: 3,
    });
  });

  it('are none where the cuts eat it all', () => {
    expect(equalParts(10, 6, 2)).toEqual([]);
  });
});
