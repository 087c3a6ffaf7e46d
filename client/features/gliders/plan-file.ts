import type { Plan } from '#shared/core/plan.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import { checkPlan, issueLines } from './plan-check.ts';

/** What a file of the reader's turned out to hold. */
export type ReadPlan = { plan: Plan } | { problems: string[] };

/** Reads a plan from JSON text: the plan alone, or a document that carries it as `plan`, such as a saved sheet. */
export function readPlan(text: string): ReadPlan {
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
  const plan: unknown = 'plan' in document && !('surfaces' in document) ? document.plan : document;
  const check = checkPlan(plan);
  return check.ok ? { plan: check.plan } : { problems: issueLines(plan, check.issues) };
}

/** Reads a chosen file; one that is far too big is refused unread. */
export async function readPlanFile(file: File): Promise<ReadPlan> {
  if (file.size > LIMITS.bodyBytes.max) {
    return {
      problems: [`The file is too big: a plan takes at most ${LIMITS.bodyBytes.max / 1_000_000} MB.`],
    };
  }
  try {
    return readPlan(await file.text());
  } catch {
    return { problems: ['The file cannot be read.'] };
  }
}

/** Hands a plan to the reader as a JSON file. */
export function downloadPlan(plan: Plan): void {
  const blob = new Blob([JSON.stringify(plan, null, 2)], { type: 'application/json' });
  const link = document.createElement('a');
  link.href = URL.createObjectURL(blob);
  link.download = `${fileName(plan.name)}.json`;
  link.click();
  setTimeout(() => URL.revokeObjectURL(link.href), 10_000);
}

/** A name that every file system takes. */
export function fileName(name: string): string {
  const plain = name
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .replace(/[^\w-]+/g, '-')
    .replace(/^-+|-+$/g, '');
  return plain === '' ? 'plan' : plain;
}

/** `Dunlin copy`, `Dunlin copy 2`: a name that is not taken yet. */
export function copyName(name: string, taken: readonly string[]): string {
  const stem = `${name.replace(/ copy( \d+)?$/, '')} copy`.slice(0, LIMITS.name.max - 5);
  for (let n = 1; ; n++) {
    const wanted = n === 1 ? stem : `${stem} ${n}`;
    if (!taken.includes(wanted)) return wanted;
  }
}
