import { useId, useMemo } from 'react';
import { useUnits } from '#client/lib/units.ts';
import { lineAt, targetsOf } from '#shared/drawing/hit.ts';
import type { SectionView } from '#shared/drawing/section-view.ts';
import type { Point } from '#shared/drawing/shape.ts';
import type { Hover } from '../hover.ts';
import { ShapeLayer } from '#client/components/drawing/shape-layer.tsx';
import { LitLayer } from './lit-layer.tsx';
import { SheetText } from '#client/components/drawing/sheet-text.tsx';
import { fromPx, toPx, type Sheet } from '#client/components/drawing/sheet.ts';
import { useDrag } from './use-drag.ts';

interface SectionDrawingProps {
  section: SectionView;
  paper: { sheet: Sheet; width: number; height: number };
  /** thickness, in words */
  thick: string;
  /** the section in a sentence */
  sentence: string;
  picked: string | null;
  hover: Hover;
  onPick: (line: string) => void;
}

/** How near to a thin part the pointer must be, px. */
const REACH = 4;

/** The section itself, with its chord as a dimension under it. */
export function SectionDrawing(props: SectionDrawingProps) {
  const { section, thick, sentence, picked, hover } = props;
  const { sheet, width, height } = props.paper;
  const { shapes } = section;
  const id = useId();
  const units = useUnits();
  const targets = useMemo(() => targetsOf(shapes), [shapes]);
  const find = (at: Point) => lineAt(targets, fromPx(sheet, at), REACH / sheet.scale);
  const drag = useDrag({
    onPress: (at) => {
      const line = find(at);
      if (line !== null) props.onPick(line);
    },
    onHover: (at) => hover.set(at && find(at)),
    onDrag: () => undefined,
  });
  const [[x0], [x1]] = [toPx(sheet, [0, 0]), toPx(sheet, [section.chord, 0])];
  return (
    <svg
      role="img"
      aria-labelledby={id}
      width={width}
      height={height}
      {...drag}
      className="block touch-pan-y"
    >
      <title id={id}>{sentence}</title>
      <ShapeLayer shapes={shapes} sheet={sheet} />
      <LitLayer cut {...{ shapes, sheet, picked, hover }} />
      <g pointerEvents="none">
        <path
          d={`M${x0} ${height - 26}v10M${x1} ${height - 26}v10M${x0} ${height - 21}H${x1}`}
          stroke="var(--graphite)"
        />
        <SheetText x={(x0 + x1) / 2} y={height - 6} textAnchor="middle">
          {`${units.format(section.chord, 'length', { bare: true })} · ${thick}`}
        </SheetText>
      </g>
    </svg>
  );
}
