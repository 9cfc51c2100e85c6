/** Password hashing (argon2id) and the mail tokens that let a person set one. */
import { createHash, randomBytes } from 'node:crypto';
import { hash, verify } from '@node-rs/argon2';

// OWASP password storage cheat sheet: argon2id with 19 MiB, 2 passes, 1 lane.
const cost = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

export const hashPassword = (password: string): Promise<string> => hash(password, cost);

let decoy: Promise<string> | undefined;
/** Takes the same time whether or not the account exists, so that its existence does not show. */
export async function passwordMatches(stored: string | null, password: string): Promise<boolean> {
  decoy ??= hashPassword(randomBytes(16).toString('hex'));
  const matches = await verify(stored ?? (await decoy), password);
  return stored !== null && matches;
}

/** 256 random bits, given out once; only the hash is kept. */
export const newToken = (): string => randomBytes(32).toString('base64url');
export const tokenHash = (token: string): string => createHash('sha256').update(token).digest('hex');
