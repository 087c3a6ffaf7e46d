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

/** The drawing in pencil. Renders only when what is drawn or its scale changes, not when a part is picked. */
export const ShapeLayer = memo(function ShapeLayer({ shapes, sheet }: ShapeLayerProps) {
  const weight = weightAt(sheet.scale);
  return shapes.map((shape, i) => {
    const look = lookOf(shape);
    const thin = look && { ...look, strokeWidth: look.strokeWidth * weight };
    return thin && <ShapePath key={i} shape={shape} sheet={sheet} look={thin} />;
  });
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
        return look && <ShapePath key={i} shape={shape} sheet={sheet} look={look} />;
      })}
    </g>
  );
}

function ShapePath({ shape, sheet, look }: { shape: Shape; sheet: Sheet; look: Look }) {
  const outer = pathOf(sheet, shape.points, shape.closed);
  const d = shape.hole ? `${outer}${pathOf(sheet, shape.hole, true)}` : outer;
  return <path d={d} fillRule={shape.hole ? 'evenodd' : undefined} {...look} strokeLinejoin="round" />;
}
