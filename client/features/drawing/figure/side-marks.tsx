import type { Marks } from '#shared/drawing/marks.ts';
import { formatNumber } from '#shared/format/numbers.ts';
import { SheetText } from '#client/components/drawing/sheet-text.tsx';
import { toPx, type Sheet } from '#client/components/drawing/sheet.ts';

interface SideMarksProps {
  marks: Marks;
  percentMac: number | null;
  outside: boolean;
  sheet: Sheet;
  top: number;
  bottom: number;
  brief: boolean;
}

/** Where the model balances, on an elevation: a line down to the pivot under it, and the neutral point. */
export function SideMarks({ marks, percentMac, outside, sheet, top, bottom, brief }: SideMarksProps) {
  const x = (mm: number) => toPx(sheet, [mm, 0])[0];
  const { balance, wanted, neutralPoint } = marks;
  const colour = outside ? 'var(--red)' : 'var(--pencil)';
  const figure = percentMac === null ? '' : ` ${formatNumber(percentMac, 1)} %`;
  return (
    <g pointerEvents="none">
      {balance && (
        <>
          <path
            d={`M${x(balance.x)} ${top}V${bottom + 8}`}
            stroke={colour}
            strokeWidth={1.3}
            strokeDasharray="12 3 2 3"
          />
          <path d={`M${x(balance.x)} ${bottom + 8}l6 11h-12z`} fill={colour} />
          <SheetText x={x(balance.x) - 10} y={bottom + 19} textAnchor="end" fill={colour} fontWeight={600}>
            {`${outside ? '▲ ' : ''}balance${figure}`}
          </SheetText>
        </>
      )}
      {wanted && !brief && (
        <path
          d={`M${x(wanted.from)} ${bottom + 22}v5H${x(wanted.to)}v-5`}
          fill="none"
          stroke="var(--ink)"
          strokeWidth={1.5}
        />
      )}
      {neutralPoint !== null && !brief && (
        <>
          <path
            d={`M${x(neutralPoint)} ${bottom - 26}V${bottom + 8}`}
            stroke="var(--graphite)"
            strokeWidth={1.2}
            strokeDasharray="3 3"
          />
          <SheetText x={x(neutralPoint) + 10} y={bottom + 19}>
            neutral point
          </SheetText>
        </>
      )}
    </g>
  );
}
