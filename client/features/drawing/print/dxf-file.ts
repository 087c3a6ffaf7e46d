import {
  DxfWriter,
  LWPolylineFlags,
  point2d,
  point3d,
  TextHorizontalAlignment,
  Units,
} from '@tarikjabiri/dxf';
import type { Lettering, Pen, TrueDrawing } from '#shared/drawing/paper/true-size.ts';

const ALIGNED: Record<Lettering['anchor'], TextHorizontalAlignment> = {
  start: TextHorizontalAlignment.Left,
  middle: TextHorizontalAlignment.Center,
  end: TextHorizontalAlignment.Right,
};
/** AutoCAD colour index: black or white, grey, blue. */
const COLOURS: Record<Pen, number> = { cut: 7, line: 8, hidden: 9, help: 5 };

/** A drawing as a DXF file, one unit a millimetre, y up; a layer for each kind of line. */
export function dxfFile({ strokes, letters, height }: TrueDrawing): string {
  const dxf = new DxfWriter();
  dxf.setUnits(Units.Millimeters);
  for (const pen of Object.keys(COLOURS) as Pen[]) dxf.addLayer(pen, COLOURS[pen], 'CONTINUOUS');
  dxf.addLayer('text', 7, 'CONTINUOUS');
  for (const { points, closed, pen } of strokes) {
    dxf.addLWPolyline(
      points.map(([x, y]) => ({ point: point2d(x, height - y) })),
      { flags: closed ? LWPolylineFlags.Closed : LWPolylineFlags.None, layerName: pen },
    );
  }
  for (const { at, text, size, anchor } of letters) {
    const place = point3d(at[0], height - at[1], 0);
    dxf.addText(place, size, text, {
      layerName: 'text',
      horizontalAlignment: ALIGNED[anchor],
      secondAlignmentPoint: place,
    });
  }
  return dxf.stringify();
}
