import { array, assert, integer, property, record } from 'fast-check';
import { describe, expect, it } from 'vitest';
import { laySheet, type Laid, type Rectangle } from '#shared/core/cut/lay-sheet.ts';
import { packSheets } from '#shared/core/cut/pack-sheets.ts';

const rectangles = (max: number) =>
  array(record({ length: integer({ min: 5, max: 300 }), width: integer({ min: 3, max: 100 }) }), {
    minLength: 1,
    maxLength: max,
  }).map((sizes) => sizes.map((size, i): Rectangle => ({ id: String(i), ...size })));

function expectCut(
  laid: readonly Laid[],
  blanks: readonly Rectangle[],
  sheet: { length: number; width: number },
  kerf: number,
) {
  const sizeOf = (id: string) => blanks.find((blank) => blank.id === id)!;
  const boxes = laid.map(({ id, at }) => {
    const { length, width } = sizeOf(id);
    return { x: at[0], y: at[1], right: at[0] + length, top: at[1] + width };
  });
  for (const [i, a] of boxes.entries()) {
    expect(a.x).toBeGreaterThanOrEqual(0);
    expect(a.y).toBeGreaterThanOrEqual(0);
    expect(a.right).toBeLessThanOrEqual(sheet.length + 1e-5);
    expect(a.top).toBeLessThanOrEqual(sheet.width + 1e-5);
    for (const b of boxes.slice(i + 1)) {
      const apartAlong = Math.max(b.x - a.right, a.x - b.right);
      const apartAcross = Math.max(b.y - a.top, a.y - b.top);
      expect(Math.max(apartAlong, apartAcross)).toBeGreaterThanOrEqual(kerf - 1e-5);
    }
  }
}

describe('rectangles on a sheet', () => {
  it('lie on it, a saw’s cut apart, whichever they are', () => {
    assert(
      property(rectangles(12), integer({ min: 0, max: 3 }), (blanks, kerf) => {
        const sheet = { length: 400, width: 100 };
        const laid = laySheet(blanks, sheet, kerf);
        if (!laid) return;
        expect(laid.map(({ id }) => id).toSorted()).toEqual(blanks.map(({ id }) => id).toSorted());
        expectCut(laid, blanks, sheet, kerf);
      }),
      { numRuns: 1000, seed: 1 },
    );
  });

  it('still lie on it when one is taken away', () => {
    assert(
      property(rectangles(8), (blanks) => {
        const sheet = { length: 400, width: 100 };
        if (!laySheet(blanks, sheet, 1)) return;
        for (const gone of blanks) {
          expect(
            laySheet(
              blanks.filter((blank) => blank !== gone),
              sheet,
              1,
            ),
          ).not.toBeNull();
        }
      }),
      { numRuns: 500, seed: 2 },
    );
  });

  it('are found room where the usual way finds none', () => {
    // Widest first puts 60 and 60 beside each other and leaves no strip long enough for the 90 and the 30.
    const sizes = [
      [60, 50],
      [90, 50],
      [60, 50],
      [30, 50],
    ] as const;
    const blanks = sizes.map(([length, width], i) => ({ id: String(i), length, width }));
    const sheet = { length: 120, width: 100 };
    const laid = laySheet(blanks, sheet, 0);
    expect(laid).toHaveLength(4);
    expectCut(laid ?? [], blanks, sheet, 0);
  });
});

describe('sheets for many rectangles', () => {
  const sheet = { length: 1000, width: 100 };

  it('are as few as the least there can be, where that is known', () => {
    // 24 pieces of 249 × 49: eight to a sheet with cuts of 1 mm.
    const blanks = Array.from({ length: 24 }, (_, i) => ({ id: String(i), length: 249, width: 49 }));
    expect(packSheets(blanks, { atHand: [], bought: sheet, kerf: 1 })).toMatchObject({ bought: 3, bound: 3 });
    // Five pieces of 600 × 60: no two on one sheet.
    const large = Array.from({ length: 5 }, (_, i) => ({ id: String(i), length: 600, width: 60 }));
    expect(packSheets(large, { atHand: [], bought: sheet, kerf: 1 })).toMatchObject({ bought: 5, bound: 5 });
  });

  it('are never fewer than the bound, and what is at hand is cut first', () => {
    assert(
      property(rectangles(30), (blanks) => {
        const hand = { id: 'No. 1', length: 500, width: 75 };
        const { sheets, bought, bound, tooLarge, unplaced } = packSheets(blanks, {
          atHand: [hand],
          bought: sheet,
          kerf: 1,
        });
        expect(bought).toBeGreaterThanOrEqual(bound);
        expect(unplaced).toEqual([]);
        expect(tooLarge).toEqual([]);
        expect(sheets.flatMap(({ laid }) => laid)).toHaveLength(blanks.length);
        for (const each of sheets) expectCut(each.laid, blanks, each, 1);
      }),
      { numRuns: 300, seed: 3 },
    );
  });

  it('tell what is larger than any, and what finds no place where nothing may be bought', () => {
    const blanks = [
      { id: 'long', length: 1200, width: 20 },
      { id: 'fits', length: 200, width: 20 },
    ];
    expect(packSheets(blanks, { atHand: [], bought: sheet, kerf: 1 }).tooLarge).toEqual(['long']);
    const hand = { id: 'No. 1', length: 150, width: 75 };
    const none = packSheets(blanks, { atHand: [hand], bought: null, kerf: 1 });
    expect([none.tooLarge, none.bought]).toEqual([['long', 'fits'], 0]);
  });
});
