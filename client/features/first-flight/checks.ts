import type { Plan } from '#shared/core/plan.ts';
import type { Units } from '#shared/format/units.ts';
import type { FlightDraft } from './draft.ts';

/** One line of the check before the model leaves the hand. */
export interface CheckLine {
  id: string;
  words: string;
  /** caution or measure beside it */
  hint?: string;
  /** a model may be without it */
  mayLack?: boolean;
}

interface CheckFacts {
  /** mm aft of the datum; null while it is not weighed */
  balance: number | null;
  /** m/s, with everything aboard; null where it is not known */
  stall: number | null;
  wind: number | null;
  ballast: number;
  plan: Pick<Plan, 'items'>;
}

/** Wind beyond this share of the stall speed carries a slow model off. Common practice, no source. */
const CALM = 0.5;

/**
 * The check before a first flight: rules and people, then the model from the wing to the tow hook, then the air.
 * Common practice, no source; the field's rules and the country's law come before it.
 */
export function checkLines({ balance, stall, wind, ballast, plan }: CheckFacts, units: Units): CheckLine[] {
  const mm = (value: number) => units.format(value, 'length');
  const speed = (value: number) => units.format(value, 'speed');
  const hook = plan.items.find(({ name }) => /hook/i.test(name));
  return [
    {
      id: 'rules',
      words: 'Club rules, landowner and the country’s rules for this mass are known and kept.',
      hint: 'They come before anything that this page says; the thresholds that we know stand below.',
    },
    {
      id: 'people',
      words: 'Nobody stands under the flight path or ahead down the launch line; the ground is empty.',
      hint: 'Roads, power lines, animals and low sun looked for. Long grass forgives most.',
    },
    {
      id: 'surfaces',
      words: 'Wing, tail and fin sit square and straight, without a warp that was not built in.',
    },
    { id: 'joint', words: 'Spar joint, joiner and every fastening hold a firm pull and twist by hand.' },
    {
      id: 'ballast',
      words:
        ballast > 0
          ? `${units.format(ballast, 'mass')} of ballast fitted and held; it cannot move in flight.`
          : 'Nothing inside can move in flight.',
      hint: 'Lead: no bare swarf, wash your hands.',
    },
    {
      id: 'throws',
      words: 'Each control moves freely, the right way and as far as drawn.',
      hint: 'From behind: rudder to the right goes right, elevator up goes up. Note the throws.',
      mayLack: true,
    },
    {
      id: 'battery',
      words: 'Battery charged, strapped in, neither hot nor swollen.',
      hint: 'A swollen lithium cell stays on the ground, in the open, away from what burns.',
      mayLack: true,
    },
    {
      id: 'failsafe',
      words: 'Failsafe tried with the transmitter off; range walked.',
      hint: 'Somebody holds the model meanwhile.',
      mayLack: true,
    },
    {
      id: 'timer',
      words: 'Timer and dethermaliser run and release as set.',
      mayLack: true,
    },
    {
      id: 'hook',
      words:
        balance === null
          ? 'Tow hook a little ahead of the balance point.'
          : `Tow hook a little ahead of the balance point, which lies at ${mm(balance)}.`,
      hint:
        hook && balance !== null
          ? hook.at[0] < balance
            ? `Drawn at ${mm(hook.at[0])}: ${mm(balance - hook.at[0])} ahead of it.`
            : `Drawn at ${mm(hook.at[0])}: that is behind it. Do not tow so.`
          : 'Behind it, the model rolls off the line.',
      mayLack: true,
    },
    {
      id: 'wind',
      words:
        stall === null
          ? 'Wind light and steady.'
          : `Wind under half the stall speed: ${speed(stall * CALM)}.`,
      hint: windHint(wind, stall, speed),
    },
  ];
}

function windHint(wind: number | null, stall: number | null, speed: (value: number) => string): string {
  if (wind === null) return 'Measure it at head height, into the wind.';
  if (stall === null) return `${speed(wind)} measured.`;
  return wind <= stall * CALM
    ? `${speed(wind)} measured: less than that.`
    : `${speed(wind)} measured: too much for a first flight. Wait.`;
}

/** How far the check has come, and what speaks against a flight. */
export function checkState(lines: readonly CheckLine[], checks: FlightDraft['checks']) {
  const answerOf = (id: string) => checks[id]?.answer ?? null;
  const open = lines.filter(({ id }) => answerOf(id) === null);
  const against = lines.filter(({ id }) => answerOf(id) === 'no');
  return { answered: lines.length - open.length, open, against };
}
