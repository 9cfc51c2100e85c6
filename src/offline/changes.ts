/** Tells this tab's listeners and, over a channel, all other tabs that something they show has changed. */
import type { Channel } from './environment';

export class Changes {
  private readonly listeners = new Set<() => void>();

  /** @param reread runs before the listeners when another tab changed something */
  constructor(
    private readonly channel: Channel,
    private readonly reread: () => Promise<void>,
  ) {
    channel.listen(() => {
      void this.reread().then(() => {
        this.notify();
      });
    });
  }

  subscribe(listener: () => void): () => void {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  }

  /** Only this tab: what changed is not stored. */
  notify(): void {
    for (const listener of this.listeners) listener();
  }

  /** Something stored has changed: this tab and all others. */
  async announce(): Promise<void> {
    await this.reread();
    this.notify();
    this.channel.post('changed');
  }
}
