import { Bar, BarChart, LabelList, XAxis, YAxis } from 'recharts';
import { ChartFrame } from '#client/components/ui/chart-frame.tsx';
import { hatchFill } from '#client/components/ui/hatch.tsx';
import { useWidth } from '#client/hooks/use-width.ts';
import type { MaterialShares } from '#shared/core/draws-summary.ts';
import type { Plan } from '#shared/core/plan.ts';
import { formatQuantity } from '#shared/format/numbers.ts';
import { shareName, sharesSentence } from './words.ts';

const ROW = 52;
const LETTER = 6.6;
/** Bars at most; the table holds all. */
const SHOWN = 8;

/** Which material scatters mass and balance, what scatters the mass most first. */
export function SharesChart({ plan, shares }: { plan: Plan; shares: readonly MaterialShares[] }) {
  const [frame, width] = useWidth<HTMLDivElement>(460);
  const all = shares.map((one) => ({
    name: shareName(one, plan),
    mass: one.mass.drawn,
    balance: one.balance.drawn,
    first: one,
  }));
  all.sort((a, b) => b.mass - a.mass);
  const data = all.slice(0, SHOWN);
  const names = Math.min(width * 0.4, Math.max(...data.map(({ name }) => name.length * LETTER)) + 14);
  const letters = Math.floor((names - 10) / LETTER);
  const percent = (value: number) => formatQuantity(value, 'fineShare');
  return (
    <ChartFrame
      className="md:col-span-2"
      title="Which material the doubt comes from"
      sentence={sharesSentence(shares, plan)}
      columns={[
        { label: 'Material' },
        { label: 'Of the mass, drawn', numeric: true },
        { label: 'to first order', numeric: true },
        { label: 'Of the balance, drawn', numeric: true },
        { label: 'to first order', numeric: true },
      ]}
      rows={all.map(({ name, first: { mass, balance } }) => [
        name,
        percent(mass.drawn),
        percent(mass.firstOrder),
        percent(balance.drawn),
        percent(balance.firstOrder),
      ])}
    >
      <div ref={frame} aria-hidden="true">
        <BarChart
          width={width}
          height={data.length * ROW}
          data={data}
          layout="vertical"
          margin={{ top: 0, bottom: 0, left: 0, right: 120 }}
          barCategoryGap={8}
          barGap={0}
          accessibilityLayer={false}
        >
          <XAxis type="number" hide domain={[0, 'dataMax']} />
          <YAxis
            type="category"
            dataKey="name"
            width={names}
            axisLine={false}
            tickLine={false}
            interval={0}
            tick={({ y, payload }: { y?: number | string; payload?: { value?: string } }) => {
              const name = payload?.value ?? '';
              return (
                <text x={0} y={Number(y ?? 0)} dy="0.35em" fill="var(--pencil)" className="text-note">
                  {name.length > letters ? `${name.slice(0, letters - 1)}…` : name}
                </text>
              );
            }}
          />
          {(['mass', 'balance'] as const).map((of) => (
            <Bar
              key={of}
              dataKey={of}
              fill={hatchFill(of === 'mass' ? 'wood' : 'metal')}
              stroke="var(--graphite)"
              isAnimationActive={false}
            >
              <LabelList
                dataKey={of}
                position="right"
                fill="var(--graphite)"
                fontSize={12}
                formatter={(value: unknown) => `${formatQuantity(Number(value), 'share')} of the ${of}`}
              />
            </Bar>
          ))}
        </BarChart>
      </div>
    </ChartFrame>
  );
}
