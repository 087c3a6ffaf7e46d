import { useWidth } from '#client/hooks/use-width.ts';
import type { FieldFigures } from '#shared/core/field/field-account.ts';
import { spreadLabels } from '#shared/core/ruler.ts';
import type { Units } from '#shared/format/units.ts';
import type { WantedRange } from './wanted-range.ts';

interface RangeStripProps {
  flown: FieldFigures;
  range: WantedRange | null;
  neutralPoint: number | null;
  outside: boolean;
  units: Units;
}

const HEIGHT = 92;
const BAR = 38;
const THICK = 14;
const SIDE = 28;
const LETTER = 7.2;

/** The range as a bar, the balance point with its doubt on it, and the neutral point behind; mm aft of the datum. */
export function RangeStrip({ flown, range, neutralPoint, outside, units }: RangeStripProps) {
  const [ref, width] = useWidth<HTMLDivElement>();
  const { x, ux } = flown;
  const marks = [
    x - ux,
    x + ux,
    ...(range ? [range.from, range.to] : []),
    ...(neutralPoint === null ? [] : [neutralPoint]),
  ];
  const [low, high] = [Math.min(...marks), Math.max(...marks)];
  const pad = Math.max(1, (high - low) * 0.08);
  const toX = (mm: number) => SIDE + ((mm - low + pad) / (high - low + 2 * pad)) * (width - 2 * SIDE);
  const tone = outside ? 'var(--red)' : 'var(--pencil)';
  const bare = (mm: number) => units.format(mm, 'length', { bare: true });
  const under = [
    ...(range
      ? [
          { text: bare(range.from), at: range.from },
          { text: bare(range.to), at: range.to },
        ]
      : []),
    ...(neutralPoint === null ? [] : [{ text: `neutral ${bare(neutralPoint)}`, at: neutralPoint }]),
  ];
  const places = spreadLabels(
    under.map(({ text, at }) => ({ x: toX(at), width: text.length * LETTER + 6 })),
    0,
    width,
  );
  return (
    <div ref={ref} className="mt-3">
      {width > 0 && (
        <svg
          width={width}
          height={HEIGHT}
          viewBox={`0 0 ${width} ${HEIGHT}`}
          role="img"
          className="block overflow-visible"
          aria-label={`Balance point at ${units.format(x, 'length')}${range ? `, range ${bare(range.from)} to ${units.format(range.to, 'length')}` : ''}${neutralPoint === null ? '' : `, neutral point ${units.format(neutralPoint, 'length')}`}.`}
        >
          <path d={`M0 ${BAR + THICK / 2}H${width}`} stroke="var(--graphite)" />
          {range && (
            <rect
              x={toX(range.from)}
              y={BAR}
              width={Math.max(2, toX(range.to) - toX(range.from))}
              height={THICK}
              fill="var(--ink-wash)"
              stroke="var(--ink)"
            />
          )}
          {range && (
            <path d={`M${toX(range.aim)} ${BAR - 4}v${THICK + 8}`} stroke="var(--ink)" strokeWidth={2} />
          )}
          {neutralPoint !== null && (
            <path
              d={`M${toX(neutralPoint)} ${BAR - 6}v${THICK + 12}`}
              stroke="var(--pencil)"
              strokeWidth={1.5}
              strokeDasharray="3 2"
            />
          )}
          <rect
            x={toX(x - ux)}
            y={BAR + 2}
            width={Math.max(1, toX(x + ux) - toX(x - ux))}
            height={THICK - 4}
            fill={tone}
            opacity={0.28}
          />
          <path d={`M${toX(x)} ${BAR - 7}v${THICK + 14}`} stroke={tone} strokeWidth={4} />
          <text
            x={Math.min(width - SIDE, Math.max(SIDE, toX(x)))}
            y={20}
            textAnchor="middle"
            fill={tone}
            className="text-body font-semibold"
          >
            {bare(x)}
          </text>
          {under.map(({ text }, i) => (
            <text
              key={text}
              x={places[i]}
              y={BAR + THICK + 28}
              textAnchor="middle"
              fill="var(--graphite)"
              className="text-note"
            >
              {text}
            </text>
          ))}
        </svg>
      )}
    </div>
  );
}
