import { createHash, randomBytes } from 'node:crypto';
import { hash, verify } from '@node-rs/argon2';

/** A password as it is kept: argon2id with the library's own (OWASP's) cost. */
export const hashPassword = (password: string): Promise<string> => hash(password);

export const passwordFits = (passwordHash: string, password: string): Promise<boolean> =>
  verify(passwordHash, password);

/** The secret part of a link, 256 bits. */
export const newToken = (): string => randomBytes(32).toString('base64url');

/** A token as it is kept: what leaks from the database opens nothing. */
export const hashToken = (token: string): string => createHash('sha256').update(token).digest('hex');
