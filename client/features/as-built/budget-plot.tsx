import { Area, ComposedChart, Line, ReferenceLine, XAxis, YAxis } from 'recharts';
import { ChartFrame } from '#client/components/ui/chart-frame.tsx';
import { useWidth } from '#client/hooks/use-width.ts';
import { useUnits } from '#client/lib/units.ts';
import { rulerOf } from '#shared/core/ruler.ts';
import { formatNumber } from '#shared/format/numbers.ts';
import { QUANTITIES } from '#shared/units/quantities.ts';
import { convert } from '#shared/units/units.ts';
import type { Built } from './use-built.ts';

const HEIGHT = 240;
/** The band drawn, in standard uncertainties: nineteen in twenty. */
const BAND = 2;

/** The budget over time: what was on the scale, and the forecast that narrows to the truth. */
export function BudgetPlot({ built }: { built: Built }) {
  const units = useUnits();
  const [frame, width] = useWidth<HTMLDivElement>(640);
  const { steps, counted, terms } = built;
  const unit = convert(1, units.unit('mass'), QUANTITIES.mass.base);
  const titles = new Map(counted.map(({ id, title }) => [id, title]));
  const data = steps.map(({ forecast, u, weighed }, i) => ({
    i,
    forecast,
    weighed,
    band: [forecast - BAND * u, forecast + BAND * u] as const,
  }));
  const low = 0;
  const high = Math.max(...data.map(({ band }) => band[1]), terms.target ?? 0) * 1.04;
  const ruler = rulerOf(low / unit, high / unit, HEIGHT, 36);
  const mass = (grams: number) => units.format(grams, 'mass', { bare: true });
  const label = units.label('mass');
  return (
    <ChartFrame
      title={`Weight budget, ${label}`}
      sentence={`Grey: the forecast with a band that holds nineteen times in twenty. Dark: on the scale.${terms.target === null ? '' : ' Dashed: what is aimed at.'}`}
      columns={[
        { label: 'After' },
        { label: `On the scale ${label}`, numeric: true },
        { label: `To come ${label}`, numeric: true },
        { label: `Forecast ${label}`, numeric: true },
        { label: `± ${label}`, numeric: true },
      ]}
      rows={steps.map(({ weighing, weighed, toCome, forecast, u }) => [
        weighing === null ? 'the drawing' : (titles.get(weighing) ?? ''),
        mass(weighed),
        mass(toCome),
        mass(forecast),
        units.doubt(u, 'mass', { bare: true }),
      ])}
    >
      <div ref={frame} aria-hidden="true">
        <ComposedChart
          width={width}
          height={HEIGHT}
          data={data}
          margin={{ top: 10, right: 16, bottom: 0, left: 0 }}
          accessibilityLayer={false}
        >
          <XAxis
            dataKey="i"
            type="number"
            domain={[0, Math.max(1, steps.length - 1)]}
            allowDecimals={false}
            tick={{ fill: 'var(--graphite)', fontSize: 12 }}
            stroke="var(--graphite)"
            tickFormatter={(i: number) => (i === 0 ? 'drawn' : String(i))}
          />
          <YAxis
            type="number"
            domain={[low, high]}
            ticks={ruler.numbered.map((mark) => mark * unit)}
            tick={{ fill: 'var(--graphite)', fontSize: 12 }}
            stroke="var(--graphite)"
            width={48}
            tickFormatter={(grams: number) => formatNumber(grams / unit, 0)}
          />
          <Area
            dataKey="band"
            stroke="none"
            fill="var(--graphite)"
            fillOpacity={0.18}
            isAnimationActive={false}
            activeDot={false}
          />
          <Line
            dataKey="forecast"
            stroke="var(--graphite)"
            strokeWidth={1.6}
            dot={{ r: 2 }}
            isAnimationActive={false}
            activeDot={false}
          />
          <Line
            dataKey="weighed"
            type="stepAfter"
            stroke="var(--pencil)"
            strokeWidth={2.2}
            dot={false}
            isAnimationActive={false}
            activeDot={false}
          />
          {terms.target !== null && (
            <ReferenceLine
              y={terms.target}
              stroke="var(--ink)"
              strokeDasharray="6 4"
              label={{ value: 'aimed at', position: 'insideTopRight', fill: 'var(--ink)', fontSize: 12 }}
            />
          )}
        </ComposedChart>
      </div>
    </ChartFrame>
  );
}
