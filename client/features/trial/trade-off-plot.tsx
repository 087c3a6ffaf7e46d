import { ChartFrame } from '#client/components/ui/chart-frame.tsx';
import { useWidth } from '#client/hooks/use-width.ts';
import { useUnits } from '#client/lib/units.ts';
import { rulerOf } from '#shared/core/ruler.ts';
import type { TrialResult } from '#shared/core/wood-trial.ts';
import { formatQuantity } from '#shared/format/numbers.ts';
import { QUANTITIES } from '#shared/units/quantities.ts';
import { convert } from '#shared/units/units.ts';
import { pointLabels } from './point-labels.ts';

interface TradeOffPlotProps {
  results: readonly TrialResult[];
  best: readonly boolean[];
  picked: number;
  onPick: (index: number) => void;
}

const HEIGHT = 280;
const LEFT = 40;
const BOTTOM = 40;
const RIGHT = 12;
const TOP = 14;
/** Room of a target that a finger finds. */
const TARGET = 44;

/** All-up mass against spar margin: what lies further left and further up is better. */
export function TradeOffPlot({ results, best, picked, onPick }: TradeOffPlotProps) {
  const units = useUnits();
  const [frame, width] = useWidth<HTMLDivElement>(640);
  const grams = (value: number | null, bare = false) => units.format(value, 'mass', { bare });
  const told = results.flatMap(({ name, allUp, margin }, index) =>
    allUp === null || margin === null ? [] : [{ index, name, allUp, margin }],
  );
  const winners = told.filter(({ index }) => best[index]).map(({ name }) => name);
  const unit = convert(1, units.unit('mass'), QUANTITIES.mass.base);
  const [fromMass, toMass] = spread(told.map(({ allUp }) => allUp / unit));
  const [fromMargin, toMargin] = spread(told.map(({ margin }) => margin));
  const [roomX, roomY] = [width - LEFT - RIGHT, HEIGHT - TOP - BOTTOM];
  const xOf = (mass: number) => LEFT + ((mass - fromMass) / (toMass - fromMass)) * roomX;
  const yOf = (margin: number) => TOP + (1 - (margin - fromMargin) / (toMargin - fromMargin)) * roomY;
  const points = told.map((one) => ({ ...one, x: xOf(one.allUp / unit), y: yOf(one.margin) }));
  const labels = pointLabels(points, width);
  const [masses, margins] = [rulerOf(fromMass, toMass, roomX, 64), rulerOf(fromMargin, toMargin, roomY, 40)];
  const decimals = (step: number) => Math.max(0, -Math.floor(Math.log10(step) + 1e-9));
  return (
    <ChartFrame
      title={`All-up mass, ${units.label('mass')}, against spar margin`}
      sentence={
        winners.length === 0
          ? 'No trial has both an all-up mass and a spar margin: give the spars a wood with modulus and strength.'
          : `Further left is lighter, further up stronger. Nothing is better in both than ${listed(winners)} (filled).`
      }
      columns={[
        { label: 'Trial' },
        { label: 'All up', numeric: true },
        { label: 'Spar margin', numeric: true },
        { label: 'Best' },
      ]}
      rows={results.map(({ name, allUp, margin }, i) => [
        name,
        grams(allUp),
        formatQuantity(margin, 'ratio'),
        best[i] ? 'nothing better in both' : '',
      ])}
    >
      <div ref={frame} className="relative" style={{ height: points.length > 0 ? HEIGHT : 0 }}>
        {points.length > 0 && (
          <svg width={width} height={HEIGHT} aria-hidden="true" className="text-label">
            <path
              d={`M${LEFT} ${TOP}V${HEIGHT - BOTTOM}H${width - RIGHT}`}
              fill="none"
              stroke="var(--graphite)"
            />
            {masses.numbered.map((mark) => (
              <g key={mark} transform={`translate(${xOf(mark)} ${HEIGHT - BOTTOM})`}>
                <path d="M0 0v5" stroke="var(--graphite)" />
                <text y={18} textAnchor="middle" fill="var(--graphite)">
                  {mark.toFixed(decimals(masses.step))}
                </text>
              </g>
            ))}
            <text x={width - RIGHT} y={HEIGHT - 4} textAnchor="end" fill="var(--graphite)">
              all up, {units.label('mass')}
            </text>
            {margins.numbered.map((mark) => (
              <g key={mark} transform={`translate(${LEFT} ${yOf(mark)})`}>
                <path d="M-5 0h5" stroke="var(--graphite)" />
                <text x={-8} dy="0.35em" textAnchor="end" fill="var(--graphite)">
                  {mark.toFixed(decimals(margins.step))}
                </text>
              </g>
            ))}
            {points.map(({ index, name, x, y }, i) => (
              <g key={index}>
                <circle
                  cx={x}
                  cy={y}
                  r={index === picked ? 7 : 5}
                  fill={best[index] ? 'var(--pencil)' : 'var(--sheet)'}
                  stroke="var(--pencil)"
                  strokeWidth={index === picked ? 2.5 : 1.5}
                />
                <text
                  {...labels[i]}
                  dy="0.35em"
                  fill="var(--pencil)"
                  fontWeight={index === picked ? 600 : 400}
                  className="text-note"
                >
                  {name}
                </text>
              </g>
            ))}
          </svg>
        )}
        {points.map(({ index, name, allUp, margin, x, y }) => (
          <button
            key={index}
            type="button"
            aria-pressed={index === picked}
            className="absolute rounded-full"
            style={{ left: x - TARGET / 2, top: y - TARGET / 2, width: TARGET, height: TARGET }}
            onClick={() => onPick(index)}
          >
            <span className="sr-only">
              {name}: {grams(allUp)} all up, spar margin {formatQuantity(margin, 'ratio')}
              {best[index] ? ', nothing better in both' : ''}
            </span>
          </button>
        ))}
      </div>
    </ChartFrame>
  );
}

/** Ends of an axis with some air round the values. */
function spread(values: readonly number[]): [number, number] {
  const [low, high] = [Math.min(...values), Math.max(...values)];
  const air = Math.max((high - low) * 0.15, Math.abs(high) * 0.01, 1e-6);
  return [low - air, high + air];
}

function listed(names: readonly string[]): string {
  return names.length < 2 ? names.join('') : `${names.slice(0, -1).join(', ')} and ${names.at(-1)}`;
}
