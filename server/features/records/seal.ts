/** How records hang together: each seal covers its record and, through the seal before it, all earlier ones. */
import { createHash } from 'node:crypto';

export interface Link {
  number: number;
  digest: string;
  previousSeal: string | null;
  seal: string;
}

/** SHA-256 over the bytes of the seal before (none for the first record) and of the digest. */
export function sealOf(previousSeal: string | null, digest: string): string {
  const hash = createHash('sha256');
  if (previousSeal !== null) hash.update(Buffer.from(previousSeal, 'hex'));
  return hash.update(Buffer.from(digest, 'hex')).digest('hex');
}

export const sha256Of = (bytes: Buffer | string): string => createHash('sha256').update(bytes).digest('hex');

export type Break = { number: number; why: 'missing' | 'unlinked' | 'seal' | 'content' | 'cut' | 'pdf' };

/** What is wrong with one link after the one before it; null when it holds. */
export function breakAt(before: Link | null, link: Link): Break | null {
  const expected = (before?.number ?? 0) + 1;
  if (link.number !== expected) return { number: expected, why: 'missing' };
  if (link.previousSeal !== (before?.seal ?? null)) return { number: link.number, why: 'unlinked' };
  if (link.seal !== sealOf(link.previousSeal, link.digest)) return { number: link.number, why: 'seal' };
  return null;
}

/** The first break of a whole chain in order of numbers; null when it holds. */
export function firstBreak(links: readonly Link[]): Break | null {
  let before: Link | null = null;
  for (const link of links) {
    const broken = breakAt(before, link);
    if (broken) return broken;
    before = link;
  }
  return null;
}
