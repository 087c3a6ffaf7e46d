import { hatchFill } from '#client/components/ui/hatch.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { SplitInput } from '#shared/schemas/rack.ts';
import type { StockPieceDto } from '#shared/schemas/stock-piece.ts';
import type { PlannedPiece } from './split-plan.ts';

const WIDTH = 640;

interface SplitPictureProps {
  piece: StockPieceDto;
  plan: readonly PlannedPiece[];
  along: SplitInput['along'];
}

/** The piece to scale with its cuts; what is left is drawn broken. */
export function SplitPicture({ piece, plan, along }: SplitPictureProps) {
  const units = useUnits();
  const scale = Math.min(WIDTH / piece.length, 180 / piece.width);
  const [long, high] = [piece.length * scale, Math.max(piece.width * scale, 6)];
  const whole = along === 'length' ? long : high;
  const taken = plan.reduce((sum, { measure }) => sum + measure, 0);
  // Between any two lies one cut.
  const gap = ((piece[along] - taken) * (whole / piece[along])) / Math.max(plan.length - 1, 1);
  const places = plan.map((one, i) => {
    const before = plan.slice(0, i).reduce((sum, { measure }) => sum + measure, 0);
    const from = before * (whole / piece[along]) + i * (plan.at(-1)?.rest ? gap : Math.min(gap, 1));
    return { ...one, from, size: one.measure * (whole / piece[along]) };
  });
  const told = plan
    .map(({ measure, rest }) => `${units.size(measure)}${rest ? ' left over' : ''}`)
    .join(', ');
  return (
    <svg
      role="img"
      aria-label={`The piece to scale, cut into ${told}`}
      viewBox={`-1 -1 ${long + 2} ${high + 2}`}
      className="block h-auto max-h-48 w-full"
    >
      <rect width={long} height={high} fill="none" stroke="var(--graphite)" />
      {places.map(({ from, size, rest }, i) => (
        <rect
          key={i}
          {...(along === 'length'
            ? { x: from, y: 0, width: size, height: high }
            : { x: 0, y: from, width: long, height: size })}
          fill={rest ? 'none' : hatchFill(piece.material.category, piece.density)}
          stroke={rest ? 'var(--ochre)' : 'var(--pencil)'}
          strokeDasharray={rest ? '6 4' : undefined}
          strokeWidth="1.5"
        />
      ))}
    </svg>
  );
}
