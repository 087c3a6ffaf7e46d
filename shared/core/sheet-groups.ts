import type { Line } from './result.ts';

/** Group of the balance sheet: the lines of one surface, or the items and solids of one group. */
export interface SheetGroup<T extends Pick<Line, 'group' | 'surface'> = Line> {
  /** lower case, so that a solid's group `Wing` joins the surface `wing` */
  key: string;
  name: string;
  lines: T[];
}

/**
 * Key of the group that a line stands in: its surface, or the group of an item or solid; trimmed, lower case.
 * @example sheetGroupKey({ surface: null, group: 'Gear' }) // → 'gear'
 */
export function sheetGroupKey(line: Pick<Line, 'group' | 'surface'>): string {
  return (line.surface ?? line.group).trim().toLowerCase();
}

/** The key as a heading. @example sheetGroupName('tailplane') // → 'Tailplane' */
export function sheetGroupName(key: string): string {
  return key.charAt(0).toUpperCase() + key.slice(1);
}

/**
 * Lines by their group, in the order in which the groups first appear; inside a group the lines keep their order.
 * @example sheetGroups([{ surface: 'wing', group: 'wing' }, { surface: null, group: 'Wing' }]).map(({ name }) => name) // → ['Wing']
 */
export function sheetGroups<T extends Pick<Line, 'group' | 'surface'>>(lines: readonly T[]): SheetGroup<T>[] {
  const groups = new Map<string, SheetGroup<T>>();
  for (const line of lines) {
    const key = sheetGroupKey(line);
    const group = groups.get(key) ?? { key, name: sheetGroupName(key), lines: [] };
    group.lines.push(line);
    groups.set(key, group);
  }
  return [...groups.values()];
}
