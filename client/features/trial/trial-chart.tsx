import { Bar, BarChart, LabelList, XAxis, YAxis } from 'recharts';
import { ChartFrame } from '#client/components/ui/chart-frame.tsx';
import { hatchFill } from '#client/components/ui/hatch.tsx';
import { useWidth } from '#client/hooks/use-width.ts';
import { useUnits } from '#client/lib/units.ts';
import type { TrialResult } from '#shared/core/wood-trial.ts';

const ROW = 40;
const LETTER = 6.6;

/** All-up mass of each trial and the ballast in it. */
export function TrialChart({ results }: { results: readonly TrialResult[] }) {
  const units = useUnits();
  const grams = (value: number | null) => units.format(value, 'mass');
  const [frame, width] = useWidth<HTMLDivElement>(640);
  const data = results.map(({ name, bare, ballast, allUp }) => ({
    name,
    bare,
    ballast: ballast ?? 0,
    label:
      allUp === null ? `${grams(bare)}, not trimmed` : `${grams(allUp)}, ${grams(ballast)} of it ballast`,
  }));
  const phone = width < 560;
  const names = phone
    ? 0
    : Math.min(width * 0.3, Math.max(...data.map(({ name }) => name.length * LETTER)) + 14);
  const figures = phone ? 8 : Math.max(...data.map(({ label }) => label.length)) * LETTER + 8;
  const trimmed = results.filter(({ allUp }) => allUp !== null);
  const [lightest] = [...trimmed].sort((a, b) => (a.allUp ?? 0) - (b.allUp ?? 0));
  return (
    <ChartFrame
      title="All-up mass, trimmed"
      sentence={
        lightest
          ? `${lightest.name} is the lightest once trimmed: ${grams(lightest.allUp)}. Grain: everything else; cross-hatch: ballast.`
          : 'None of these can be trimmed at this arm.'
      }
      columns={[
        { label: 'Trial' },
        { label: 'All but ballast', numeric: true },
        { label: 'Ballast', numeric: true },
        { label: 'All up', numeric: true },
      ]}
      rows={results.map(({ name, bare, ballast, allUp }) => [
        name,
        grams(bare),
        grams(ballast),
        grams(allUp),
      ])}
    >
      <div ref={frame} aria-hidden="true">
        <BarChart
          width={width}
          height={data.length * (phone ? ROW + 18 : ROW)}
          data={data}
          layout="vertical"
          margin={{ top: phone ? 14 : 0, bottom: 0, left: 0, right: figures }}
          barCategoryGap={phone ? 18 : 8}
          accessibilityLayer={false}
        >
          <XAxis type="number" hide domain={[0, 'dataMax']} />
          <YAxis
            type="category"
            dataKey="name"
            width={names}
            hide={phone}
            axisLine={false}
            tickLine={false}
            interval={0}
            tick={(props: TickProps) => (
              <text x={0} y={Number(props.y ?? 0)} dy="0.35em" fill="var(--pencil)" className="text-note">
                {clip(props.payload?.value ?? '', names)}
              </text>
            )}
          />
          <Bar
            dataKey="bare"
            stackId="mass"
            fill={hatchFill('wood')}
            stroke="var(--graphite)"
            isAnimationActive={false}
          />
          <Bar
            dataKey="ballast"
            stackId="mass"
            fill={hatchFill('metal')}
            stroke="var(--graphite)"
            isAnimationActive={false}
          >
            <LabelList
              dataKey="label"
              content={(props) => {
                const { x, y, width: wide, height, value, index } = props as LabelProps;
                const name = data[index ?? 0]?.name ?? '';
                return (
                  <text
                    x={phone ? 1 : Number(x) + Number(wide) + 7}
                    y={phone ? Number(y) - 5 : Number(y) + Number(height) / 2}
                    dy={phone ? 0 : '0.35em'}
                    fill="var(--graphite)"
                    className="text-label"
                  >
                    {phone ? `${name}: ${String(value)}` : String(value)}
                  </text>
                );
              }}
            />
          </Bar>
        </BarChart>
      </div>
    </ChartFrame>
  );
}

interface TickProps {
  y?: number | string;
  payload?: { value?: string };
}

interface LabelProps {
  x?: number | string;
  y?: number | string;
  width?: number | string;
  height?: number | string;
  value?: unknown;
  index?: number;
}

function clip(name: string, room: number): string {
  const letters = Math.floor((room - 10) / LETTER);
  return name.length > letters ? `${name.slice(0, letters - 1)}…` : name;
}
