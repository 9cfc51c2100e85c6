/** Walks the chain of every site, with the content of each record and its PDF, and names the first break. */
import { breakAt, sha256Of, type Break, type Link } from './seal';
import { chainOf, endHolds, type Queries } from './verifying';

export interface ChainReport {
  site: string;
  records: number;
  broken: Break | null;
}

/** Content and PDF one record at a time: a chain may be larger than memory. */
async function contentBreak(
  database: Queries,
  site: string,
  { number, digest }: Link,
): Promise<Break | null> {
  const rows = await database.query<{ content: string; pdf: Buffer | null; sha256: string | null }[]>(
    `SELECT r.content, p.content AS pdf, p.sha256 FROM record r LEFT JOIN record_pdf p ON p.record = r.id
     WHERE r.site = $1 AND r.number = $2`,
    [site, number],
  );
  const [row] = rows;
  if (!row || sha256Of(row.content) !== digest) return { number, why: 'content' };
  if (row.pdf && sha256Of(row.pdf) !== row.sha256) return { number, why: 'pdf' };
  return null;
}

async function breakOf(database: Queries, site: string): Promise<{ records: number; broken: Break | null }> {
  const { links, end } = await chainOf(database, site);
  let before: Link | null = null;
  for (const link of links) {
    const broken = breakAt(before, link) ?? (await contentBreak(database, site, link));
    if (broken) return { records: links.length, broken };
    before = link;
  }
  const cut: Break | null = endHolds(links, end) ? null : { number: links.length + 1, why: 'cut' };
  return { records: links.length, broken: cut };
}

export async function chainBreaks(database: Queries): Promise<ChainReport[]> {
  const sites = await database.query<{ id: string; name: string }[]>(
    `SELECT s.id, s.name FROM site s
     WHERE EXISTS (SELECT FROM record_chain c WHERE c.site = s.id) OR EXISTS (SELECT FROM record r WHERE r.site = s.id)
     ORDER BY s.name`,
  );
  const reports: ChainReport[] = [];
  for (const { id, name } of sites) reports.push({ site: name, ...(await breakOf(database, id)) });
  return reports;
}
