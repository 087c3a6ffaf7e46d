import { useState } from 'react';
import { CartesianGrid, Line, LineChart, ReferenceDot, ReferenceLine, XAxis, YAxis } from 'recharts';
import { ChartFrame } from '#client/components/ui/chart-frame.tsx';
import { Select } from '#client/components/ui/select.tsx';
import { useWidth } from '#client/hooks/use-width.ts';
import { useUnits } from '#client/lib/units.ts';
import { rulerOf } from '#shared/core/ruler.ts';
import { formatNumber } from '#shared/format/numbers.ts';
import { convert } from '#shared/units/units.ts';
import { overDensity, overLift, speedIn, type CurvePoint, type Flown } from './speeds.ts';

interface SpeedChartProps {
  flown: Flown;
  clMax: number;
  trimLift: number;
  air: { density: number; viscosity: number };
}

type Over = 'density' | 'lift';
const HEIGHT = 280;
const MARGIN = { top: 26, right: 66, bottom: 18, left: 0 };

/** Speed over the density of the air, or over the lift coefficient. */
export function SpeedChart({ flown, clMax, trimLift, air }: SpeedChartProps) {
  const [over, setOver] = useState<Over>('density');
  const points =
    over === 'density' ? overDensity(flown, clMax, trimLift) : overLift(flown, clMax, air.density);
  const now = {
    stall: speedIn(flown, clMax, air).speed ?? 0,
    trim: speedIn(flown, trimLift, air).speed ?? 0,
  };
  const units = useUnits();
  const speed = (value: number | null) => units.format(value, 'speed');
  const bare = (value: number | null) => units.format(value, 'speed', { bare: true });
  const density = (value: number | undefined, isBare = false) =>
    units.format(value, 'airDensity', { bare: isBare });
  const other = units.unit('speed') === 'km/h' ? 'm/s' : 'km/h';
  const [first] = points;
  const last = points.at(-1);
  const sentence =
    over === 'density'
      ? `Thin air makes it faster: it stalls at ${speed(first?.stall ?? null)} in ${density(first?.x)} and at ${speed(last?.stall ?? null)} in ${density(last?.x)}.`
      : `From ${speed(first?.stall ?? null)} at a lift coefficient of ${formatNumber(first?.x, 2)} down to the stall at ${speed(last?.stall ?? null)}.`;
  const columns =
    over === 'density'
      ? [
          `Air density ${units.label('airDensity')}`,
          `Stall ${units.label('speed')}`,
          `Trim ${units.label('speed')}`,
        ]
      : [
          'Lift coefficient',
          `Speed ${units.label('speed')}`,
          `Speed ${units.label('speed', { unit: other })}`,
        ];
  return (
    <ChartFrame
      title={over === 'density' ? 'Speed over air density' : 'Speed over lift coefficient'}
      sentence={sentence}
      columns={columns.map((label) => ({ label, numeric: true }))}
      rows={points.map(({ x, stall, trim }) => [
        over === 'density' ? density(x, true) : formatNumber(x, 3),
        bare(stall),
        over === 'density' ? bare(trim) : units.format(stall, 'speed', { unit: other, bare: true }),
      ])}
    >
      <div className="mb-2 w-56 max-w-full">
        <Select
          label="Over"
          inline
          keepRoom={false}
          value={over}
          options={[
            { value: 'density', label: 'air density' },
            { value: 'lift', label: 'lift coefficient' },
          ]}
          onValue={(value) => setOver(value === 'lift' ? 'lift' : 'density')}
        />
      </div>
      <Curve
        over={over}
        points={points}
        marks={
          over === 'density'
            ? [
                { x: air.density, y: now.stall },
                { x: air.density, y: now.trim },
              ]
            : [
                { x: clMax, y: now.stall, label: 'stall' },
                { x: trimLift, y: now.trim, label: 'trim' },
              ]
        }
      />
    </ChartFrame>
  );
}

/** Decimals that tell marks apart which lie a step apart. */
const digitsFor = (step: number) => Math.max(0, -Math.floor(Math.log10(step) + 1e-9));

