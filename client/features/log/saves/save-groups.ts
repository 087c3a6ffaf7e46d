import type { GliderSaveDto, SaveChanges } from '#shared/schemas/glider-save.ts';
import { joinChanges } from './join-changes.ts';

/** Saves that are told in one row, newest first; mostly one person's evening at the drawing. */
export interface SaveGroup {
  /** newest first, never empty */
  saves: [GliderSaveDto, ...GliderSaveDto[]];
  /** against the state before the oldest of them; null where that is not known */
  changes: SaveChanges | null;
}

/** Saves of one person that follow one another within this time are one row, ms. */
const GAP = 10 * 60_000;

/** Rows of the log. A state that was named, brought back, or the first of all, keeps a row of its own. */
export function groupSaves(saves: readonly GliderSaveDto[]): SaveGroup[] {
  const groups: [GliderSaveDto, ...GliderSaveDto[]][] = [];
  for (const save of saves) {
    const group = groups.at(-1);
    const later = group?.at(-1);
    if (group && later && belongTogether(later, save)) group.push(save);
    else groups.push([save]);
  }
  return groups.map((group) => ({ saves: group, changes: changesOf(group) }));
}

function belongTogether(later: GliderSaveDto, earlier: GliderSaveDto): boolean {
  const apart = Date.parse(later.savedAt) - Date.parse(earlier.savedAt);
  const plain = [later, earlier].every(
    ({ name, restoredFrom, changes }) => name === null && restoredFrom === null && changes !== null,
  );
  return plain && later.savedBy === earlier.savedBy && apart <= GAP;
}

function changesOf(group: readonly GliderSaveDto[]): SaveChanges | null {
  const oldestFirst = group.toReversed().flatMap(({ changes }) => changes ?? []);
  return oldestFirst.length === group.length ? joinChanges(oldestFirst) : null;
}
