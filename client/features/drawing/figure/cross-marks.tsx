import { formatNumber } from '#shared/format/numbers.ts';
import type { Marks } from '#shared/drawing/marks.ts';
import { spread, type Label } from './labels.ts';
import { SheetText } from '#client/components/drawing/sheet-text.tsx';
import { toPx, type Sheet } from '#client/components/drawing/sheet.ts';

interface CrossMarksProps {
  marks: Marks;
  /** figures for the labels, % MAC */
  percentMac: number | null;
  wantedPercent: number | null;
  /** out of the wanted range: told by the word as well as by the colour */
  outside: boolean;
  sheet: Sheet;
  /** px: the drawing's own width, where labels begin, and how high the paper is */
  left: number;
  right: number;
  low: number;
  high: number;
  /** no room for words but the balance's own */
  brief?: boolean;
}

const COLOUR: Record<Label['tone'], string> = {
  pencil: 'var(--pencil)',
  graphite: 'var(--graphite)',
  ink: 'var(--ink)',
  red: 'var(--red)',
};
const percent = (value: number) => `${formatNumber(value, 1)} %`;

/** Balance point with its ± band, wanted range and neutral point, across a plan on which x aft runs down. */
export function CrossMarks(props: CrossMarksProps) {
  const { marks, percentMac, wantedPercent, outside, sheet, left, right, low, high, brief = false } = props;
  const y = (x: number) => toPx(sheet, [x, 0])[1];
  const inside = (x: number) => y(x) >= low && y(x) <= high;
  const { balance, wanted, neutralPoint } = marks;
  const shown = balance && inside(balance.x) ? balance : null;
  const tone = outside ? 'red' : 'pencil';
  const labels: Label[] = [];
  if (shown) {
    const figure = percentMac === null ? '' : ` ${percent(percentMac)}`;
    labels.push({ text: `${outside ? '▲ ' : ''}balance${figure}`, at: y(shown.x), tone });
  }
  const withWanted = wanted && inside(wanted.x) && !brief ? wanted : null;
  if (withWanted && wantedPercent !== null) {
    labels.push({ text: `wanted ${percent(wantedPercent)}`, at: y(withWanted.x), tone: 'ink' });
  }
  const withNeutral = neutralPoint !== null && inside(neutralPoint) && !brief ? neutralPoint : null;
  if (withNeutral !== null) labels.push({ text: 'neutral point', at: y(withNeutral), tone: 'graphite' });

  return (
    <g pointerEvents="none">
      {shown && (
        <>
          <rect
            x={left - 10}
            y={y(shown.x - shown.u)}
            width={right - left + 20}
            height={Math.max(1, 2 * shown.u * sheet.scale)}
            fill={COLOUR[tone]}
            opacity={0.1}
          />
          <path
            d={`M${left - 10} ${y(shown.x)}H${right + 10}`}
            stroke={COLOUR[tone]}
            strokeWidth={1.3}
            strokeDasharray="12 3 2 3"
          />
        </>
      )}
      {withWanted && (
        <path
          d={`M${right + 4} ${y(withWanted.from)}h6V${y(withWanted.to)}h-6`}
          fill="none"
          stroke="var(--ink)"
          strokeWidth={1.5}
        />
      )}
      {withNeutral !== null && (
        <path
          d={`M${right - 34} ${y(withNeutral)}H${right + 10}`}
          stroke="var(--graphite)"
          strokeWidth={1.2}
          strokeDasharray="3 3"
        />
      )}
      {spread(labels, low + 8, high - 4).map(({ text, place, tone: colour }) => (
        <SheetText
          key={text}
          x={brief ? right + 4 : right + 15}
          y={brief ? place - 6 : place + 4}
          textAnchor={brief ? 'end' : 'start'}
          fill={COLOUR[colour]}
          fontWeight={colour === 'graphite' ? 400 : 600}
        >
          {text}
        </SheetText>
      ))}
    </g>
  );
}
