import type { Plan } from '#shared/core/plan.ts';
import { planSchema } from '#shared/schemas/plan.ts';
import { checkedQuickly } from './plan-quick-check.ts';

/** A plan that may be sent, or what is wrong with it, by path (`surfaces/0/panels/1/span`). */
export type PlanCheck =
  | { ok: true; plan: Plan; issues: ReadonlyMap<string, string> }
  | { ok: false; issues: ReadonlyMap<string, string> };

const NONE: ReadonlyMap<string, string> = new Map();

/**
 * Holds a plan against its schema. What was found good before is not looked at again, as long as it is the very same
 * object: a plan is edited by putting others in their places, never in place.
 */
export function checkPlan(plan: unknown): PlanCheck {
  const good = checkedQuickly(plan);
  if (good) return { ok: true, plan: good, issues: NONE };
  const parsed = planSchema.safeParse(plan);
  if (parsed.success) return { ok: true, plan: parsed.data, issues: NONE };
  const issues = new Map<string, string>();
  for (const { path, message } of parsed.error.issues) {
    const key = path.map(String).join('/');
    if (!issues.has(key)) issues.set(key, message);
  }
  return { ok: false, issues };
}

/** The first thing wrong, with its place in words: `Wing, panel 2, tip chord: Must be more than 0 mm.` */
export function firstIssue(plan: Plan, issues: ReadonlyMap<string, string>): string | null {
  for (const [path, message] of issues) return `${placeInWords(plan, path)}: ${message}`;
  return null;
}

/** Any issue of a document that is not known to be a plan, with its path spelled out. */
export function issueLines(document: unknown, issues: ReadonlyMap<string, string>): string[] {
  return [...issues].map(([path, message]) => `${placeInWords(document, path)}: ${message}`);
}

function placeInWords(document: unknown, path: string): string {
  const words: string[] = [];
  let here: unknown = document;
  let list = '';
  for (const step of path === '' ? [] : path.split('/')) {
    here = child(here, step);
    if (/^\d+$/.test(step))
      words.push(nameOf(here) ?? `${SINGULAR[list] ?? list} ${Number(step) + 1}`.trim());
    else if (!(step in SINGULAR)) words.push(spaced(step));
    list = step;
  }
  const text = words.length > 0 ? words.join(', ') : 'the plan';
  return text.charAt(0).toUpperCase() + text.slice(1);
}

const SINGULAR: Record<string, string> = {
  surfaces: 'surface',
  panels: 'panel',
  parts: 'part',
  items: 'item',
  solids: 'solid',
  materials: 'material',
  points: 'point',
  stations: 'station',
};

function child(value: unknown, step: string): unknown {
  return typeof value === 'object' && value !== null ? (value as Record<string, unknown>)[step] : undefined;
}

function nameOf(value: unknown): string | null {
  const name = child(value, 'name') ?? child(value, 'key');
  return typeof name === 'string' && name.trim() !== '' ? name : null;
}

function spaced(key: string): string {
  return key.replace(/([A-Z])/g, (letter) => ` ${letter.toLowerCase()}`);
}
