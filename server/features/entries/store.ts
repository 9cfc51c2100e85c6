/** Reads of entries for other services; what is stored is what was received. */
import type { EntityManager } from 'typeorm';
import type { Entry } from '../../../shared/job/entry';
import { EntryEntity, SetAsideEntity } from './entity';

export interface ReceivedEntry {
  entry: Entry;
  order: number;
  hash: string;
  key: string;
  receivedAt: Date;
  /** Received after its person's access had ended. */
  afterAccess: boolean;
}
export interface SetAsideEntry {
  entry: Entry;
  hash: string;
  receivedAt: Date;
}

/** Entries passed the contract's schema before they were stored, and nothing changes them since. */
const entryOf = (content: string): Entry => JSON.parse(content) as Entry;

const received = (row: EntryEntity): ReceivedEntry => ({
  entry: entryOf(row.content),
  order: row.order,
  hash: row.hash,
  key: row.key,
  receivedAt: row.receivedAt,
  afterAccess: row.afterAccess,
});

export class EntryStore {
  /** Every entry of a job in the order of its commits. For services that have judged access. */
  async ofJob(tx: EntityManager, job: string): Promise<ReceivedEntry[]> {
    const rows = await tx.find(EntryEntity, { where: { job }, order: { order: 'ASC' } });
    return rows.map(received);
  }

  /** Entries after an order, at most `limit`. For services that have judged access. */
  async after(tx: EntityManager, job: string, order: number, limit: number): Promise<ReceivedEntry[]> {
    const rows = await tx
      .createQueryBuilder(EntryEntity, 'e')
      .where('e.job = :job AND e.order > :order', { job, order })
      .orderBy('e.order', 'ASC')
      .limit(limit)
      .getMany();
    return rows.map(received);
  }

  async setAside(tx: EntityManager, job: string): Promise<SetAsideEntry[]> {
    const rows = await tx.find(SetAsideEntity, { where: { job }, order: { receivedAt: 'ASC', id: 'ASC' } });
    return rows.map(({ content, hash, receivedAt }) => ({ entry: entryOf(content), hash, receivedAt }));
  }

  /** Whether somebody has signed this job: from then on every entry may change whose turn it is. */
  async holdsSignature(tx: EntityManager, job: string): Promise<boolean> {
    return tx.existsBy(EntryEntity, { job, kind: 'signed' });
  }

  /** log → owner of each log of the job, with the key it is signed with. */
  async owners(tx: EntityManager, job: string): Promise<{ log: string; key: string; person: string }[]> {
    return tx.query(
      `SELECT DISTINCT e.log, e.key, k.person FROM entry e JOIN device_key k ON k.id = e.key WHERE e.job = $1`,
      [job],
    );
  }
}
