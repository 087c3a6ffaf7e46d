/** What a coordinate text was taken for, or mended to. Worded in the client. */
export type SectionNote =
  /** coordinates in per cent, or at some other size of the chord, brought to a chord of 1 */
  | { code: 'percent' }
  | { code: 'scaled'; chord: number }
  /** the underside came first, or points ran the other way round */
  | { code: 'turned' }
  | { code: 'duplicates'; count: number }
  /** the two faces did not meet at the nose, by this share of the chord, and were joined straight */
  | { code: 'nose_joined'; gap: number }
  /** so many points of so many are kept; none left out lies farther off the line, as a share of the chord */
  | { code: 'thinned'; from: number; to: number; tolerance: number };

/** Why a coordinate text is refused. `line` counts from 1, as editors do; `text` is what stands there. */
export type SectionProblem =
  | { code: 'no_points'; found: number }
  | { code: 'too_many_lines'; most: number }
  | { code: 'not_two_numbers'; line: number; text: string }
  | { code: 'counts_differ'; line: number; said: number; found: number }
  | { code: 'out_of_order'; line: number; text: string; face: 'first' | 'second' }
  | { code: 'one_face'; line: number }
  | { code: 'no_chord'; line: number }
  | { code: 'far_off'; line: number; text: string }
  | { code: 'short_face'; line: number; face: 'first' | 'second'; end: 'nose' | 'tail' }
  | { code: 'nose_open'; line: number; gap: number };

/** Refused: carries the problem up to whoever asked for the section. */
export class SectionRefused extends Error {
  constructor(readonly problem: SectionProblem) {
    super(problem.code);
  }
}
