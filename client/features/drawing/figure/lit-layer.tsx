import { useMemo } from 'react';
import { ShapePath } from '#client/components/drawing/shape-layer.tsx';
import { hoveredLook, pickedLook } from '#client/components/drawing/shape-look.ts';
import type { Sheet } from '#client/components/drawing/sheet.ts';
import type { Shape } from '#shared/drawing/shape.ts';
import { useHovered, type Hover } from '../hover.ts';

interface LitLayerProps {
  shapes: readonly Shape[];
  sheet: Sheet;
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
