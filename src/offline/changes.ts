/** Tells this tab's listeners and, over a channel, all other tabs that something they show has changed. */
import type { Channel } from './environment';

export class Changes {
  private readonly listeners = new Set<() => void>();

  /** @param reread runs before the listeners; when it fails they are told all the same, and meet the fault themselves */
  constructor(
    private readonly channel: Channel,
    private readonly reread: () => Promise<void>,
  ) {
    channel.listen(() => void this.refresh());
  }

  subscribe(listener: () => void): () => void {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  }

  /** Only this tab: what changed is not stored. */
  notify(): void {
    for (const listener of this.listeners) listener();
  }

  /** Something stored has changed: this tab and all others. Never throws. */
  async announce(): Promise<void> {
    this.tellOthers();
    await this.refresh();
  }

  /** This tab has taken up its own change already; others have to read it. */
  tellOthers(): void {
    this.channel.post('changed');
  }

  close(): void {
    this.channel.close();
  }

  private async refresh(): Promise<void> {
    await this.reread().catch(() => undefined);
    this.notify();
  }
}
