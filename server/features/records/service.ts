/** Seals completed jobs into their site's chain, and amends records when entries arrive after the seal. */
import { v7 } from 'uuid';
import type { DataSource, EntityManager } from 'typeorm';
import type { RecordDocument } from '../../../shared/api/recordDocument';
import { canonicalJson } from '../../../shared/panel/canonical';
import { writeAudit } from '../audit/service';
import type { FoldedJob } from '../jobs/folding';
import type { JobTurns, SealableJob } from '../jobs/turns';
import type { MailQueue } from '../mail/queue';
import type { PeopleService } from '../people/service';
import { exceptionCount, recordDocumentOf } from './document/recordDocumentOf';
import { RecordChainEntity, RecordEntity } from './entity';
import { unready, type Unready } from './ready';
import { sealOf, sha256Of } from './seal';

export type SealOutcome =
  { sealed: true; record: string; number: number } | { sealed: false; reasons: Unready[] };

interface Taken {
  job: SealableJob;
  folded: FoldedJob;
}
interface SealParts {
  database: DataSource;
  turns: JobTurns;
  people: PeopleService;
  mail: MailQueue;
  /** Told of a job whose sealing failed; it is tried again. */
  failed: (job: string, error: unknown) => void;
  now?: () => Date;
}

/** A record's row as plain values. */
type SealedRow = Pick<RecordEntity, keyof RecordEntity>;

const nothingNew: SealOutcome = { sealed: false, reasons: [] };

export class SealingService {
  constructor(private readonly parts: SealParts) {}

  /**
   * Seals a job that is ready; amends the record of one that is sealed and has heard more since.
   * One transaction: the job's row, then the chain's, the fold, the checks, the record, the mails.
   */
  sealIfReady(id: string): Promise<SealOutcome> {
    return this.parts.database.transaction(async (tx) => {
      const taken = await this.parts.turns.takeFolded(tx, id);
      if (!taken) return nothingNew;
      if (taken.job.record !== null) return this.amend(tx, taken, taken.job.record);
      const reasons = unready(taken);
      if (reasons.length > 0) return { sealed: false, reasons };
      const record = await this.write(tx, taken, null);
      await this.parts.turns.sealed(tx, id, record.id, record.sealedAt);
      return { sealed: true, record: record.id, number: record.number };
    });
  }

  /**
   * Makes up for what was missed when a server stopped, or failed, between taking entries and sealing.
   * One job that fails does not keep the others from being sealed.
   */
  async sealWaiting(): Promise<void> {
    for (const id of await this.parts.turns.awaitingRecord(this.parts.database.manager))
      await this.sealIfReady(id).catch((error: unknown) => this.parts.failed(id, error));
  }

  private async amend(tx: EntityManager, taken: Taken, first: string): Promise<SealOutcome> {
    const last = await tx.findOneOrFail(RecordEntity, {
      where: { job: taken.job.id },
      order: { number: 'DESC' },
    });
    const { entries, setAside } = taken.folded;
    const newest = entries.at(-1)?.order ?? 0;
    if (newest <= last.lastOrder && setAside.length <= last.setAside) return nothingNew;
    const record = await this.write(tx, taken, await tx.findOneByOrFail(RecordEntity, { id: first }));
    return { sealed: true, record: record.id, number: record.number };
  }

  private async write(tx: EntityManager, taken: Taken, amends: RecordEntity | null): Promise<SealedRow> {
    const { job, folded } = taken;
    const chain = await this.takeChain(tx, job.site);
    const document = recordDocumentOf({
      ...taken,
      names: await this.names(tx, folded),
      sentAt: (await this.parts.turns.packsOf(tx, job.id)).at(-1)?.madeAt ?? null,
      amends: amends && { number: amends.number, digest: amends.digest },
    });
    const record = this.rowOf(taken, document, chain, amends);
    await tx.insert(RecordEntity, record);
    await tx.update(
      RecordChainEntity,
      { site: job.site },
      { lastNumber: record.number, lastSeal: record.seal },
    );
    await this.tell(tx, job, record);
    const { id, number, seal } = record;
    const act = amends ? 'record-amended' : 'record-sealed';
    await writeAudit(tx, {
      actor: null,
      site: job.site,
      act,
      about: { record: id, number, seal, job: job.id },
    });
    return record;
  }

  /** Takes the end of the site's chain until the transaction ends: numbers have no gap and seals one order. */
  private async takeChain(tx: EntityManager, site: string): Promise<RecordChainEntity> {
    await tx.query('INSERT INTO record_chain (site, last_number) VALUES ($1, 0) ON CONFLICT DO NOTHING', [
      site,
    ]);
    return tx.findOneOrFail(RecordChainEntity, { where: { site }, lock: { mode: 'pessimistic_write' } });
  }

  private rowOf(
    { job, folded }: Taken,
    document: RecordDocument,
    chain: RecordChainEntity,
    amends: RecordEntity | null,
  ): SealedRow {
    const content = canonicalJson(document);
    const digest = sha256Of(content);
    const named = (part: 'electrician' | 'foreman') =>
      document.people.filter((person) => person.part === part).map(({ name }) => name);
    return {
      id: v7(),
      site: job.site,
      number: chain.lastNumber + 1,
      job: job.id,
      amends: amends?.id ?? null,
      content,
      digest,
      previousSeal: chain.lastSeal,
      seal: sealOf(chain.lastSeal, digest),
      language: document.language,
      sealedAt: this.parts.now?.() ?? new Date(),
      lastOrder: folded.entries.at(-1)?.order ?? 0,
      setAside: folded.setAside.length,
      panelTag: job.panelTag,
      panelName: job.panelName,
      jobNumber: job.number,
      electricians: named('electrician'),
      foreman: named('foreman').join(', '),
      people: document.people.map(({ id }) => id),
      points: document.scope,
      locks: [...new Set(document.lockOut.map(({ lock }) => lock))],
      exceptions: exceptionCount(document),
    };
  }

  /** Everybody whom the entries name, whether still on the job or not. */
  private names(tx: EntityManager, { facts, state }: FoldedJob): Promise<Map<string, string>> {
    return this.parts.people.names(tx, [
      ...facts.people.map(({ id }) => id),
      ...Object.values(facts.logs),
      ...state.locks.flatMap(({ person, removedBy }) => [person, removedBy ?? person]),
    ]);
  }

  /** Number and seal leave the database with this mail: a chain cut at its end is noticed by whoever kept it. */
  private async tell(tx: EntityManager, job: SealableJob, record: SealedRow): Promise<void> {
    const officers = await this.parts.people.contactsWithRole(tx, job.site, 'safety-officer');
    const foreman = await this.parts.people.contacts(tx, [job.foreman]);
    const to = [...officers, ...foreman.filter(({ id }) => !officers.some((each) => each.id === id))];
    for (const { name, email, language } of to)
      await this.parts.mail.queue(tx, {
        to: email,
        language,
        kind: record.amends === null ? 'record-sealed' : 'record-amended',
        params: { name, number: record.number, panel: job.panelTag, job: job.number, seal: record.seal },
        path: `/records/${record.id}`,
        attachment: { name: `record-${record.number}-${fileName(job.panelTag)}.pdf`, record: record.id },
      });
  }
}

export const fileName = (tag: string): string => tag.replace(/[^A-Za-z0-9-]+/g, '_');
