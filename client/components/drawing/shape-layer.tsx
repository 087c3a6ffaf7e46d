import { memo } from 'react';
import type { Shape } from '#shared/drawing/shape.ts';
import { lookOf, type Look } from './shape-look.ts';
import { pathOf, type Sheet } from './sheet.ts';

interface ShapeLayerProps {
  shapes: readonly Shape[];
  sheet: Sheet;
}

/** Thinner lines on a small drawing, so that ribs do not run together; px per mm. */
const weightAt = (scale: number) => Math.min(1, Math.max(0.4, scale));

/** Shapes that lie one on the other and look alike, such as all ribs of one wood. */
interface Alike {
  look: Look;
  shapes: Shape[];
}

/** Neighbours that are drawn the same way; a bore makes a shape one by itself, for it is filled by another rule. */
function alike(shapes: readonly Shape[]): Alike[] {
  const groups: Alike[] = [];
  let before = '';
  for (const shape of shapes) {
    const look = lookOf(shape);
    if (!look) continue;
    const seen = shape.hole ? '' : `${shape.kind} ${Object.values(look).join()}`;
    const last = groups.at(-1);
    if (last && seen !== '' && seen === before) last.shapes.push(shape);
    else groups.push({ look, shapes: [shape] });
    before = seen;
  }
  return groups;
}

/**
 * The drawing in pencil. Renders only when what is drawn or its scale changes, not when a part is picked; one
 * element for all that looks alike, for a browser styles, hatches and paints each element by itself.
 */
export const ShapeLayer = memo(function ShapeLayer({ shapes, sheet }: ShapeLayerProps) {
  const weight = weightAt(sheet.scale);
  return alike(shapes).map(({ look, shapes: group }, i) => (
    <ShapePath
      key={i}
      shapes={group}
      sheet={sheet}
      look={{ ...look, strokeWidth: look.strokeWidth * weight }}
    />
  ));
});

interface ShapePathProps extends ShapeLayerProps {
  look: Look;
}

export function ShapePath({ shapes, sheet, look }: ShapePathProps) {
  const d = shapes
    .map(
      ({ points, closed, hole }) => pathOf(sheet, points, closed) + (hole ? pathOf(sheet, hole, true) : ''),
    )
    .join('');
  const hollow = shapes.some(({ hole }) => hole !== undefined);
  return <path d={d} fillRule={hollow ? 'evenodd' : undefined} {...look} strokeLinejoin="round" />;
}
