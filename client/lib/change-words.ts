import type { Plan } from '#shared/core/plan.ts';
import type { ChangeValue } from '#shared/core/field-changes.ts';
import type { Units } from '#shared/format/units.ts';
import { valuesInWords } from './change-values.ts';

/** A change as it comes from the core, or out of the log. */
export interface ToldChange {
  path: string;
  name: string;
  field: string | null;
  from: ChangeValue;
  to: ChangeValue;
  unit: string | null;
}

/** What became of one thing of the plan: `Ribs` and `thickness 1.6 → 2.4 mm, cut out 10 → 20 %`. */
export interface ChangeWords {
  name: string;
  text: string;
}

/** Changes in words, one entry for each thing that was changed; materials that came with a part go last. */
export function changesInWords(
  changes: readonly ToldChange[],
  materials: Plan['materials'],
  units: Units,
): ChangeWords[] {
  const things = new Map<string, { name: string; texts: string[]; last: boolean }>();
  for (const change of changes) {
    const last = change.path.startsWith('materials/') && change.field === null;
    const name = nameInWords(change);
    const thing = things.get(change.path) ?? { name, texts: [], last };
    thing.texts.push(textOf(change, materials, units));
    things.set(change.path, thing);
  }
  const all = [...things.values()];
  return [...all.filter(({ last }) => !last), ...all.filter(({ last }) => last)].map(({ name, texts }) => ({
    name,
    text: texts.join(', '),
  }));
}

/** All of it as one line of text. */
export function changeSentence(words: readonly ChangeWords[]): string {
  return words.map(({ name, text }) => `${name} ${text}`).join('; ');
}

/** The thing that was changed, as it is called on screen. */
export function nameInWords({ path, name }: Pick<ToldChange, 'path' | 'name'>): string {
  const [place = '', key = '', list] = path.split('/');
  if (place === '') return 'Name';
  if (place === 'target') return 'Wanted balance';
  if (place === 'flight') return 'Flight';
  if (place === 'surfaces' && list === undefined) return capital(name || key || 'surfaces');
  if (place === 'surfaces' && name === '') return capital(key);
  if (place === 'surfaces' && list === 'parts' && key !== 'wing') return `${name} (${key})`;
  return capital(name === '' ? place : name);
}

function textOf(change: ToldChange, materials: Plan['materials'], units: Units): string {
  const { path, field, from, to } = change;
  if (field === null) {
    if (to === 'list') return 'the whole list';
    if (path === 'target' || path === 'flight') return to === null ? 'removed' : 'changed';
    if (from !== null && to !== null) return 'replaced';
    return to === null ? 'removed' : 'added';
  }
  if (field === 'order') return `${listWord(path)}put in another order`;
  const values = valuesInWords(change, materials, units);
  const word = wordOf(path, field);
  return word === '' || (field === 'stations' && values.startsWith('station '))
    ? values
    : `${word} ${values}`;
}

/** The field that a change is about, as it is called on screen; empty for the thing as a whole. */
export function fieldInWords({ path, field }: Pick<ToldChange, 'path' | 'field'>): string {
  if (field === null) return '';
  return field === 'order' ? `order of the ${path.split('/').at(-1) ?? ''}` : wordOf(path, field);
}

function wordOf(path: string, field: string): string {
  // The name of the glider, and the balance that is wanted, are what they are called.
  if (path === '' || (path === 'target' && field === 'percentMac')) return '';
  return FIELD_WORDS[field] ?? spaced(field);
}

const listWord = (path: string) => (path.endsWith('/parts') ? 'parts ' : '');

/** Fields whose word on screen is not their name. */
const FIELD_WORDS: Record<string, string> = {
  apex: 'root leading edge',
  at: 'place',
  letIn: 'let into the ribs',
  lightening: 'cut out',
  cutout: 'cut out',
  hollow: 'hollowed',
  u: 'uncertainty',
  cv: 'spread of the figure',
  spread: 'dry mass',
  areal: 'mass by area',
  moistureAtDensity: 'moisture',
  clMax: 'lift coefficient at the stall',
};

const spaced = (field: string) => field.replace(/([A-Z])/g, (letter) => ` ${letter.toLowerCase()}`);

function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
