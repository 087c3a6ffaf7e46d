import type { FlightDraft } from './draft.ts';

export type Behaviour = FlightDraft['glides'][number]['behaviour'];

interface GlideAdvice {
  label: string;
  /** what to change after it, one thing at a time; common practice, no source */
  advice: string;
}

/** How a hand glide went and what is usually changed after it. */
export const GLIDES: Record<Behaviour, GlideAdvice> = {
  level: {
    label: 'Flew level to the ground',
    advice: 'Leave it. Once more the same before the first launch, then a gentle one.',
  },
  dives: {
    label: 'Dived',
    advice:
      'Thrown too fast? Then again, gentler. Else a little more tail-down: half a millimetre under the tailplane’s trailing edge or a click of up. Only then weight out of the nose, a gram at a time, never aft of the range.',
  },
  stalls: {
    label: 'Rose and stalled',
    advice:
      'Thrown too hard, or nose up? Then again, level. Else a little less tail-down, or a gram more in the nose.',
  },
  turns_port: {
    label: 'Turned to port',
    advice:
      'Look for a warp first and for a heavy port half. Then a touch of starboard rudder or a little weight at the starboard tip.',
  },
  turns_starboard: {
    label: 'Turned to starboard',
    advice:
      'Look for a warp first and for a heavy starboard half. Then a touch of port rudder or a little weight at the port tip.',
  },
  other: { label: 'Something else', advice: 'Write down what it did; change one thing, then glide again.' },
};
