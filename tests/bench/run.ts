import { benchEditing } from './editing.ts';
import { benchEstimate } from './estimate.ts';
import type { Ratio } from './measure.ts';

/** `npm run bench`: figures as ratios of one run, for machines differ and are noisy. Nothing here can fail a test. */
const print = (rows: Ratio[]) => {
  for (const { what, ours, beside, ratio } of rows) {
    process.stdout.write(`${what}\n    ${ours} beside ${beside}: ratio ${ratio.toPrecision(3)}\n`);
  }
};

print(benchEstimate());
print(await benchEditing(150));
print(await benchEditing(500));
