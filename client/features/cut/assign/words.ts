import type { Plan } from '#shared/core/plan.ts';
import { BUY_WEIGHT, type AssignFault } from '#shared/core/cut/assign-account.ts';
import type { CutPart } from '#shared/core/cut/cut-parts.ts';
import type { Misfit } from '#shared/core/cut/stock-fit.ts';
import type { Units } from '#shared/format/units.ts';
import type { Assignment } from './use-assignment.ts';

/** Halves nearer than this are told as alike, g: a usual workshop scale shows no less (common practice, no source). */
const ALIKE_G = 0.05;

const SIDES = { port: ', port', starboard: ', starboard', middle: '' } as const;

/** A part as the builder calls it. */
export const partName = ({ name, number, side }: Pick<CutPart, 'name' | 'number' | 'side'>): string =>
  `${name}${number === null ? '' : `, ${number}`}${SIDES[side]}`;

/** What the choice comes to, in one sentence each. */
export function assignHeadline(
  assignment: Assignment,
  plan: Plan,
  units: Units,
): { title: string; text: string } {
  const { problem, account } = assignment;
  const { parts } = problem;
  const found = parts.length - account.bought.length;
  const used = account.laid.size + account.faults.filter(({ code }) => code === 'crowded').length;
  if (found === 0) {
    return {
      title: `${parts.length} parts, none of them cut from your rack yet`,
      text: 'Let the best pieces be found, or choose a piece for a part by hand.',
    };
  }
  const rest = account.bought.length > 0 ? `; ${account.bought.length} to be bought` : '';
  const halves = account.halves.map((half) => halfWords(half, plan, units));
  const mass = `${units.format(account.mass, 'mass')} of wood`;
  return {
    title: `${found} of ${parts.length} parts from ${used} ${used === 1 ? 'piece' : 'pieces'} of yours${rest}`,
    text: `${[mass, ...halves].join('; ')}.`,
  };
}

function halfWords(
  { surface, port, starboard, massOver, momentOver, arm }: Assignment['account']['halves'][number],
  plan: Plan,
  units: Units,
): string {
  const role = plan.surfaces.find(({ key }) => key === surface)?.role ?? surface;
  const mass = port.mass - starboard.mass;
  const isAlike = Math.abs(mass) < ALIKE_G && Math.abs(port.moment - starboard.moment) < ALIKE_G * arm;
  if (isAlike) return `${role}: halves alike`;
  const heavier = mass > 0 ? 'port' : 'starboard';
  const by = `${role}: ${heavier} ${units.format(Math.abs(mass), 'mass')} heavier`;
  const moment = `${units.format(Math.abs(port.moment - starboard.moment), 'moment')} apart about the middle`;
  return `${by}, ${moment}${massOver > 0 || momentOver > 0 ? ' (more than wanted)' : ''}`;
}

/**
 * How near an answer is to the best there can be: `apart` is its score less the bound. What more could be placed is
 * said in parts, what could be lighter or better matched as a share of the rest.
 */
export function nearWords(
  apart: number,
  { score, bought }: Pick<Assignment['account'], 'score' | 'bought'>,
  units: Units,
): string {
  const more = Math.floor(apart / BUY_WEIGHT + 0.1);
  if (more > 0) return `at best ${more} more ${more === 1 ? 'part' : 'parts'} would find a place`;
  const rest = Math.abs(score - BUY_WEIGHT * bought.length);
  if (apart < 1e-6) return 'no other way is better';
  return `at most ${units.format(apart / Math.max(rest, apart), 'fineShare')} from the best`;
}

/** How near the kept answer is; nothing for one made by hand. */
export function gapWords({ terms, account }: Assignment, units: Units): string {
  if (terms.gap === null) return '';
  const near = nearWords(terms.gap * Math.abs(account.score), account, units);
  const least = account.leastSpar;
  const strong =
    terms.aim === 'strongest' && least !== null
      ? ` The lightest spar piece has ${units.format(least, 'density')}.`
      : '';
  return `${near.replace(/^./, (letter) => letter.toUpperCase())}.${strong}`;
}

/** Why a part cannot be cut from a piece, or from any. */
export function missWords(miss: Misfit, units: Units): string {
  switch (miss.code) {
    case 'other_form':
      return 'nothing of this kind at hand';
    case 'other_wood':
      return 'other wood';
    case 'other_grain':
      return 'sawn the wrong way for it';
    case 'other_thickness':
      return `thickness off by ${units.format(miss.by, 'length')}`;
    case 'too_short':
      return `${units.format(miss.by, 'length')} too short`;
    case 'too_narrow':
      return `${units.format(miss.by, 'length')} too narrow`;
  }
}

/** What is wrong with a part's place; null where nothing is. */
export function faultWords(part: string, faults: readonly AssignFault[], units: Units): string | null {
  for (const fault of faults) {
    if (fault.code === 'misfit' && fault.part === part) return missWords(fault.miss, units);
    if (fault.code === 'crowded' && fault.parts.includes(part))
      return 'more on this piece than it has room for';
  }
  return null;
}
