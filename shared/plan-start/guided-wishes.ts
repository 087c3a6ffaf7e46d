/** What a guided start asks for: lengths in mm. */
export interface GuidedWishes {
  name: string;
  /** tip to tip as it flies, the tips’ blocks included */
  span: number;
  rootChord: number;
  tipChord: number;
  /** `flat` wings have no dihedral, `vee` one angle, `polyhedral` outer panels that rise further */
  dihedral: 'flat' | 'vee' | 'polyhedral';
  /** four digits; a sheet wing is flat and has none */
  section: string;
  structure: 'sheeted' | 'open' | 'sheet';
  tail: 'built' | 'sheet' | 'none';
  /** radio gear for rudder and elevator; none for free flight */
  radio: boolean;
}

/** Bounds of the sizes, mm. */
export const GUIDED_BOUNDS = {
  span: { min: 200, max: 6_000 },
  chord: { min: 25, max: 600 },
} as const;

export type GuidedField = 'span' | 'rootChord' | 'tipChord' | 'section' | 'structure';

export type GuidedProblem = { field: GuidedField } & (
  | { code: 'out_of_bounds'; min: number; max: number }
  | { code: 'tip_wider_than_root' }
  | { code: 'chord_too_long' }
  | { code: 'no_section' }
  /** the section is too thin at its tip for ribs and spars; thickness there and the least, mm */
  | { code: 'too_thin'; thickness: number; least: number }
);

/** Thinner than this at the tip there is no room for ribs with spars in them, mm (common practice, no source). */
const LEAST_THICKNESS = 5;
/** A wing that is less than so many chords long is none. */
const LEAST_CHORDS = 3;

/**
 * What stands in the way of drawing a wing so; empty where nothing does.
 * @example guidedProblems({ name: 'A', span: 1200, rootChord: 150, tipChord: 120, dihedral: 'vee', section: '4409', structure: 'open', tail: 'sheet', radio: false }) // → []
 */
export function guidedProblems(wishes: GuidedWishes): GuidedProblem[] {
  const { span, rootChord, tipChord, section, structure } = wishes;
  const problems: GuidedProblem[] = [];
  const bound = (field: GuidedField, value: number, { min, max }: { min: number; max: number }) => {
    if (!(value >= min && value <= max)) problems.push({ field, code: 'out_of_bounds', min, max });
  };
  bound('span', span, GUIDED_BOUNDS.span);
  bound('rootChord', rootChord, GUIDED_BOUNDS.chord);
  bound('tipChord', tipChord, GUIDED_BOUNDS.chord);
  if (problems.length > 0) return problems;
  if (tipChord > rootChord) problems.push({ field: 'tipChord', code: 'tip_wider_than_root' });
  if (LEAST_CHORDS * rootChord > span) problems.push({ field: 'rootChord', code: 'chord_too_long' });
  if (structure === 'sheet') return problems;
  const thickness = /^\d{4}$/.test(section) ? (Number(section.slice(2)) / 100) * tipChord : Number.NaN;
  if (!(thickness > 0)) problems.push({ field: 'section', code: 'no_section' });
  else if (thickness < LEAST_THICKNESS) {
    problems.push({ field: 'structure', code: 'too_thin', thickness, least: LEAST_THICKNESS });
  }
  return problems;
}
