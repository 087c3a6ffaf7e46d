import { z } from 'zod';
import { LIMITS } from './limits.ts';
import { preferences } from './preferences.ts';

export const email = z
  .string()
  .trim()
  .toLowerCase()
  .max(LIMITS.email.max, 'That address is too long.')
  .pipe(z.email('That is not an e-mail address.'));

/** Length and a list of common ones are the whole rule (the list is asked on the server); no symbol classes. */
export const newPassword = z
  .string()
  .min(LIMITS.password.min, `Use at least ${LIMITS.password.min} characters.`)
  .max(LIMITS.password.max, `Use at most ${LIMITS.password.max} characters.`);

export const signIn = z.strictObject({
  email,
  password: z.string().min(1, 'Type your password.').max(LIMITS.password.max, 'That password is too long.'),
});
export const signUp = z.strictObject({
  name: z.string().trim().min(1, 'Type your name.').max(LIMITS.name.max),
  email,
  password: newPassword,
});

export const user = z.strictObject({
  id: z.uuid(),
  name: z.string(),
  email: z.string(),
  role: z.enum(['admin', 'user']),
});
export const session = z.strictObject({
  user: user.nullable(),
  /** how the user wants to see everything; absent for a visitor */
  preferences: preferences.optional(),
});

export type SignIn = z.infer<typeof signIn>;
export type SignUp = z.infer<typeof signUp>;
export type UserDto = z.infer<typeof user>;
export type SessionDto = z.infer<typeof session>;
