import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { SIZES, type PageSize } from '#server/house/bundle-sizes.mjs';
import type { Ratio } from './measure.ts';

const BUILT = fileURLToPath(new URL('../../node_modules/.cache/featherbeam/client/', import.meta.url));

/** What each page with a budget needs before it is usable, as the build counted it. */
export function benchBundle(): Ratio[] {
  const sizes = JSON.parse(readFileSync(join(BUILT, SIZES), 'utf8')) as PageSize[];
  return sizes.map(({ page, size, budget }) => ({
    what: `JavaScript before ${page} is usable`,
    ours: `${size.toFixed(1)} kB gzip`,
    beside: `budget ${budget} kB`,
    ratio: size / budget,
    most: 1,
  }));
}
