/** Jobs as they were last read, so that all screens that show one fold it once; read again after every change. */
import type { Entry } from '../../shared/job/entry';
import { sameEntries } from './sameEntries';
import type { LocalJob } from './types';

export class JobCache {
  private jobs = new Map<string, Promise<LocalJob | undefined>>();
  /** The last reading of each job, whose entries the next one goes on using. */
  private readonly last = new Map<string, LocalJob>();

  constructor(private readonly read: (job: string) => Promise<LocalJob | undefined>) {}

  job(id: string): Promise<LocalJob | undefined> {
    const { jobs } = this;
    const known = jobs.get(id);
    if (known) return known;
    const reading = this.read(id).then((local) => this.likeLast(id, local));
    jobs.set(id, reading);
    reading.catch(() => jobs.delete(id));
    return reading;
  }

  /** An entry this tab has just kept: nothing has to be read again for it. */
  add(entry: Entry): void {
    const known = this.jobs.get(entry.job);
    if (!known) return;
    const { jobs } = this;
    const added = known.then((local) => this.withEntry(local, entry));
    jobs.set(entry.job, added);
    added.catch(() => jobs.delete(entry.job));
  }

  /** A reading still under way when this is called serves only those who asked before. */
  forget(): void {
    this.jobs = new Map();
  }

  private withEntry(local: LocalJob | undefined, entry: Entry): LocalJob | undefined {
    // It was being read while the entry was written, and has it already.
    if (!local || local.entries.some(({ id }) => id === entry.id)) return local;
    const grown = { ...local, entries: [...local.entries, entry] };
    this.last.set(entry.job, grown);
    return grown;
  }

  private likeLast(id: string, local: LocalJob | undefined): LocalJob | undefined {
    if (!local) {
      this.last.delete(id);
      return undefined;
    }
    const like = { ...local, entries: sameEntries(this.last.get(id)?.entries, local.entries) };
    this.last.set(id, like);
    return like;
  }
}