interface CurveProps {
  over: Over;
  points: readonly CurvePoint[];
  marks: readonly { x: number; y: number; label?: string }[];
}

function Curve({ over, points, marks }: CurveProps) {
  const [frame, width] = useWidth<HTMLDivElement>(560);
  const units = useUnits();
  const speedUnit = convert(1, units.unit('speed'), 'm/s');
  const xUnit = over === 'density' ? convert(1, units.unit('airDensity'), 'kg/m3') : 1;
  const xs = points.map(({ x }) => x);
  const ys = [
    ...points.flatMap(({ stall, trim }) => (trim === null ? [stall] : [stall, trim])),
    ...marks.map(({ y }) => y),
  ];
  const [left, right] = [Math.min(...xs), Math.max(...xs)];
  const [low, high] = [Math.floor(Math.min(...ys)), Math.ceil(Math.max(...ys))];
  const xRuler = rulerOf(left / xUnit, right / xUnit, width - 120, 70);
  const yRuler = rulerOf(low / speedUnit, high / speedUnit, HEIGHT - 50, 44);
  const last = points.at(-1);
  const tick = { fill: 'var(--graphite)', fontSize: 12 };
  const dot = { fill: 'var(--sheet)', stroke: 'var(--ink)', strokeWidth: 2, r: 4 };
  return (
    <div ref={frame} aria-hidden="true">
      <LineChart width={width} height={HEIGHT} data={[...points]} margin={MARGIN} accessibilityLayer={false}>
        <CartesianGrid stroke="var(--rule)" vertical={false} />
        <XAxis
          dataKey="x"
          type="number"
          domain={[left, right]}
          ticks={xRuler.numbered.map((mark) => mark * xUnit)}
          tick={tick}
          stroke="var(--graphite)"
          tickFormatter={(value: number) => formatNumber(value / xUnit, digitsFor(xRuler.step))}
          label={{
            value: over === 'density' ? `air density, ${units.label('airDensity')}` : 'lift coefficient',
            position: 'insideBottom',
            offset: -12,
            fill: 'var(--graphite)',
            fontSize: 12,
          }}
        />
        <YAxis
          type="number"
          domain={[low, high]}
          ticks={yRuler.numbered.map((mark) => mark * speedUnit)}
          tick={tick}
          width={44}
          stroke="var(--graphite)"
          tickFormatter={(value: number) => formatNumber(value / speedUnit, digitsFor(yRuler.step))}
          label={{
            value: units.label('speed'),
            position: 'insideTopLeft',
            offset: 0,
            dy: -22,
            dx: 14,
            fill: 'var(--graphite)',
            fontSize: 12,
          }}
        />
        {over === 'density' && (
          <ReferenceLine x={marks[0]?.x ?? 0} stroke="var(--strong-rule)" strokeDasharray="2 3" />
        )}
        <Line dataKey="stall" stroke="var(--pencil)" strokeWidth={2} dot={false} isAnimationActive={false} />
        {over === 'density' && (
          <Line
            dataKey="trim"
            stroke="var(--ink)"
            strokeWidth={2}
            strokeDasharray="7 4"
            dot={false}
            isAnimationActive={false}
          />
        )}
        {over === 'density' && last && (
          <>
            <ReferenceDot
              x={last.x}
              y={last.stall}
              r={0}
              label={{ value: 'stall', position: 'right', fill: 'var(--pencil)', fontSize: 13 }}
            />
            {last.trim !== null && (
              <ReferenceDot
                x={last.x}
                y={last.trim}
                r={0}
                label={{ value: 'trim', position: 'right', fill: 'var(--ink)', fontSize: 13 }}
              />
            )}
          </>
        )}
        {marks.map(({ x, y, label }) => (
          <ReferenceDot
            key={`${x}-${y}`}
            x={x}
            y={y}
            {...dot}
            {...(label
              ? { label: { value: label, position: 'top' as const, fill: 'var(--ink)', fontSize: 13 } }
              : {})}
          />
        ))}
      </LineChart>
    </div>
  );
}
