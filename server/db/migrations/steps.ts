import { people } from './20261201-1-people.ts';
import { materials } from './20261201-2-materials.ts';
import { gliders } from './20261201-3-gliders.ts';
import { sheets } from './20261201-4-sheets.ts';
import { bench } from './20261201-5-bench.ts';
import { log } from './20261201-6-log.ts';
import { photos } from './20261201-7-photos.ts';
import { accounts } from './20261201-8-accounts.ts';
import { rack } from './20261201-9-rack.ts';
import { built } from './20261201-10-built.ts';
import { clubs } from './20261201-11-clubs.ts';
import type { Migration } from './migration.ts';

/** Every step of the database, oldest first. Steps are added at the end and never changed. */
export const STEPS: readonly Migration[] = [
  people,
  materials,
  gliders,
  sheets,
  bench,
  log,
  photos,
  accounts,
  rack,
  built,
  clubs,
];
