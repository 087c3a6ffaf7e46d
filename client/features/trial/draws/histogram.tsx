import { Area, AreaChart, ReferenceArea, ReferenceLine, XAxis, YAxis } from 'recharts';
import { ChartFrame } from '#client/components/ui/chart-frame.tsx';
import { hatchFill } from '#client/components/ui/hatch.tsx';
import { useWidth } from '#client/hooks/use-width.ts';
import { useUnits } from '#client/lib/units.ts';
import type { Summary } from '#shared/core/draws-summary.ts';
import { rulerOf } from '#shared/core/ruler.ts';
import { formatNumber, formatQuantity } from '#shared/format/numbers.ts';
import { QUANTITIES } from '#shared/units/quantities.ts';
import { convert } from '#shared/units/units.ts';
import { quantile, TOLD } from './words.ts';

interface HistogramProps {
  title: string;
  quantity: 'mass' | 'percentMac' | 'length';
  summary: Summary;
  /** range that is wanted, in the base unit */
  wanted?: [number, number] | undefined;
}

const HEIGHT = 190;
const MARGIN = { top: 26, right: 14, bottom: 0, left: 14 };
const MARKS = { 0.05: '5 %', 0.5: 'half', 0.95: '95 %' } as const;

/** How often each mass or balance point was drawn, with the lines that a twentieth lies beyond. */
export function Histogram({ title, quantity, summary, wanted }: HistogramProps) {
  const units = useUnits();
  const [frame, width] = useWidth<HTMLDivElement>(460);
  const { histogram } = summary;
  const drawn = histogram.reduce((sum, { count }) => sum + count, 0);
  const [from, to] = [histogram[0]?.from ?? 0, histogram.at(-1)?.to ?? 0];
  const text = (value: number | null, bare = false) => units.format(value, quantity, { bare, fine: true });
  const [low, middle, high] = TOLD.map((share) => quantile(summary, share));
  const unit = convert(1, units.unit(quantity), QUANTITIES[quantity].base);
  const ruler = to > from ? rulerOf(from / unit, to / unit, width - 28, 56) : null;
  const digits = ruler ? Math.max(0, -Math.floor(Math.log10(ruler.step) + 1e-9)) : 0;
  const label = units.label(quantity);
  return (
    <ChartFrame
      title={quantity === 'percentMac' ? title : `${title}, ${label}`}
      sentence={`Half of the draws lie below ${text(middle ?? null)}, nine in ten between ${text(low ?? null, true)} and ${text(high ?? null)}.${wanted ? ' Dotted: the wanted range.' : ''}`}
      columns={[
        { label: `From ${label}` },
        { label: `to below ${label}`, numeric: true },
        { label: 'Draws', numeric: true },
        { label: 'Share', numeric: true },
      ]}
      rows={histogram.map((bin) => [
        text(bin.from, true),
        text(bin.to, true),
        formatNumber(bin.count, 0),
        formatQuantity(bin.count / drawn, 'fineShare'),
      ])}
    >
      <div ref={frame} aria-hidden="true">
        {ruler && (
          <AreaChart
            width={width}
            height={HEIGHT}
            data={[...histogram.map(({ from: at, count }) => ({ at, count })), { at: to, count: 0 }]}
            margin={MARGIN}
            accessibilityLayer={false}
          >
            <XAxis
              dataKey="at"
              type="number"
              domain={[from, to]}
              ticks={ruler.numbered.map((mark) => mark * unit)}
              interval={0}
              tick={{ fill: 'var(--graphite)', fontSize: 12 }}
              stroke="var(--graphite)"
              tickFormatter={(value: number) => formatNumber(value / unit, digits)}
            />
            <YAxis hide domain={[0, 'dataMax']} />
            <Area
              dataKey="count"
              type="stepAfter"
              fill={hatchFill('wood')}
              fillOpacity={1}
              stroke="var(--graphite)"
              isAnimationActive={false}
              activeDot={false}
            />
            {wanted && (
              <ReferenceArea
                x1={Math.max(from, wanted[0])}
                x2={Math.min(to, wanted[1])}
                fill="none"
                stroke="var(--ink)"
                strokeWidth={1.5}
                strokeDasharray="2 3"
                label={{ value: 'wanted', position: 'insideTopLeft', fill: 'var(--ink)', fontSize: 12 }}
              />
            )}
            {TOLD.map((share) => (
              <ReferenceLine
                key={share}
                x={quantile(summary, share) ?? from}
                stroke="var(--pencil)"
                strokeDasharray={share === 0.5 ? undefined : '6 4'}
                label={{ value: MARKS[share], position: 'top', fill: 'var(--pencil)', fontSize: 12 }}
              />
            ))}
          </AreaChart>
        )}
      </div>
    </ChartFrame>
  );
}
