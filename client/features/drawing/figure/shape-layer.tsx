import { memo, useMemo } from 'react';
import type { Shape } from '#shared/drawing/shape.ts';
import { useHovered, type Hover } from '../hover.ts';
import { hoveredLook, lookOf, pickedLook, type Look } from './shape-look.ts';
import { pathOf, type Sheet } from './sheet.ts';

interface ShapeLayerProps {
  shapes: readonly Shape[];
  sheet: Sheet;
}

/** Thinner lines on a small drawing, so that ribs do not run together; px per mm. */
const weightAt = (scale: number) => Math.min(1, Math.max(0.4, scale));

/** Shapes that lie one on the other and look alike, such as the ribs of one part. */
interface Alike {
  look: Look;
  shapes: Shape[];
}

function alike(shapes: readonly Shape[]): Alike[] {
  const groups: Alike[] = [];
  let before: Shape | null = null;
  for (const shape of shapes) {
    const last = groups.at(-1);
    const same = before?.line === shape.line && before.kind === shape.kind && before.hidden === shape.hidden;
    before = shape;
    const look = lookOf(shape);
    if (!look) continue;
    if (same && last) last.shapes.push(shape);
    else groups.push({ look, shapes: [shape] });
  }
  return groups;
}

/**
 * The drawing in pencil. Renders only when what is drawn or its scale changes, not when a part is picked; one
 * element for all ribs of a part, for a browser restyles each element that moves.
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

interface LitLayerProps extends ShapeLayerProps {
  picked: string | null;
  hover: Hover;
  /** a section, on which ribs are seen from the side */
  cut?: boolean;
}

/** What is picked and what the pointer is over, in ink over the pencil. */
export function LitLayer({ shapes, sheet, picked, hover, cut = false }: LitLayerProps) {
  const hovered = useHovered(hover);
  const lit = useMemo(
    () => shapes.filter(({ line }) => line !== null && (line === picked || line === hovered)),
    [shapes, picked, hovered],
  );
  return (
    <g pointerEvents="none">
      {lit.map((shape, i) => {
        const look = shape.line === picked ? pickedLook(shape, cut) : hoveredLook(shape);
        return look && <ShapePath key={i} shapes={[shape]} sheet={sheet} look={look} />;
      })}
    </g>
  );
}

function ShapePath({ shapes, sheet, look }: { shapes: readonly Shape[]; sheet: Sheet; look: Look }) {
  const d = shapes
    .map(
      ({ points, closed, hole }) => pathOf(sheet, points, closed) + (hole ? pathOf(sheet, hole, true) : ''),
    )
    .join('');
  const hollow = shapes.some(({ hole }) => hole !== undefined);
  return <path d={d} fillRule={hollow ? 'evenodd' : undefined} {...look} strokeLinejoin="round" />;
}
