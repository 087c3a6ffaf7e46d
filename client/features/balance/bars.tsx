import { Bar, BarChart, Cell, LabelList, ReferenceLine, XAxis, YAxis } from 'recharts';
import { useWidth } from '#client/hooks/use-width.ts';
import type { Bar as BarData } from './chart-data.ts';

interface BarsProps {
  bars: readonly BarData[];
  /** what stands at the end of each bar */
  format: (value: number) => string;
  /** key of the bar that is lit */
  lit?: string | null;
  /** bars go both ways from an upright line */
  about?: boolean;
}

const ROW = 28;
const LETTER = 6.6;

/** Lying bars with their names and figures beside them instead of axes. */
export function Bars({ bars, format, lit = null, about = false }: BarsProps) {
  const [frame, width] = useWidth<HTMLDivElement>(420);
  const names = Math.min(width * 0.42, Math.max(...bars.map(({ name }) => name.length * LETTER)) + 12);
  const figures = Math.max(...bars.map(({ value }) => format(value).length)) * LETTER + 10;
  const most = Math.max(...bars.map(({ value }) => value), 0);
  const least = Math.min(...bars.map(({ value }) => value), 0);
  return (
    <div ref={frame} aria-hidden="true">
      <BarChart
        width={width}
        height={bars.length * ROW + 4}
        data={[...bars]}
        layout="vertical"
        margin={{ top: 2, bottom: 2, left: about ? figures : 0, right: figures }}
        barCategoryGap={6}
        accessibilityLayer={false}
      >
        <XAxis type="number" hide domain={[least, most]} />
        <YAxis
          type="category"
          dataKey="name"
          width={names}
          axisLine={false}
          tickLine={false}
          interval={0}
          tick={(props: NameProps) => <Name {...props} room={names} />}
        />
        {about && <ReferenceLine x={0} stroke="var(--ink)" strokeWidth={1.5} />}
        <Bar dataKey="value" isAnimationActive={false}>
          {bars.map(({ key, fill }) => (
            <Cell
              key={key}
              fill={fill}
              stroke={lit === key ? 'var(--ink)' : 'var(--graphite)'}
              strokeWidth={lit === key ? 2 : 1}
            />
          ))}
          <LabelList
            dataKey="value"
            content={(props) => <Figure {...(props as FigureProps)} format={format} />}
          />
        </Bar>
      </BarChart>
    </div>
  );
}

interface NameProps {
  y?: number | string;
  payload?: { value?: string };
}

function Name({ y = 0, payload, room }: NameProps & { room: number }) {
  const name = payload?.value ?? '';
  const letters = Math.floor((room - 10) / LETTER);
  return (
    <text x={0} y={Number(y)} dy="0.35em" fill="var(--pencil)" className="text-note">
      {name.length > letters ? `${name.slice(0, letters - 1)}…` : name}
    </text>
  );
}

interface FigureProps {
  x?: number | string;
  y?: number | string;
  width?: number | string;
  height?: number | string;
  value?: unknown;
}

function Figure({
  x = 0,
  y = 0,
  width = 0,
  height = 0,
  value,
  format,
}: FigureProps & { format: (value: number) => string }) {
  const number = Number(value);
  const [from, to] = [Number(x), Number(x) + Number(width)];
  const back = number < 0;
  return (
    <text
      x={back ? Math.min(from, to) - 6 : Math.max(from, to) + 6}
      y={Number(y) + Number(height) / 2}
      dy="0.35em"
      textAnchor={back ? 'end' : 'start'}
      fill="var(--graphite)"
      className="text-label"
    >
      {format(number)}
    </text>
  );
}
