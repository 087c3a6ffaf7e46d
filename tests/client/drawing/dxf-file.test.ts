import { describe, expect, it } from 'vitest';
import { dxfFile } from '#client/features/drawing/print/dxf-file.ts';
import { boardDrawing } from '#shared/drawing/paper/true-drawings.ts';
import { demoPlan } from '#tests/support/plans.ts';

/** Group codes and their values, two lines each (DXF Reference, “Group codes in DXF files”). */
function groupsOf(text: string): [code: number, value: string][] {
  const lines = text.split(/\r?\n/);
  return Array.from({ length: Math.floor(lines.length / 2) }, (_, i) => [
    Number(lines[2 * i]),
    lines[2 * i + 1] ?? '',
  ]);
}

describe('a DXF file', () => {
  const plan = demoPlan('dunlin');
  const drawing = boardDrawing(plan, plan.surfaces[0]!, 'starboard');
  const groups = groupsOf(dxfFile(drawing));

  it('says that its unit is the millimetre', () => {
    const units = groups.findIndex(([code, value]) => code === 9 && value === '$INSUNITS');
    // 4: millimetres (DXF Reference, header variables)
    expect(groups[units + 1]).toEqual([70, '4']);
  });

  it('holds every line, with y up, on the layer of its kind', () => {
    const lines = groups.filter(([code, value]) => code === 0 && value === 'LWPOLYLINE');
    expect(lines).toHaveLength(drawing.strokes.length);
    const layers = new Set(groups.filter(([code]) => code === 8).map(([, value]) => value));
    for (const layer of ['cut', 'line', 'hidden', 'help', 'text']) expect(layers).toContain(layer);
    const first = groups.findIndex(([code, value]) => code === 0 && value === 'LWPOLYLINE');
    const [x, y] = [10, 20].map((wanted) => groups.slice(first).find(([code]) => code === wanted)?.[1]);
    const corner = drawing.strokes[0]!.points[0]!;
    expect([Number(x), Number(y)]).toEqual([
      expect.closeTo(corner[0], 6),
      expect.closeTo(drawing.height - corner[1], 6),
    ]);
  });
});
