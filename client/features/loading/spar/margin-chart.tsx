import { CartesianGrid, Line, LineChart, ReferenceDot, ReferenceLine, XAxis, YAxis } from 'recharts';
import { ChartFrame } from '#client/components/ui/chart-frame.tsx';
import { useWidth } from '#client/hooks/use-width.ts';
import { useUnits } from '#client/lib/units.ts';
import type { SparStation } from '#shared/core/result.ts';
import { rulerOf } from '#shared/core/ruler.ts';
import { formatNumber } from '#shared/format/numbers.ts';
import { convert } from '#shared/units/units.ts';
import { loadFactorText, marginText, placeText, sparStanding } from './words.ts';

const HEIGHT = 260;
const MARGIN = { top: 26, right: 18, bottom: 18, left: 0 };

interface MarginChartProps {
  stations: readonly SparStation[];
  worst: SparStation;
  loadFactor: number;
}

/** Margin along the half span. Towards the tip it runs off the paper: there is hardly a moment left. */
export function MarginChart({ stations, worst, loadFactor }: MarginChartProps) {
  const units = useUnits();
  const label = (quantity: 'length' | 'strength') => units.label(quantity);
  return (
    <ChartFrame
      title="Margin along the half span"
      sentence={`Strength over stress in the outer fibre at ${loadFactorText(loadFactor)}: ${marginText(worst.margin)} ${placeText(worst.s, units)}, more towards the tip.`}
      columns={[
        { label: `From the root ${label('length')}`, numeric: true },
        { label: 'Moment N·mm', numeric: true },
        { label: `Stress ${label('strength')}`, numeric: true },
        { label: 'Margin', numeric: true },
      ]}
      rows={stations.map(({ s, moment, stress, margin }) => [
        units.format(s, 'length', { bare: true }),
        formatNumber(moment, 1),
        units.format(stress, 'strength', { bare: true }),
        formatNumber(margin, 2),
      ])}
    >
      <Curve stations={stations} worst={worst} />
    </ChartFrame>
  );
}

function Curve({ stations, worst }: Pick<MarginChartProps, 'stations' | 'worst'>) {
  const [frame, width] = useWidth<HTMLDivElement>(560);
  const units = useUnits();
  const unit = convert(1, units.unit('length'), 'mm');
  const end = stations.at(-1)?.s ?? 1;
  // Enough room over the least margin to see the curve rise, and the line of margin 1 always on the paper.
  const top = Math.max(2, worst.margin * 3);
  const xRuler = rulerOf(0, end / unit, width - 70, 70);
  const yRuler = rulerOf(0, top, HEIGHT - 50, 44);
  const tick = { fill: 'var(--graphite)', fontSize: 12 };
  const out = sparStanding(worst.margin) === 'outside';
  const atRight = worst.s > end / 2;
  return (
    <div ref={frame} aria-hidden="true">
      <LineChart
        width={width}
        height={HEIGHT}
        data={[...stations]}
        margin={MARGIN}
        accessibilityLayer={false}
      >
        <CartesianGrid stroke="var(--rule)" vertical={false} />
        <XAxis
          dataKey="s"
          type="number"
          domain={[0, end]}
          ticks={xRuler.numbered.map((mark) => mark * unit)}
          tick={tick}
          stroke="var(--graphite)"
          tickFormatter={(value: number) => formatNumber(value / unit, 0)}
          label={{
            value: `from the root, ${units.label('length')}`,
            position: 'insideBottom',
            offset: -12,
            fill: 'var(--graphite)',
            fontSize: 12,
          }}
        />
        <YAxis
          type="number"
          domain={[0, top]}
          allowDataOverflow
          ticks={yRuler.numbered}
          tick={tick}
          width={44}
          stroke="var(--graphite)"
          tickFormatter={(value: number) => formatNumber(value, yRuler.step < 1 ? 1 : 0)}
          label={{
            value: 'margin',
            position: 'insideTopLeft',
            offset: 0,
            dy: -22,
            dx: 8,
            fill: 'var(--graphite)',
            fontSize: 12,
          }}
        />
        <ReferenceLine
          y={1}
          stroke="var(--red)"
          strokeDasharray="6 4"
          label={{
            value: '1: at its strength',
            position: 'insideBottomRight',
            fill: 'var(--red)',
            fontSize: 12,
          }}
        />
        <Line dataKey="margin" stroke="var(--pencil)" strokeWidth={2} dot={false} isAnimationActive={false} />
        <ReferenceDot
          x={worst.s}
          y={worst.margin}
          r={4}
          fill="var(--sheet)"
          stroke={out ? 'var(--red)' : 'var(--ink)'}
          strokeWidth={2}
          label={{
            value: marginText(worst.margin),
            position: atRight ? 'left' : 'right',
            offset: 10,
            dy: 12,
            fill: out ? 'var(--red)' : 'var(--ink)',
            fontSize: 13,
            fontWeight: 600,
          }}
        />
      </LineChart>
    </div>
  );
}
