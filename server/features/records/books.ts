/** Records to look at: the list, one record, its JSON as it was sealed, its PDF. */
import type { DataSource } from 'typeorm';
import type { Page } from '../../../shared/api/common';
import { recordDocument, type RecordView } from '../../../shared/api/recordDocument';
import { recordQuery, type RecordRow } from '../../../shared/api/records';
import type { Actor } from '../../http/actor';
import { notFound } from '../../http/refused';
import { mayRead, reachOf } from './access';
import { RecordEntity } from './entity';
import type { RecordPdfs } from './pdfStore';
import { recordRows, type RecordQuery } from './rows';
import { fileName } from './service';

export interface RecordFile {
  name: string;
  bytes: Buffer;
}

export class RecordBooks {
  constructor(
    private readonly database: DataSource,
    private readonly pdfs: RecordPdfs,
  ) {}

  async list(actor: Actor, query: RecordQuery): Promise<Page<RecordRow>> {
    const found = await recordRows(this.database.manager, reachOf(actor), query);
    const shown = found.slice(0, query.limit);
    return {
      items: shown.map(({ row }) => row),
      next: found.length > query.limit ? (shown.at(-1)?.cursor ?? null) : null,
    };
  }

  async view(actor: Actor, id: string): Promise<RecordView> {
    const record = await this.readable(actor, id);
    const [found] = await recordRows(this.database.manager, reachOf(actor), recordQuery.parse({}), id);
    if (!found) throw notFound();
    return {
      ...found.row,
      previousSeal: record.previousSeal,
      amendedBy: await amendedBy(this.database, record),
      document: recordDocument.parse(JSON.parse(await this.content(id))),
    };
  }

  /** Byte for byte what the digest covers. */
  async json(actor: Actor, id: string): Promise<RecordFile> {
    const record = await this.readable(actor, id);
    return { name: nameOf(record, 'json'), bytes: Buffer.from(await this.content(id)) };
  }

  async pdf(actor: Actor, id: string): Promise<RecordFile> {
    const record = await this.readable(actor, id);
    const bytes = await this.pdfs.of(id);
    if (!bytes) throw notFound();
    return { name: nameOf(record, 'pdf'), bytes };
  }

  /** @throws Refused 404 when there is no such record for this person. */
  private async readable(actor: Actor, id: string): Promise<RecordEntity> {
    const record = await this.database.manager.findOneBy(RecordEntity, { id });
    if (!record || !mayRead(actor, record)) throw notFound();
    return record;
  }

  private async content(id: string): Promise<string> {
    const { content } = await this.database.manager.findOneOrFail(RecordEntity, {
      where: { id },
      select: { id: true, content: true },
    });
    return content;
  }
}

const nameOf = ({ number, panelTag }: RecordEntity, type: 'json' | 'pdf'): string =>
  `record-${number}-${fileName(panelTag)}.${type}`;

/** Numbers of the later records of the same job. */
export async function amendedBy(
  database: DataSource,
  { job, number }: Pick<RecordEntity, 'job' | 'number'>,
): Promise<number[]> {
  const rows = await database.query<{ number: number }[]>(
    'SELECT number FROM record WHERE job = $1 AND number > $2 ORDER BY number',
    [job, number],
  );
  return rows.map((row) => row.number);
}
