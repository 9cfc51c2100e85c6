/** Which jobs are on a screen now, counted, because one job may be on several. */
export class WatchedJobs {
  private readonly counts = new Map<string, number>();

  /** The answer lets go; letting go twice counts once. */
  watch(job: string): () => void {
    this.counts.set(job, (this.counts.get(job) ?? 0) + 1);
    let held = true;
    return () => {
      if (!held) return;
      held = false;
      const left = (this.counts.get(job) ?? 1) - 1;
      if (left === 0) this.counts.delete(job);
      else this.counts.set(job, left);
    };
  }

  list(): string[] {
    return [...this.counts.keys()];
  }
}
