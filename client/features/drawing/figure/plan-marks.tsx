import type { Laid, Margins, Zoom } from '#client/components/drawing/sheet.ts';
import type { Plan, Surface } from '#shared/core/plan.ts';
import type { Estimate } from '#shared/core/result.ts';
import type { SideName } from '#shared/drawing/frames.ts';
import { balanceMarks } from '#shared/drawing/marks.ts';
import { BoardMarks } from './board-marks.tsx';
import { CrossMarks } from './cross-marks.tsx';
import type { PlanViewName } from './drawings.ts';
import { FrontMarks } from './front-marks.tsx';
import { SideMarks } from './side-marks.tsx';
import { SidesNamed } from './sides-named.tsx';

interface PlanMarksProps {
  plan: Plan;
  result: Estimate;
  surface: Surface | null;
  side: SideName;
  view: PlanViewName;
  station: number | null;
  brief: boolean;
  margins: Margins;
  zoom: Zoom;
  paper: Laid;
}

/** What is written on a view: balance, neutral point, dimensions, and which side is which. */
export function PlanMarks(props: PlanMarksProps) {
  const { plan, result, surface, side, view, station, brief, margins, zoom, paper } = props;
  const { sheet, width, height } = paper;
  const { panX, panY } = zoom;
  const outside = result.notices.some(({ code }) => code === 'balance_outside_target');
  const marks = balanceMarks(plan, result.balance);
  const common = { marks, percentMac: result.balance.percentMac, outside, sheet, brief };
  const top = margins.top - panY;
  const bottom = height - margins.bottom - panY;
  if (view === 'front') return <FrontMarks {...{ plan, sheet, brief }} bottom={bottom} />;
  if (view === 'side') return <SideMarks {...common} bottom={bottom} top={top} />;
  return (
    <>
      {view === 'half' && surface && (
        <BoardMarks
          {...{ surface, side, sheet, station, brief }}
          dimensionAt={zoom.factor === 1 && !brief ? height - 26 : null}
        />
      )}
      {view === 'whole' && <SidesNamed plan={plan} sheet={sheet} y={bottom + 24} />}
      <CrossMarks
        {...common}
        wantedPercent={plan.target?.percentMac ?? null}
        left={margins.left - panX}
        right={width - margins.right - panX}
        low={top - 8}
        high={bottom + 8}
      />
    </>
  );
}
