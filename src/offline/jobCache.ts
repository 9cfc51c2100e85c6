/** Jobs as they were last read, so that all screens that show one fold it once; forgotten at every change. */
import type { LocalJob } from './types';

export class JobCache {
  private jobs = new Map<string, Promise<LocalJob | undefined>>();

  constructor(private readonly read: (job: string) => Promise<LocalJob | undefined>) {}

  job(id: string): Promise<LocalJob | undefined> {
    const { jobs } = this;
    const known = jobs.get(id);
    if (known) return known;
    const reading = this.read(id);
    jobs.set(id, reading);
    reading.catch(() => jobs.delete(id));
    return reading;
  }

  /** A reading still under way when this is called serves only those who asked before. */
  forget(): void {
    this.jobs = new Map();
  }
}
