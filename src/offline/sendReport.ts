/** The send state as screens read it: the same object for as long as nothing in it changed. */
import type { Databases } from './databases';
import { nothingUnsent, readSendStatus } from './sendStatus';
import type { SendState } from './types';

export class SendReport {
  private current: SendState = nothingUnsent;
  private stored = nothingUnsent;

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

  /** Reads the stored half anew. */
  async reread(): Promise<void> {
    this.stored = { ...nothingUnsent, ...(await readSendStatus(this.databases)) };
  }
}
