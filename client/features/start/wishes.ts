import { z } from 'zod';
import type { GuidedWishes } from '#shared/plan-start/guided-wishes.ts';

/** What a start begins with: a towline glider of common size. */
export const FIRST_WISHES: GuidedWishes = {
  name: '',
  span: 1200,
  rootChord: 150,
  tipChord: 110,
  dihedral: 'polyhedral',
  section: '4409',
  structure: 'sheeted',
  tail: 'built',
  radio: false,
};

/** Wishes as the browser keeps them until the glider is drawn; a length that is being typed may be missing. */
export const keptWishes = z.object({
  name: z.string(),
  span: z.number().nullable(),
  rootChord: z.number().nullable(),
  tipChord: z.number().nullable(),
  dihedral: z.enum(['flat', 'vee', 'polyhedral']),
  section: z.string(),
  structure: z.enum(['sheeted', 'open', 'sheet']),
  tail: z.enum(['built', 'sheet', 'none']),
  radio: z.boolean(),
});

export type KeptWishes = z.infer<typeof keptWishes>;

/** Complete wishes; a missing length is no number, which the bounds refuse. */
export function completed(kept: KeptWishes): GuidedWishes {
  const { span, rootChord, tipChord } = kept;
  const name = kept.name.trim() === '' ? 'New glider' : kept.name.trim();
  return {
    ...kept,
    name,
    span: span ?? Number.NaN,
    rootChord: rootChord ?? Number.NaN,
    tipChord: tipChord ?? Number.NaN,
  };
}
