import type { BuiltPart } from './as-built.ts';

/** One half as it is, or as forecast. */
export interface HalfAccount {
  /** g */
  mass: number;
  /** standard uncertainty of the mass, g */
  u: number;
  /** g·mm about the root rib, and about the roll axis; both outward */
  aboutRoot: number;
  aboutRoll: number;
}

/** A part of the heavier half, and what would have to come off it. g */
export interface Sanding {
  line: string;
  name: string;
  takeOff: number;
  /** of the part's mass, 0–1 */
  share: number;
}

/** Both halves against each other. */
export interface PanelMatch {
  port: HalfAccount;
  starboard: HalfAccount;
  /** half that pulls down in roll; null where neither does */
  heavy: 'port' | 'starboard' | null;
  /** differences, g and g·mm, never below 0 */
  byMass: number;
  byRoll: number;
  /** what is known of the halves cannot tell them apart: within two standard uncertainties */
  matched: boolean;
  /** weight at the light tip that levels them, g; null without a tip to put it at */
  tipWeight: number | null;
  /** what sanding would do instead, least share first; only parts that have enough to give */
  sanding: Sanding[];
}

/** More than this share of a part cannot be sanded off it (common practice, no source). */
const SANDABLE = 0.15;

/**
 * Mass and moments of port and starboard parts, and what levels them: tip weight b = Δ(m·y)/y, or wood off the
 * heavier half, Δ(m·y)/yᵢ at each part. `root` and `tip` are mm from the plane of symmetry; `uOf` is each half's
 * standard uncertainty, g.
 * @example matchPanels([{ ...EXAMPLE_PORT, mass: 12 }, EXAMPLE_STARBOARD], { root: 0, tip: 500, uOf: { port: 0.05, starboard: 0.05 } }).tipWeight // → 1
 */
export function matchPanels(
  parts: readonly BuiltPart[],
  { root, tip, uOf }: { root: number; tip: number; uOf: { port: number; starboard: number } },
): PanelMatch {
  const half = (side: 'port' | 'starboard'): HalfAccount => {
    const own = parts.filter((part) => part.side === side);
    const sum = (of: (part: BuiltPart) => number) => own.reduce((total, part) => total + of(part), 0);
    return {
      mass: sum(({ mass }) => mass),
      u: uOf[side],
      aboutRoot: sum(({ mass, at }) => mass * (Math.abs(at[1]) - root)),
      aboutRoll: sum(({ mass, at }) => mass * Math.abs(at[1])),
    };
  };
  const [port, starboard] = [half('port'), half('starboard')];
  const roll = port.aboutRoll - starboard.aboutRoll;
  const byMass = Math.abs(port.mass - starboard.mass);
  const u = Math.hypot(port.u, starboard.u);
  // The doubt of a half's mass is taken to lie where the half's mass lies.
  const arm = (side: HalfAccount) => (side.mass > 0 ? side.aboutRoll / side.mass : 0);
  const uRoll = Math.hypot(port.u * arm(port), starboard.u * arm(starboard));
  const heavy = roll === 0 ? null : roll > 0 ? 'port' : 'starboard';
  return {
    port,
    starboard,
    heavy,
    byMass,
    byRoll: Math.abs(roll),
    matched: byMass <= 2 * u && Math.abs(roll) <= 2 * uRoll,
    tipWeight: tip > 0 ? Math.abs(roll) / tip : null,
    sanding: heavy === null ? [] : sandingOf(parts, heavy, Math.abs(roll)),
  };
}

function sandingOf(parts: readonly BuiltPart[], heavy: 'port' | 'starboard', roll: number): Sanding[] {
  return parts
    .filter(({ side, mass, at, material }) => side === heavy && material !== null && mass > 0 && at[1] !== 0)
    .map(({ line, name, mass, at }) => {
      const takeOff = roll / Math.abs(at[1]);
      return { line, name, takeOff, share: takeOff / mass };
    })
    .filter(({ share }) => share <= SANDABLE)
    .sort((a, b) => a.share - b.share);
}
