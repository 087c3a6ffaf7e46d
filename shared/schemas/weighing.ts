import { z } from 'zod';
import { LIMITS } from './limits.ts';
import { coordinate, identifier, length, positive, title, within } from './plan-parts.ts';

/** What stood on the scale, and how far it was built. */
export const buildStage = z.enum(['part', 'framed', 'sheeted', 'covered', 'model']);

/** One thing on the scale: a line of the estimate on its side. */
export const coveredLine = z.strictObject({
  /** `<surface>/<id>`, `solid/<id>`, `item/<id>` */
  line: z
    .string()
    .min(1, 'Must not be empty.')
    .max(2 * LIMITS.key.max + 1),
  side: z.enum(['port', 'starboard', 'middle']),
});

const weighingFields = {
  /** what it is called on the list */
  title: title(),
  stage: buildStage,
  covers: z
    .array(coveredLine)
    .min(1, 'Name at least one part.')
    .max(2 * LIMITS.parts.max, `Weigh at most ${2 * LIMITS.parts.max} parts at once.`),
  /** as the scale showed them, tare not taken off, g */
  values: z
    .array(within(0, LIMITS.massG.max))
    .max(LIMITS.repeats.max, `Repeat a reading at most ${LIMITS.repeats.max} times.`),
  tare: within(0, LIMITS.massG.max),
  /** the smallest step that the scale shows, g */
  resolution: positive(LIMITS.massG.max),
  /** where the set balanced, mm aft of the datum; null where that was not measured */
  x: coordinate().nullable(),
  /** of the one material that was on the scale, to tell why it ran over: kg/m³ and mm; null where not measured */
  density: positive(LIMITS.density.max).nullable(),
  thickness: length().nullable(),
  /** a photo of the glider */
  photoId: z.uuid().nullable(),
  note: z.string().trim().max(LIMITS.note.max),
  /** the saved plan whose parts it names */
  gliderVersion: z.int().min(1),
  /** by the clock of the device at the bench */
  weighedAt: z.iso.datetime(),
  /** the weighing that this one takes the place of; null for a new one */
  corrects: z.uuid().nullable(),
  /** why it was corrected or taken back */
  reason: z.string().trim().max(LIMITS.note.max),
  /** takes the corrected one back without another in its place */
  withdraws: z.boolean(),
};

type WeighingShape = z.infer<z.ZodObject<typeof weighingFields>>;

function weighingIssues(input: WeighingShape): { path: string[]; message: string }[] {
  const issues: { path: string[]; message: string }[] = [];
  const { values, tare, corrects, reason, withdraws } = input;
  if (!withdraws && values.length === 0) {
    issues.push({ path: ['values'], message: 'Type at least one reading.' });
  }
  if (!withdraws && values.some((value) => value < tare)) {
    issues.push({ path: ['tare'], message: 'Is more than the scale showed.' });
  }
  if (withdraws && corrects === null) {
    issues.push({ path: ['withdraws'], message: 'There is nothing to take back.' });
  }
  if (corrects !== null && reason === '') {
    issues.push({ path: ['reason'], message: 'Say why it is corrected.' });
  }
  return issues;
}

export const weighingInput = z.strictObject(weighingFields).check(
  z.superRefine((input, ctx) => {
    for (const issue of weighingIssues(input)) ctx.addIssue({ code: 'custom', ...issue });
  }),
);

/** A weighing as it was written down; it never changes, a correction is one of its own. */
export const weighing = z.strictObject({
  ...weighingFields,
  id: z.uuid(),
  /** counts up per glider */
  number: z.int(),
  /** readings less tare, g, and its standard uncertainty; null for one that only takes another back */
  mass: z.number().nullable(),
  u: z.number().nullable(),
  weighedBy: z.string(),
  receivedAt: z.iso.datetime(),
  /** the later one that counts in its place */
  correctedBy: z.uuid().nullable(),
});

/** All of a glider, in the order in which they were received. */
export const weighingList = z.strictObject({ weighings: z.array(weighing) });

const ballastPiece = z.strictObject({
  id: identifier(),
  name: title(),
  mass: positive(LIMITS.massG.max),
  divisible: z.boolean(),
});

const buildTermsFields = {
  /** what the finished model is to weigh, g; null where nothing is aimed at */
  target: positive(LIMITS.massG.max).nullable(),
  /** class window of the mass, g */
  least: positive(LIMITS.massG.max).nullable(),
  most: positive(LIMITS.massG.max).nullable(),
  /** lead and putty at hand */
  pieces: z.array(ballastPiece).max(LIMITS.ballastPieces.max),
  /** where ballast goes, mm aft of the datum, and what there is room for, g */
  ballastAt: coordinate().nullable(),
  ballastRoom: positive(LIMITS.massG.max).nullable(),
};

/** What a glider is built and trimmed to. */
export const buildTermsInput = z
  .strictObject(buildTermsFields)
  .refine(({ least, most }) => least === null || most === null || least <= most, {
    path: ['most'],
    message: 'Must not be less than the least mass.',
  });
export const buildTerms = z.strictObject({
  ...buildTermsFields,
  /** 1 while nobody has kept any; also the ETag */
  version: z.int(),
  updatedAt: z.iso.datetime().nullable(),
  updatedBy: z.string().nullable(),
});

export type BuildStage = z.infer<typeof buildStage>;
export type WeighingInput = z.infer<typeof weighingInput>;
export type WeighingDto = z.infer<typeof weighing>;
export type WeighingListDto = z.infer<typeof weighingList>;
export type BuildTermsInput = z.infer<typeof buildTermsInput>;
export type BuildTermsDto = z.infer<typeof buildTerms>;
