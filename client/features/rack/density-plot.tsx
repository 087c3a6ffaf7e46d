import { ChartFrame } from '#client/components/ui/chart-frame.tsx';
import { useWidth } from '#client/hooks/use-width.ts';
import { useUnits } from '#client/lib/units.ts';
import type { StockPieceDto } from '#shared/schemas/stock-piece.ts';
import { densityTicks } from './figures.ts';

const HEIGHT = 200;
const ROOM = { left: 52, right: 12, top: 10, bottom: 30 };

/** Densities of the sheets by thickness, so that the lightest and the hardest of each are seen at once. */
export function DensityPlot({ pieces }: { pieces: readonly StockPieceDto[] }) {
  const units = useUnits();
  const [frame, width] = useWidth<HTMLDivElement>();
  const sheets = pieces
    .flatMap((piece) =>
      piece.kind === 'sheet' && piece.density !== null ? [{ ...piece, density: piece.density }] : [],
    )
    .sort((a, b) => a.thickness - b.thickness || a.density - b.density);
  const thicknesses = [...new Set(sheets.map(({ thickness }) => thickness))];
  if (sheets.length < 3) return null;
  const ticks = densityTicks(Math.max(...sheets.map(({ density }) => density)), units);
  const top = ticks.at(-1) ?? 1;
  const inner = Math.max(width - ROOM.left - ROOM.right, 1);
  const x = (thickness: number) =>
    ROOM.left + ((thicknesses.indexOf(thickness) + 0.5) / thicknesses.length) * inner;
  const y = (density: number) => HEIGHT - ROOM.bottom - (density / top) * (HEIGHT - ROOM.top - ROOM.bottom);
  return (
    <ChartFrame
      className="mt-7 max-w-3xl"
      title="Density of the sheets by thickness"
      sentence={`In ${units.label('density')}; each mark is one of the sheets shown above.`}
      columns={[
        { label: 'Piece' },
        { label: 'Thickness', numeric: true },
        { label: 'Density', numeric: true },
      ]}
      rows={sheets.map(({ number, thickness, density }) => [
        String(number),
        units.size(thickness),
        units.format(density, 'density'),
      ])}
    >
      <div ref={frame}>
        <svg width={width} height={HEIGHT} aria-hidden="true" className="block text-note">
          {ticks.map((value) => (
            <g key={value}>
              <line x1={ROOM.left} x2={width - ROOM.right} y1={y(value)} y2={y(value)} stroke="var(--rule)" />
              <text x={ROOM.left - 8} y={y(value) + 4} textAnchor="end" fill="var(--graphite)">
                {units.format(value, 'density', { bare: true })}
              </text>
            </g>
          ))}
          {thicknesses.map((thickness) => (
            <text key={thickness} x={x(thickness)} y={HEIGHT - 8} textAnchor="middle" fill="var(--graphite)">
              {units.size(thickness)}
            </text>
          ))}
          {sheets.map(({ id, thickness, density }) => (
            <circle
              key={id}
              cx={x(thickness)}
              cy={y(density)}
              r="4.5"
              fill="var(--ink-wash)"
              stroke="var(--ink)"
              strokeWidth="1.5"
            />
          ))}
        </svg>
      </div>
    </ChartFrame>
  );
}
