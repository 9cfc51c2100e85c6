/** A job folded from what the server has heard: the same pure fold as on the phones. */
import type { EntityManager } from 'typeorm';
import type { Pack } from '../../../shared/api/jobs';
import { foldJob } from '../../../shared/job/fold';
import type { JobFacts, JobState } from '../../../shared/job/types';
import type { EntryStore, ReceivedEntry, SetAsideEntry } from '../entries/store';
import type { PeopleService } from '../people/service';
import { JobPersonEntity, PackEntity, type JobEntity } from './entity';

export interface FoldedJob {
  pack: Pack;
  entries: ReceivedEntry[];
  setAside: SetAsideEntry[];
  facts: JobFacts;
  state: JobState;
}

/** Packs never change, so a parsed one is good for ever. */
const keptPacks = 16;

export class Folding {
  private readonly packs = new Map<string, Pack>();

  constructor(
    private readonly entries: EntryStore,
    private readonly people: PeopleService,
  ) {}

  /** Null while the job is planned: nothing was sent that could be answered. */
  async fold(tx: EntityManager, job: JobEntity): Promise<FoldedJob | null> {
    if (job.pack === null) return null;
    const pack = await this.pack(tx, job.pack);
    const entries = await this.entries.ofJob(tx, job.id);
    const facts = await this.facts(tx, job);
    const state = foldJob(
      pack.checklist,
      entries.map(({ entry }) => entry),
      facts,
    );
    return { pack, entries, setAside: await this.entries.setAside(tx, job.id), facts, state };
  }

  async pack(tx: EntityManager, digest: string): Promise<Pack> {
    const known = this.packs.get(digest);
    if (known) return known;
    const { content } = await tx.findOneOrFail(PackEntity, {
      where: { digest },
      select: { digest: true, content: true },
    });
    // Written by this server from the type itself and never changed since.
    const pack = JSON.parse(content) as Pack;
    this.packs.set(digest, pack);
    for (const oldest of this.packs.keys()) if (this.packs.size > keptPacks) this.packs.delete(oldest);
    return pack;
  }

  private async facts(tx: EntityManager, job: JobEntity): Promise<JobFacts> {
    const members = await tx.find(JobPersonEntity, { where: { job: job.id }, order: { person: 'ASC' } });
    const names = await this.people.names(
      tx,
      members.map(({ person }) => person),
    );
    const owners = await this.entries.owners(tx, job.id);
    return {
      people: members.map(({ person, part }) => ({ id: person, name: names.get(person) ?? '', part })),
      logs: Object.fromEntries(owners.map(({ log, person }) => [log, person])),
      cancelled: job.cancelledAt !== null,
      ...(job.pack !== null && { pack: job.pack }),
    };
  }
}
