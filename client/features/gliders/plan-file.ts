import { fileName, saveFile } from '#client/lib/save-file.ts';
import type { Plan } from '#shared/core/plan.ts';
import { checkPlan, issueLines } from './plan-check.ts';

/** What a file of the reader's turned out to hold. */
export type ReadPlans = { plans: Plan[] } | { problems: string[] };

/** Bytes of a file with several plans; each is sent on its own. */
const LARGEST = 40_000_000;

/**
 * Reads plans from JSON text: a plan alone, a document that carries it as `plan`, such as a saved sheet, or several
 * as `plans`, as the bench exports them. All of them are good, or none is given on.
 */
export function readPlans(text: string): ReadPlans {
  let document: unknown;
  try {
    document = JSON.parse(text.replace(/^\uFEFF/, ''));
  } catch (error) {
    return {
      problems: [`This is not JSON: ${error instanceof Error ? error.message : 'it cannot be read'}.`],
    };
  }
  if (typeof document !== 'object' || document === null || Array.isArray(document)) {
    return {
      problems: ['This JSON holds no plan: a plan is an object with a name, materials and surfaces.'],
    };
  }
  const found = plansIn(document);
  const checks = found.map((plan) => ({ plan, check: checkPlan(plan) }));
  const plans = checks.flatMap(({ check }) => (check.ok ? [check.plan] : []));
  if (plans.length === found.length) {
    return plans.length === 0 ? { problems: ['The file holds no plan.'] } : { plans };
  }
  const problems = checks.flatMap(({ plan, check }, i) => {
    const place = found.length > 1 ? `Plan ${i + 1}: ` : '';
    return check.ok ? [] : issueLines(plan, check.issues).map((line) => `${place}${line}`);
  });
  return { problems };
}

function plansIn(document: object): unknown[] {
  if ('surfaces' in document) return [document];
  if ('plans' in document && Array.isArray(document.plans)) return document.plans as unknown[];
  return ['plan' in document ? document.plan : document];
}

/** Reads a chosen file; one that is far too big is refused unread. */
export async function readPlanFile(file: File): Promise<ReadPlans> {
  if (file.size > LARGEST) {
    return { problems: [`The file is too big: it may take ${LARGEST / 1_000_000} MB.`] };
  }
  try {
    return readPlans(await file.text());
  } catch {
    return { problems: ['The file cannot be read.'] };
  }
}

/** Hands a plan to the reader as a JSON file. */
export function downloadPlan(plan: Plan): void {
  downloadJson(plan, plan.name);
}

export function downloadJson(content: unknown, name: string): void {
  saveFile(JSON.stringify(content, null, 2), 'application/json', `${fileName(name)}.json`);
}
