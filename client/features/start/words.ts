import type { Option } from '#client/components/ui/select.tsx';
import type { GuidedField, GuidedProblem, GuidedWishes } from '#shared/plan-start/guided-wishes.ts';
import type { Units } from '#shared/format/units.ts';

type Choices<K extends keyof GuidedWishes> = readonly (Option & { value: GuidedWishes[K]; hint: string })[];

export const STRUCTURES: Choices<'structure'> = [
  {
    value: 'sheeted',
    label: 'Ribs and spars, sheeted nose',
    hint: 'two spars with a web, a nose of thin sheet, cap strips, tissue',
  },
  {
    value: 'open',
    label: 'Ribs and spars, open',
    hint: 'two spars, a stringer above and below, tissue over all',
  },
  { value: 'sheet', label: 'Plain sheet', hint: 'one plate of balsa, sanded and sealed' },
];

export const DIHEDRALS: Choices<'dihedral'> = [
  { value: 'flat', label: 'Flat', hint: 'one panel a side, no dihedral' },
  { value: 'vee', label: 'V', hint: 'one panel a side, raised by 5°' },
  { value: 'polyhedral', label: 'Polyhedral', hint: 'an inner panel at 3°, an outer one at 13°' },
];

export const TAILS: Choices<'tail'> = [
  { value: 'built', label: 'Built up', hint: 'ribs, edges and a spar; a sheet where it would be too small' },
  { value: 'sheet', label: 'Plain sheet', hint: 'plates of balsa' },
  { value: 'none', label: 'None', hint: 'a wing alone: its section has to be stable by itself' },
];

export const hintOf = (choices: readonly { value: string; hint: string }[], value: string): string =>
  choices.find((choice) => choice.value === value)?.hint ?? '';

/** What stands in the way of a field, in a sentence; undefined where nothing does. */
export function problemOf(
  problems: readonly GuidedProblem[],
  field: GuidedField,
  units: Units,
): string | undefined {
  const problem = problems.find((one) => one.field === field);
  if (!problem) return undefined;
  const length = (mm: number) => units.format(mm, 'length');
  switch (problem.code) {
    case 'out_of_bounds':
      return `From ${length(problem.min)} to ${length(problem.max)}.`;
    case 'tip_wider_than_root':
      return 'Must not be longer than the root chord.';
    case 'chord_too_long':
      return 'A wing is at least three chords long.';
    case 'no_section':
      return 'Four digits, such as 4409; the last two are the thickness in % of the chord.';
    case 'too_thin':
      return `Only ${length(problem.thickness)} thick at the tip; ribs and spars need ${length(problem.least)}. Take a thicker section or plain sheet.`;
  }
}
