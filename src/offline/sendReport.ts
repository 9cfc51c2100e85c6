/** The send state as screens read it: the same object for as long as nothing in it changed. */
import type { Entry } from '../../shared/job/entry';
import type { Databases } from './databases';
import { nothingUnsent, readSendStatus } from './sendStatus';
import type { SendState } from './types';

export class SendReport {
  private current: SendState = nothingUnsent;
  private stored = nothingUnsent;
  private added = 0;

  constructor(
    private readonly databases: Databases,
    private readonly sender: () => Pick<SendState, 'state' | 'lastError'>,
  ) {}

  state(): SendState {
    const { state, lastError } = this.sender();
    const next = { ...this.stored, state, lastError };
    if (JSON.stringify(next) !== JSON.stringify(this.current)) this.current = next;
    return this.current;
  }

  /** Counts an entry this tab has just kept, without reading; a reading under way is made again. */
  add({ at }: Entry): void {
    this.added += 1;
    const { unsent, oldestUnsentAt } = this.stored;
    this.stored = { ...this.stored, unsent: unsent + 1, oldestUnsentAt: oldestUnsentAt ?? at };
  }

  /** Reads the stored half anew. */
  async reread(): Promise<void> {
    const before = this.added;
    const read = await readSendStatus(this.databases);
    if (before !== this.added) return this.reread();
    this.stored = { ...nothingUnsent, ...read };
  }
}
