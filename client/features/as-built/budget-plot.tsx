import { Area, ComposedChart, Line, ReferenceLine, XAxis, YAxis } from 'recharts';
import { ChartFrame } from '#client/components/ui/chart-frame.tsx';
import { hatchFill } from '#client/components/ui/hatch.tsx';
import { useWidth } from '#client/hooks/use-width.ts';
import { useUnits } from '#client/lib/units.ts';
import { rulerOf } from '#shared/core/ruler.ts';
import { formatNumber } from '#shared/format/numbers.ts';
import { QUANTITIES } from '#shared/units/quantities.ts';
import { convert } from '#shared/units/units.ts';
import type { Built } from '#client/lib/built/use-built.ts';

const HEIGHT = 210;
const SCALE_HEIGHT = 90;
const WIDE = 48;
const MARGIN = { top: 10, right: 16, bottom: 0, left: 0 };
const TICK = { fill: 'var(--graphite)', fontSize: 12 };
const WAY = { type: 'number', allowDecimals: false, stroke: 'var(--graphite)' } as const;
const STILL = { isAnimationActive: false, activeDot: false } as const;
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
  const edges = [...data.flatMap(({ band }) => band), ...(terms.target === null ? [] : [terms.target])];
  const [low, high] = [Math.min(...edges), Math.max(...edges)];
  const pad = Math.max(0.1, (high - low) * 0.08);
  const [from, to] = [Math.max(0, low - pad), high + pad];
  const ruler = rulerOf(from / unit, to / unit, HEIGHT, 30);
  const digits = Math.max(0, -Math.floor(Math.log10(ruler.step) + 1e-9));
  const mass = (grams: number) => units.format(grams, 'mass', { bare: true });
  const label = units.label('mass');
  return (
    <ChartFrame
      title={`Weight budget, ${label}`}
      sentence={`Above, the forecast after each weighing, in a band that holds nineteen times in twenty${terms.target === null ? '' : '; dashed, what is aimed at'}. Below, what is on the scale of it.`}
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
        <ComposedChart {...{ width, data }} height={HEIGHT} margin={MARGIN} accessibilityLayer={false}>
          <XAxis {...WAY} dataKey="i" domain={[0, Math.max(1, steps.length - 1)]} tick={false} height={4} />
          <YAxis
            type="number"
            domain={[from, to]}
            ticks={ruler.numbered.map((mark) => mark * unit)}
            tick={TICK}
            stroke="var(--graphite)"
            width={WIDE}
            tickFormatter={(grams: number) => formatNumber(grams / unit, digits)}
          />
          <Area {...STILL} dataKey="band" stroke="none" fill="var(--graphite)" fillOpacity={0.18} />
          <Line {...STILL} dataKey="forecast" stroke="var(--graphite)" strokeWidth={1.8} dot={{ r: 2 }} />
          {terms.target !== null && (
            <ReferenceLine
              y={terms.target}
              stroke="var(--ink)"
              strokeDasharray="6 4"
              label={{ value: 'aimed at', position: 'insideTopRight', fill: 'var(--ink)', fontSize: 12 }}
            />
          )}
        </ComposedChart>
        <ComposedChart {...{ width, data }} height={SCALE_HEIGHT} margin={MARGIN} accessibilityLayer={false}>
          <XAxis
            {...WAY}
            dataKey="i"
            domain={[0, Math.max(1, steps.length - 1)]}
            tick={TICK}
            tickFormatter={(i: number) => (i === 0 ? 'drawn' : String(i))}
          />
          <YAxis
            type="number"
            domain={[0, data.at(-1)?.forecast ?? 1]}
            ticks={[0, data.at(-1)?.weighed ?? 0]}
            tick={TICK}
            stroke="var(--graphite)"
            width={WIDE}
            tickFormatter={(grams: number) => formatNumber(grams / unit, 0)}
          />
          <Area
            {...STILL}
            dataKey="weighed"
            type="stepAfter"
            stroke="var(--pencil)"
            strokeWidth={2}
            fill={hatchFill('wood')}
            fillOpacity={1}
          />
        </ComposedChart>
      </div>
    </ChartFrame>
  );
}
