/** Does a chain hold this record, unchanged? Asked by anybody, answered with no more than panel and date. */
import type { DataSource } from 'typeorm';
import type { z } from 'zod';
import type { verifyRequest, VerifyAnswer } from '../../../shared/api/records';
import { digestOf } from '../../../shared/panel/canonical';
import { Refused } from '../../http/refused';
import { amendedBy } from './books';
import { firstBreak, sha256Of, type Link } from './seal';

interface Found {
  site: string;
  number: number;
  job: string;
  panel_tag: string;
  sealed_at: Date;
  content: string;
  digest: string;
  /** Found by the hash of its PDF: then the PDF's bytes are known good. */
  by_pdf: boolean;
}

function digestOfRecord(record: Record<string, unknown>): string {
  try {
    return digestOf(record);
  } catch {
    throw new Refused(422, 'invalid', {}, [{ path: 'record', says: 'has no canonical form' }]);
  }
}

export class RecordVerifying {
  constructor(private readonly database: DataSource) {}

  async verify(request: z.output<typeof verifyRequest>): Promise<VerifyAnswer> {
    const whole = 'record' in request;
    const digest = whole ? digestOfRecord(request.record) : request.digest;
    const found = await this.find(digest);
    if (!found) return { known: false };
    return {
      known: true,
      chainHolds: await this.holds(found),
      panelTag: found.panel_tag,
      date: found.sealed_at.toISOString(),
      // Only who has the record itself learns its number; that it was amended everybody must know.
      ...(whole || found.by_pdf ? { number: found.number } : {}),
      amendedBy: await amendedBy(this.database, found),
    };
  }

  private async find(digest: string): Promise<Found | undefined> {
    const rows = await this.database.query<Found[]>(
      `SELECT r.site, r.number, r.job, r.panel_tag, r.sealed_at, r.content, r.digest, p.sha256 = $1 AS by_pdf
       FROM record r LEFT JOIN record_pdf p ON p.record = r.id
       WHERE r.digest = $1 OR r.seal = $1 OR p.sha256 = $1 ORDER BY r.number LIMIT 1`,
      [digest],
    );
    return rows[0];
  }

  /** The content is what the digest says, and the site's whole chain of seals is unbroken. */
  private async holds({ site, content, digest }: Found): Promise<boolean> {
    if (sha256Of(content) !== digest) return false;
    const { links, end } = await chainOf(this.database, site);
    return firstBreak(links) === null && endHolds(links, end);
  }
}

export interface ChainEnd {
  lastNumber: number;
  lastSeal: string | null;
}

/** Reads with SQL: the data source, or one connection inside a transaction. */
export interface Queries {
  query<T>(text: string, values?: unknown[]): Promise<T>;
}

export async function chainOf(
  database: Queries,
  site: string,
): Promise<{ links: Link[]; end: ChainEnd | undefined }> {
  // One statement, so that a record sealed in this moment is in both or in neither.
  const rows = await database.query<(ChainEnd & (Link | { number: null }))[]>(
    `SELECT r.number, r.digest, r.previous_seal AS "previousSeal", r.seal,
       c.last_number AS "lastNumber", c.last_seal AS "lastSeal"
     FROM record_chain c LEFT JOIN record r ON r.site = c.site WHERE c.site = $1 ORDER BY r.number`,
    [site],
  );
  const [end] = rows;
  return { links: rows.filter((row): row is ChainEnd & Link => row.number !== null), end };
}

/** The chain's own row names the newest record: a tail that was cut off shows. */
export function endHolds(links: readonly Link[], end: ChainEnd | undefined): boolean {
  const last = links.at(-1);
  return end !== undefined && end.lastNumber === (last?.number ?? 0) && end.lastSeal === (last?.seal ?? null);
}
