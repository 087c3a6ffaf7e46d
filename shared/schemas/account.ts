import { z } from 'zod';
import { LIMITS } from './limits.ts';
import { preferences } from './preferences.ts';
import { email, newPassword, user } from './session.ts';

const userName = z.string().trim().min(1, 'Type your name.').max(LIMITS.name.max);
const password = z.string().min(1, 'Type your password.').max(LIMITS.password.max);
/** What stands at the end of a mailed link. */
export const token = z.string().regex(/^[\w-]{43}$/, 'Is not a link of ours.');

export const account = z.strictObject({
  ...user.shape,
  /** whether the address is known to be the user's */
  verified: z.boolean(),
  /** the address that becomes theirs once its link is followed */
  pendingEmail: z.string().nullable(),
  ...preferences.shape,
  createdAt: z.iso.datetime(),
  /** gliders owned, and gliders of others shared with the user */
  gliders: z.strictObject({ owned: z.int(), shared: z.int() }),
});

/** What is not named stays; `units` takes the place of all choices made before. */
export const accountChanges = z
  .strictObject({ name: userName, ...preferences.shape })
  .partial()
  .refine((changes) => Object.keys(changes).length > 0, 'Name at least one field.');

export const emailChange = z.strictObject({ email, password });
export const passwordChange = z.strictObject({ current: password, password: newPassword });
export const passwordForgotten = z.strictObject({ email });
export const passwordReset = z.strictObject({ token, password: newPassword });
export const tokenInput = z.strictObject({ token });
export const verifiedEmail = z.strictObject({ email: z.string() });

/** A browser that is signed in. */
export const accountSession = z.strictObject({
  id: z.uuid(),
  /** such as “Firefox on Windows” */
  device: z.string(),
  /** the one that asks */
  current: z.boolean(),
  createdAt: z.iso.datetime(),
  /** to the hour */
  lastUsedAt: z.iso.datetime(),
});
export const accountSessionList = z.strictObject({ sessions: z.array(accountSession) });

const named = z.strictObject({ id: z.uuid(), name: z.string() });
export const accountDeletionInput = z.strictObject({ password });
/** What went with an account. */
export const accountDeletion = z.strictObject({
  /** own gliders, gone with their sheets, saves and photos */
  deleted: z.array(named),
  /** gliders of others that the user is no longer a member of */
  left: z.array(named),
});

export type AccountDto = z.infer<typeof account>;
export type AccountChanges = z.infer<typeof accountChanges>;
export type EmailChange = z.infer<typeof emailChange>;
export type PasswordChange = z.infer<typeof passwordChange>;
export type PasswordReset = z.infer<typeof passwordReset>;
export type AccountSessionDto = z.infer<typeof accountSession>;
export type AccountSessionListDto = z.infer<typeof accountSessionList>;
export type AccountDeletionDto = z.infer<typeof accountDeletion>;
