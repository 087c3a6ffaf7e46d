import { z } from 'zod';
import { useKept } from '#client/hooks/use-kept.ts';
import { DEFAULT_DRAWS } from '#shared/core/draws.ts';
import { THICKNESS_TOLERANCE } from '#shared/core/draws-causes.ts';
import { LIMITS } from '#shared/schemas/limits.ts';

/** How many draws may be asked for: fewer say too little of the tails, more take seconds and say nothing new. */
export const DRAWS = { min: 1_000, max: 1_000_000 };
export const SEED = { min: 0, max: 999_999_999 };
/** Half width, mm, and relative standard deviation. */
export const TOLERANCE = { min: 0, max: 1 };
export const PIECE_CV = { min: 0, max: 0.5 };
export const PIECES = { max: 50 };

const piece = z.object({
  id: z.string().max(LIMITS.key.max),
  name: z.string().max(LIMITS.name.max),
  lines: z.array(z.string()).max(LIMITS.parts.max),
  cv: z.number().min(PIECE_CV.min).max(PIECE_CV.max),
});

const drawSettings = z.object({
  draws: z.int().min(DRAWS.min).max(DRAWS.max),
  seed: z.int().min(SEED.min).max(SEED.max),
  thickness: z.number().min(TOLERANCE.min).max(TOLERANCE.max),
  pieces: z.array(piece).max(PIECES.max),
});

/** How a glider is drawn: how often, from which seed, and what scatters with what. */
export type DrawSettings = z.infer<typeof drawSettings>;
/** A sheet or stick that was weighed, and the lines cut from it. */
export type WeighedPiece = z.infer<typeof piece>;

export const USUAL_SETTINGS: DrawSettings = {
  draws: DEFAULT_DRAWS,
  seed: 1,
  thickness: THICKNESS_TOLERANCE,
  pieces: [],
};

/** The settings of one glider, by its id or `sample`, as this browser keeps them. */
export function useDrawSettings(glider: string): [DrawSettings, (settings: DrawSettings) => void] {
  return useKept<DrawSettings>(`featherbeam.draws.${glider}`, drawSettings, USUAL_SETTINGS);
}
