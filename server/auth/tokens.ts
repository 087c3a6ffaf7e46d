import { createHash, randomBytes } from 'node:crypto';

/** A secret for a link: 256 random bits, as 43 signs that go into an address as they are. */
export const newToken = (): string => randomBytes(32).toString('base64url');

/** What the database keeps of a mailed link's token: who reads the table can follow none. */
export const hashToken = (token: string): string => createHash('sha256').update(token).digest('hex');
