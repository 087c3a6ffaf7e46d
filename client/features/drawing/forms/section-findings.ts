import { formatNumber } from '#shared/format/numbers.ts';
import type { SectionNote, SectionProblem } from '#shared/sections/findings.ts';

/** Shares of the chord as per cent, with as many digits as the smallest needs. */
const percent = (share: number) => `${formatNumber(share * 100, share < 1e-4 ? 4 : share < 0.01 ? 2 : 1)} %`;

/** What was mended in a coordinate text, in a sentence. */
export function noteWords(note: SectionNote): string {
  switch (note.code) {
    case 'percent':
      return 'Coordinates are in per cent of the chord.';
    case 'scaled':
      return `The chord was ${formatNumber(note.chord, 2)} long; it is brought to 1.`;
    case 'turned':
      return 'The underside came first; the points are turned round.';
    case 'duplicates':
      return note.count === 1 ? 'One point stood there twice.' : `${note.count} points stood there twice.`;
    case 'nose_joined':
      return `The nose was open by ${percent(note.gap)} of the chord; it is closed.`;
    case 'thinned':
      return `${formatNumber(note.from, 0)} points are thinned to ${formatNumber(note.to, 0)}; none left out lies more than ${percent(note.tolerance)} of the chord off the line.`;
  }
}

const FACE = { first: 'the first face', second: 'the second face' } as const;

/** Why a coordinate text is refused, with the line that is to blame. */
export function problemWords(problem: SectionProblem): string {
  switch (problem.code) {
    case 'no_points':
      return problem.found === 0
        ? 'No points are found. Write one to a line, x and z.'
        : `Only ${problem.found} points are found; a section takes at least 5.`;
    case 'too_many_lines':
      return `This has more than ${formatNumber(problem.most, 0)} lines; it is no section.`;
    case 'not_two_numbers':
      return `Line ${problem.line}, “${problem.text}”, is not two numbers.`;
    case 'counts_differ':
      return `Line ${problem.line} says ${problem.said} points; ${problem.found} follow.`;
    case 'out_of_order':
      return `Line ${problem.line}, “${problem.text}”, goes back along ${FACE[problem.face]}: its points must run from nose to tail or from tail to nose.`;
    case 'one_face':
      return `From line ${problem.line} on there is one face only; a section has two.`;
    case 'no_chord':
      return `From line ${problem.line} on all points have the same x.`;
    case 'far_off':
      return `Line ${problem.line}, “${problem.text}”, lies farther from the chord than the chord is long.`;
    case 'short_face':
      return `At line ${problem.line} ${FACE[problem.face]} ${problem.end === 'nose' ? 'begins far behind the nose' : 'ends far before the trailing edge'}.`;
    case 'nose_open':
      return `At line ${problem.line} the second face begins ${percent(problem.gap)} of the chord from the first; that is too far for a nose.`;
  }
}
