import { SheetText } from '#client/components/drawing/sheet-text.tsx';
import { toPx, type Sheet } from '#client/components/drawing/sheet.ts';
import type { PlanViewName } from './drawings.ts';
import { measureWords, type Measure } from './measure.ts';

interface MeasureLayerProps {
  measure: Measure;
  view: PlanViewName | 'section';
  sheet: Sheet;
}

/** The measured line with its ticks and its length, and the cross that says where the next press would go. */
export function MeasureLayer({ measure, view, sheet }: MeasureLayerProps) {
  const { aim, state } = measure;
  const { first, second, done } = state;
  const cross = aim && !done ? toPx(sheet, aim) : null;
  return (
    <g pointerEvents="none" fill="none" stroke="var(--ink)">
      {cross && (
        <path
          d={`M${cross[0] - 9} ${cross[1]}h6m6 0h6M${cross[0]} ${cross[1] - 9}v6m0 6v6`}
          strokeWidth={1.6}
        />
      )}
      {first && second && <Line {...{ view, sheet }} first={first} second={second} />}
    </g>
  );
}

interface LineProps {
  first: readonly [number, number];
  second: readonly [number, number];
  view: PlanViewName | 'section';
  sheet: Sheet;
}

function Line({ first, second, view, sheet }: LineProps) {
  const [[x0, y0], [x1, y1]] = [toPx(sheet, first), toPx(sheet, second)];
  const length = Math.hypot(x1 - x0, y1 - y0);
  const [nx, ny] = length > 0 ? [(-(y1 - y0) / length) * 6, ((x1 - x0) / length) * 6] : [0, 6];
  const tick = (x: number, y: number) => `M${x - nx} ${y - ny}L${x + nx} ${y + ny}`;
  return (
    <>
      <path d={`M${x0} ${y0}L${x1} ${y1}${tick(x0, y0)}${tick(x1, y1)}`} strokeWidth={1.6} />
      <SheetText
        x={(x0 + x1) / 2}
        y={(y0 + y1) / 2 - 8}
        textAnchor="middle"
        fill="var(--ink)"
        fontWeight={600}
        strokeWidth={4}
      >
        {measureWords(view, first, second).short}
      </SheetText>
    </>
  );
}
