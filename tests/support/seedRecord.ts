/** A record put straight into the database, for tests that only ask who may read it. */
import { v7 } from 'uuid';
import { canonicalJson } from '../../shared/panel/canonical';
import type { Services } from '../../server/services';
import { sampleRecord } from './recordSample';
import { sha256 } from './signingDevice';

interface RecordOf {
  site: string;
  job: string;
  pack: string;
  people: string[];
}

/** @returns its id. */
export async function seedRecord(services: Services, { site, job, pack, people }: RecordOf): Promise<string> {
  const id = v7();
  const document = sampleRecord(1);
  const content = canonicalJson({ ...document, job: { ...document.job, pack } });
  await services.database.query(
    `INSERT INTO record (id, site, number, job, content, digest, seal, language, sealed_at, last_order, set_aside,
       panel_tag, panel_name, job_number, electricians, foreman, people, points, locks, exceptions)
     VALUES ($1, $2, 1, $3, $4, $5, $6, 'en', now(), 1, 0, 'FG-01', 'Filter gallery', '0001', '{}', '', $7, '{}', '{}', 0)`,
    [id, site, job, content, sha256(content), sha256(`seal ${content}`), people],
  );
  const pdf = Buffer.from('%PDF-1.7 made once, kept as it is');
  await services.database.query(
    'INSERT INTO record_pdf (record, sha256, content, made_at) VALUES ($1, $2, $3, now())',
    [id, sha256(pdf), pdf],
  );
  return id;
}
