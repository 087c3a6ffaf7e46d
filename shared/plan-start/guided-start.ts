import { ballastFor } from '#shared/core/ballast.ts';
import { positionOfPercent } from '#shared/core/balance.ts';
import { estimate } from '#shared/core/estimate.ts';
import type { Item, Plan, Solid } from '#shared/core/plan.ts';
import { wingReference } from '#shared/core/wing-reference.ts';
import { fitsSolid } from './fits.ts';
import { guidedTail, type Lengths } from './guided-tail.ts';
import { guidedWing } from './guided-wing.ts';
import type { GuidedWishes } from './guided-wishes.ts';
import { Woodpile } from './materialize.ts';
import type { KeyedMaterial } from './wishes.ts';

/** Static margin that a new model is trimmed to; common practice, no source. */
const MARGIN = 0.1;
/** Balance of a wing without a tail, % MAC: ahead of the quarter chord, where the wing's own neutral point lies. */
const TAILLESS_PERCENT = 20;

const half = (value: number) => Math.max(1, Math.round(value * 2) / 2);
const tenths = (value: number) => Math.round(value * 10) / 10;

/**
 * An ordinary plan from a few wishes: wing, tail, a stick with a nose block, radio gear where it is wanted, and lead
 * in the nose that brings it to a static margin of a tenth. Everything in it can be altered like anything drawn by
 * hand. The wishes must have no `guidedProblems`; what no material is offered for is left out.
 */
export function guidedPlan(wishes: GuidedWishes, offered: readonly KeyedMaterial[]): Plan {
  const wood = new Woodpile(offered);
  const wing = guidedWing(wishes, wood);
  const { surfaces, lengths } = guidedTail(wishes, wing, wood);
  const plan: Plan = {
    version: 1,
    name: wishes.name,
    materials: wood.materials,
    surfaces: [wing, ...surfaces],
    items: wishes.radio ? radioGear(lengths) : [],
    solids: body(wishes, lengths, wood),
    // A light section at the Reynolds numbers of small wings gives less lift.
    flight: { clMax: 0.9 },
  };
  return trimmed(plan, lengths);
}

/** A tapered stick from nose to tail, and a block that makes the nose. */
function body({ span }: GuidedWishes, lengths: Lengths, wood: Woodpile): Solid[] {
  const thick = half(Math.min(14, span / 150));
  const thin = half(thick * 0.6);
  const bar = { shape: 'bar', profile: 'rectangle', group: 'fuselage' } as const;
  const stick = wood.take(fitsSolid(bar), ['spruce', 'balsa-hard']);
  const block = wood.take(fitsSolid(bar), ['balsa-medium', 'balsa-light']);
  const below = -thick;
  return [
    ...(stick === null
      ? []
      : [
          {
            ...bar,
            id: 'stick',
            name: 'Fuselage stick',
            material: stick,
            from: [lengths.nose * 0.6, 0, below] as Item['at'],
            to: [lengths.end, 0, below] as Item['at'],
            width: [thick, thin] as [number, number],
            height: [thick, thin] as [number, number],
          },
        ]),
    ...(block === null
      ? []
      : [
          {
            ...bar,
            id: 'nose-block',
            name: 'Nose block',
            material: block,
            from: [lengths.nose, 0, below] as Item['at'],
            to: [lengths.nose * 0.6, 0, below] as Item['at'],
            width: [thick, 2 * thick] as [number, number],
            height: [thick, 3 * thick] as [number, number],
          },
        ]),
  ];
}

/** A small receiver, two servos and a cell; masses of common small gear, common practice, no source. */
function radioGear({ nose }: Lengths): Item[] {
  const gear = (id: string, name: string, mass: number, share: number): Item => ({
    id,
    name,
    group: 'gear',
    mass,
    u: tenths(0.05 * mass),
    at: [Math.round(nose * share), 0, 0],
  });
  return [
    gear('battery', 'Battery', 12, 0.85),
    gear('receiver', 'Receiver', 5, 0.55),
    gear('servo-rudder', 'Servo, rudder', 6, 0.35),
    gear('servo-elevator', 'Servo, elevator', 6, 0.35),
  ];
}

/** With its wanted balance and the lead that brings it there; or its gear further aft where it is nose-heavy already. */
function trimmed(plan: Plan, { nose, end }: Lengths): Plan {
  const wing = wingReference(plan);
  const { totals, balance } = estimate(plan);
  if (!wing || balance.x === null || balance.percentMac === null) return plan;
  const percent =
    balance.neutralPoint === null
      ? TAILLESS_PERCENT
      : (100 * (balance.neutralPoint - wing.xLeMac)) / wing.mac - 100 * MARGIN;
  const target = { percentMac: Math.round(percent), tolerance: 2 };
  const wanted = positionOfPercent(target.percentMac, wing.xLeMac, wing.mac);
  if (balance.x < wanted && plan.items.length > 0) {
    return { ...plan, target, items: movedAft(plan.items, totals.mass * (wanted - balance.x)) };
  }
  const [at, name] = balance.x < wanted ? [end, 'Tail ballast'] : [nose, 'Nose ballast'];
  const found = ballastFor(totals.mass, balance.x, wanted, at);
  const mass = 'mass' in found ? Math.round(found.mass * 100) / 100 : 0;
  if (mass <= 0) return { ...plan, target };
  const lead: Item = { id: 'ballast', name, group: 'ballast', mass, at: [at, 0, 0] };
  return { ...plan, target, items: [...plan.items, lead] };
}

/** Gear that weighs more than the nose needs sits further aft instead: all of it by the same way. */
function movedAft(items: readonly Item[], moment: number): Item[] {
  const mass = items.reduce((sum, item) => sum + item.mass, 0);
  const by = mass > 0 ? tenths(moment / mass) : 0;
  return items.map((item) => ({ ...item, at: [item.at[0] + by, item.at[1], item.at[2]] }));
}
