import type { UserDto } from '#shared/schemas/session.ts';

/** Works on a row and on a session's user alike; whatever else these carry stays here. */
export function presentUser({ id, name, email, role }: UserDto): UserDto {
  return { id, name, email, role };
}
