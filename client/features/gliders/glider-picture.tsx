import { hatchFill, type HatchKind } from '#client/components/ui/hatch.tsx';
import type { Workspace } from '#client/lib/workspace.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { Line } from '#shared/core/result.ts';
import { formatQuantity } from '#shared/format/numbers.ts';
import { hang, hungMasses, type Hung } from './hung-masses.ts';
import { seenFromAbove, type PlanPoint } from './plan-outline.ts';

const WIDTH = 640;
const MARGIN = 44;
/** Degrees that the beam may tip at most, and what one per cent of MAC tips it by. */
const TIP = { max: 7, perPercent: 1.6 };

/** The glider's half plan over its beam, to one scale: what hangs where, and whether it balances. */
export function GliderPicture({ plan, result }: Pick<Workspace, 'plan' | 'result'>) {
  const { surfaces, bars } = seenFromAbove(plan);
  const masses = hungMasses(result.lines);
  const points: PlanPoint[] = [
    ...surfaces.flatMap(({ half }) => half),
    ...bars.flat(),
    ...masses.map(({ arm }): PlanPoint => [arm, 0]),
  ];
  if (points.length === 0) return null;
  const from = Math.min(...points.map(([x]) => x));
  const to = Math.max(...points.map(([x]) => x));
  const scale = (WIDTH - 2 * MARGIN) / Math.max(1, to - from);
  const toX = (arm: number) => MARGIN + (arm - from) * scale;
  const deep = Math.max(40, ...points.map(([, y]) => y * scale));
  const axis = deep + 16;
  const beam = axis + 46;
  const hung = hang(masses, { toX, largest: 24, shortest: 12, room: { side: 34, below: 34 } });
  const bottom = Math.max(...hung.map(({ drop, radius }) => drop + radius), 40) + 44;
  const { percentMac, x } = result.balance;
  const wanted =
    plan.target && percentMac !== null && x !== null ? wantedArm(plan, result, x, percentMac) : null;
  const pivot = wanted ?? x ?? 0;
  const tilt =
    plan.target && percentMac !== null
      ? Math.max(-TIP.max, Math.min(TIP.max, (percentMac - plan.target.percentMac) * TIP.perPercent))
      : 0;

  return (
    <svg
      viewBox={`0 0 ${WIDTH} ${beam + bottom}`}
      role="img"
      aria-label={describe(plan, result)}
      className="w-full"
    >
      <path
        d={`M${toX(from) - 12} ${axis}H${toX(to) + 12}`}
        stroke="var(--graphite)"
        strokeDasharray="14 4 3 4"
      />
      {bars.map(([[x1, y1], [x2, y2]], i) => (
        <path
          key={i}
          d={`M${toX(x1)} ${axis - y1 * scale}L${toX(x2)} ${axis - y2 * scale}`}
          stroke="var(--pencil)"
          strokeWidth={3}
        />
      ))}
      {surfaces.map(({ key, half }) => (
        <polygon
          key={key}
          points={half.map(([px, py]) => `${toX(px)},${axis - py * scale}`).join(' ')}
          fill="var(--wood-light)"
          stroke="var(--pencil)"
          strokeWidth={1.2}
          strokeLinejoin="round"
        />
      ))}
      {x !== null && <BalanceMark x={toX(x)} y={axis} />}
      <Beam
        {...{ hung, plan, tilt }}
        pivot={toX(pivot)}
        y={beam}
        left={toX(from) - 16}
        right={toX(to) + 16}
      />
    </svg>
  );
}

/** Arm of the wanted balance point, from the one it has and the MAC that both refer to. */
function wantedArm(plan: Plan, result: Workspace['result'], x: number, percentMac: number): number {
  const wing = plan.surfaces.find(({ role }) => role === 'wing');
  const mac = wing ? (result.planform[wing.key]?.mac ?? 0) : 0;
  return x + (((plan.target?.percentMac ?? percentMac) - percentMac) / 100) * mac;
}

/** The quartered circle of the balance point. */
function BalanceMark({ x, y }: { x: number; y: number }) {
  return (
    <g transform={`translate(${x} ${y})`}>
      <circle r={8} fill="var(--sheet)" stroke="var(--pencil)" strokeWidth={1.4} />
      <path d="M0 0V-8A8 8 0 0 1 8 0ZM0 0V8A8 8 0 0 1 -8 0Z" fill="var(--pencil)" />
    </g>
  );
}

interface BeamProps {
  hung: Hung[];
  plan: Plan;
  tilt: number;
  pivot: number;
  y: number;
  left: number;
  right: number;
}

function Beam({ hung, plan, tilt, pivot, y, left, right }: BeamProps) {
  const slope = Math.tan((tilt * Math.PI) / 180);
  const yAt = (x: number) => y + (x - pivot) * slope;
  const deepest = Math.max(...hung.map(({ drop, radius }) => drop + radius), 40) + 24;
  return (
    <g>
      <path
        d={`M${pivot} ${y + 2}L${pivot - 9} ${y + deepest}H${pivot + 9}Z`}
        fill="none"
        stroke="var(--ink)"
        strokeWidth={1.5}
        strokeLinejoin="round"
      />
      {hung.map(({ key, x, drop, radius, label, mass, heaviest }) => {
        const top = yAt(x);
        return (
          <g key={key}>
            <path d={`M${x} ${top}V${top + drop - radius}`} stroke="var(--pencil)" />
            <circle cx={x} cy={top + drop} r={radius} fill={fillOf(plan, heaviest)} stroke="var(--pencil)" />
            <text
              x={x}
              y={top + drop + radius + 14}
              textAnchor="middle"
              className="halo fill-pencil text-[12px]"
            >
              {label}
            </text>
            <text
              x={x}
              y={top + drop + radius + 27}
              textAnchor="middle"
              className="halo fill-graphite text-[11px]"
            >
              {formatQuantity(mass, 'mass')}
            </text>
          </g>
        );
      })}
      <path
        d={`M${left} ${yAt(left)}L${right} ${yAt(right)}`}
        stroke="var(--pencil)"
        strokeWidth={3}
        strokeLinecap="round"
      />
    </g>
  );
}

function fillOf(plan: Plan, line: Line): string {
  const material = line.material === null ? undefined : plan.materials[line.material];
  if (!material) return hatchFill(line.group === 'ballast' ? 'metal' : 'gear');
  const kind: HatchKind = material.category;
  return hatchFill(kind, material.density);
}

function describe(plan: Plan, { totals, balance }: Workspace['result']): string {
  const where =
    balance.percentMac === null
      ? ''
      : `, balancing at ${formatQuantity(balance.percentMac, 'percentMac')} of the mean chord`;
  return `Half plan of ${plan.name} over its beam: ${formatQuantity(totals.mass, 'mass')}${where}.`;
}
