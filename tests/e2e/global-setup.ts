import type { TestProject } from 'vitest/node';
import { serve } from '#tests/support/served.ts';

declare module 'vitest' {
  interface ProvidedContext {
    /** address of the served product */
    baseUrl: string;
  }
}

/** One served product for all browser tests; each signs up people of its own. */
export default async function setup(project: TestProject) {
  const { baseUrl, stop } = await serve();
  project.provide('baseUrl', baseUrl);
  return stop;
}
