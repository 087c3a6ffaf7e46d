import { describe, expect, it } from 'vitest';
import { layoutSheet } from '#client/features/sheets/sheet-layout.ts';
import { checkCode, sheetMoment } from '#client/features/sheets/sheet-words.ts';
import { printedSheet } from '#shared/core/printed-sheet.ts';
import type { Line } from '#shared/core/result.ts';

/** A sheet of so many parts in four groups. */
function sheet(parts: number) {
  const lines = Array.from({ length: parts }, (_, i): Line => {
    const blank = { material: null, pieces: 1, length: null, area: null, volume: null };
    return {
      ...blank,
      id: `p${i}`,
      name: `Part ${i}`,
      group: `g${Math.floor((i * 4) / parts)}`,
      surface: null,
      mass: 1,
      u: 0,
      at: [0, 0, 0],
      moment: 0,
    };
  });
  return layoutSheet(printedSheet({ lines }), 'Plan');
}
const kinds = (layout: ReturnType<typeof sheet>) => layout.columns.flat().map(({ kind }) => kind);

describe('layoutSheet', () => {
  it.each([1, 12, 25, 26, 40, 60, 80, 90, 200, 4000])(
    'keeps %i parts within the room of one page',
    (parts) => {
      const layout = sheet(parts);
      const most = Math.max(...layout.columns.map(({ length }) => length)) + 1;
      expect(most * layout.rowHeight).toBeLessThanOrEqual(140 + 1e-9);
      expect(layout.rowHeight).toBeGreaterThanOrEqual(2.7);
      expect(kinds(layout).filter((kind) => kind === 'part').length + layout.partsLeftOut).toBe(parts);
      expect(kinds(layout).at(-1)).toBe('total');
    },
  );

  it('parts its columns at the head of a group, the total at the end', () => {
    const [left, right] = sheet(40).columns;
    expect(right?.[0]?.kind).toBe('group');
    expect(left?.some(({ kind }) => kind === 'total')).toBe(false);
  });

  it('leaves parts to the files only where two columns cannot be read', () => {
    expect(sheet(90).partsLeftOut).toBe(0);
    expect(sheet(200).partsLeftOut).toBe(200);
  });
});

describe('words of a sheet', () => {
  it('print the moment and the check code alike everywhere', () => {
    expect(sheetMoment('2026-12-01T09:30:59.000Z')).toBe('2026-12-01 09:30 UTC');
    expect(checkCode('0123456789abcdef0123')).toBe('0123 4567 89ab');
  });
});
