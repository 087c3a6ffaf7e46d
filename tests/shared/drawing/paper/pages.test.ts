import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { packed, stacked } from '#shared/drawing/paper/packing.ts';
import { FOOT, MARGIN, OVERLAP, PAPERS, tiled } from '#shared/drawing/paper/pages.ts';
import { boardDrawing, modelDrawing, ribDrawings } from '#shared/drawing/paper/true-drawings.ts';
import type { TrueDrawing } from '#shared/drawing/paper/true-size.ts';
import { boundsOf } from '#shared/drawing/shape.ts';
import { demoPlan } from '#tests/support/plans.ts';

const words = { length: (mm: number) => `${mm} mm` };
const frame = (width: number, height: number): TrueDrawing => ({
  title: 'frame',
  width,
  height,
  strokes: [
    {
      points: [
        [0, 0],
        [width, 0],
        [width, height],
        [0, height],
      ],
      closed: true,
      pen: 'cut',
    },
  ],
  letters: [],
});

describe('the pages of a drawing', () => {
  it('leave the room that printers leave white, and a foot for the check line', () => {
    const { window } = tiled(frame(100, 200), PAPERS.a4);
    expect(window).toEqual({ width: 210 - 2 * MARGIN, height: 297 - MARGIN - FOOT });
  });

  it('are one where it fits, laid the way that takes fewer', () => {
    expect(tiled(frame(190, 270), PAPERS.a4).pages).toHaveLength(1);
    const wide = tiled(frame(270, 150), PAPERS.a4);
    expect([wide.pages.length, wide.paper.width]).toEqual([1, 297]);
  });

  it('show every place of the drawing, neighbours the same strip of 10 mm', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1, max: 3000, noNaN: true }),
        fc.double({ min: 1, max: 3000, noNaN: true }),
        fc.double({ min: 0, max: 1, noNaN: true }),
        fc.constantFrom(PAPERS.a4, PAPERS.letter),
        (width, height, along, paper) => {
          // A line from corner to corner touches pages all over.
          const drawing = frame(width, height);
          const { pages, window } = tiled(drawing, paper);
          for (const [x, y] of [
            [along * width, 0],
            [width, along * height],
            [0, along * height],
          ] as const) {
            expect(
              pages.some(
                ({ at }) =>
                  x >= at[0] - 1e-6 &&
                  x <= at[0] + window.width + 1e-6 &&
                  y >= at[1] - 1e-6 &&
                  y <= at[1] + window.height + 1e-6,
              ),
            ).toBe(true);
          }
          const first = pages.find(({ row, column }) => row === 0 && column === 0);
          const next = pages.find(({ row, column }) => row === 0 && column === 1);
          if (first && next) expect(first.at[0] + window.width - next.at[0]).toBeCloseTo(OVERLAP, 9);
        },
      ),
      { numRuns: 200 },
    );
  });

  it('are numbered without those that would be empty', () => {
    const { pages, rows, columns } = tiled(frame(800, 800), PAPERS.a4);
    expect(rows * columns).toBeGreaterThan(pages.length);
    expect(pages.map(({ number }) => number)).toEqual(pages.map((_, i) => i + 1));
  });

  it('carry their register marks at one place of the drawing, on all pages that share it', () => {
    const { registers, pages, window } = tiled(frame(500, 150), PAPERS.a4);
    const sharing = registers.map(
      ([x, y]) =>
        pages.filter(
          ({ at }) => x >= at[0] && x <= at[0] + window.width && y >= at[1] && y <= at[1] + window.height,
        ).length,
    );
    expect(Math.max(...sharing)).toBe(2);
  });
});

describe('ribs on pages', () => {
  const plan = demoPlan('whimbrel');
  const ribs = ribDrawings(plan, plan.surfaces[0]!, 'starboard', words);

  it('are all there, none cut in two, none on another', () => {
    const pages = packed('ribs', ribs, PAPERS.a4)!;
    const cuts = pages.drawing.strokes.filter(({ pen }) => pen === 'cut');
    expect(cuts).toHaveLength(ribs.length);
    const boxes = cuts.map((stroke) => boundsOf([stroke])!);
    for (const [i, box] of boxes.entries()) {
      const page = Math.floor(box.min[1] / pages.window.height);
      expect(Math.floor(box.max[1] / pages.window.height)).toBe(page);
      expect(box.max[0]).toBeLessThanOrEqual(pages.window.width);
      for (const other of boxes.slice(i + 1)) {
        const apart =
          other.min[0] >= box.max[0] ||
          other.max[0] <= box.min[0] ||
          other.min[1] >= box.max[1] ||
          other.max[1] <= box.min[1];
        expect(apart).toBe(true);
      }
    }
  });

  it('are not packed where one is longer than a page', () => {
    expect(packed('ribs', [frame(400, 20)], PAPERS.a4)).toBeNull();
  });

  it('lie under each other in a file', () => {
    const file = stacked('ribs', ribs);
    expect(file.height).toBeCloseTo(
      ribs.reduce((sum, { height }) => sum + height + 3, -3),
      9,
    );
  });
});

describe('a drawing at its true size', () => {
  const plan = demoPlan('dunlin');

  it.each(['starboard', 'port'] as const)(
    'of the %s half is as long as its panels and its tip block',
    (side) => {
      const drawing = boardDrawing(plan, plan.surfaces[0]!, side, 50);
      const outline = boundsOf(drawing.strokes.filter(({ pen }) => pen === 'cut'))!;
      // 370 + 215 mm of panels and a tip of 22 mm
      expect(outline.max[0] - outline.min[0]).toBeCloseTo(607, 9);
      expect(drawing.letters.map(({ text }) => text)).toContain('balance');
    },
  );

  it('of the whole model is as wide as its span', () => {
    const drawing = modelDrawing(plan, 'whole');
    const outline = boundsOf(drawing.strokes.filter(({ pen }) => pen === 'cut'))!;
    expect(outline.max[0] - outline.min[0]).toBeCloseTo(1191.6, 1);
  });

  it('lies between 0 and its own width and height', () => {
    for (const drawing of [modelDrawing(plan, 'side'), modelDrawing(plan, 'front')]) {
      const { min, max } = boundsOf(drawing.strokes)!;
      expect(Math.min(...min)).toBeGreaterThanOrEqual(0);
      expect(max[0]).toBeLessThanOrEqual(drawing.width);
      expect(max[1]).toBeLessThanOrEqual(drawing.height);
    }
  });
});
