import { availableParallelism, loadavg } from 'node:os';
import { benchAssignment } from './assignment.ts';
import { benchBundle } from './bundle.ts';
import { benchDraws } from './draws.ts';
import { benchEditing } from './editing.ts';
import { benchEstimate } from './estimate.ts';
import { fails, isBroken, tableOf } from './table.ts';
import { benchTrial, benchTrialPage } from './trial.ts';

/**
 * `npm run bench`: figures as ratios of one run, for machines differ and are noisy. Ends with 1 where a ratio of one
 * run is over the bound that is asked for; a time of its own only where a person looks.
 */
const load = () => `${(loadavg()[0] ?? 0).toFixed(1)} of ${availableParallelism()} processors busy`;
const before = load();
const rows = [
  ...benchBundle(),
  ...benchEstimate(),
  ...benchDraws(),
  ...benchTrial(),
  ...(await benchTrialPage()),
  ...(await benchAssignment()),
  ...(await benchEditing([150, 500])),
];

process.stdout.write(`${tableOf(rows)}\n\n`);
process.stdout.write(`Before the run ${before}, after it ${load()}.\n`);
const late = rows.filter((row) => isBroken(row) && !fails(row)).length;
if (late > 0)
  process.stdout.write(`${late} timed bounds were not kept: measure again when nothing else runs.\n`);
const broken = rows.filter(fails);
if (broken.length > 0) {
  process.stdout.write(`Over the bound: ${broken.map(({ what }) => what).join('; ')}.\n`);
  process.exitCode = 1;
}
