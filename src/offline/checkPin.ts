/** Checks a person's PIN; wrong ones make the next wait longer, kept on disk, and never lock out. */
import type { DeviceEnvironment } from './environment';
import type { EnrolledPerson, Outbox } from './outboxDatabase';
import { pinDelayMs, pinMatches } from './pin';
import type { PinResult } from './types';

export class PinCheck {
  /** The same waits on a clock nobody can set, for as long as this page lives. */
  private readonly notBefore = new Map<string, number>();

  constructor(
    private readonly env: DeviceEnvironment,
    private readonly outbox: Outbox,
  ) {}

  async check(person: string, pin: string): Promise<PinResult> {
    const begun = await this.begin(person);
    if (!begun) return { ok: false, waitMs: 0 };
    if (begun.waitMs > 0) return { ok: false, waitMs: begun.waitMs };
    if (await pinMatches(this.env.subtle, pin, begun.row.verifier)) {
      await this.clear(person);
      return { ok: true };
    }
    return { ok: false, waitMs: pinDelayMs(begun.row.wrong) };
  }

  /** Counts the try as wrong before it is looked at, so that neither two tabs nor a reload give free tries. */
  private async begin(person: string): Promise<{ row: EnrolledPerson; waitMs: number } | null> {
    return this.outbox.write(['people'], async (transaction) => {
      const people = transaction.objectStore('people');
      const row = await people.get(person);
      if (!row) return null;
      const waitMs = this.waitMs(row);
      if (waitMs > 0) return { row, waitMs };
      const wrong = row.wrong + 1;
      const counted = { ...row, wrong, waitUntil: this.env.now() + pinDelayMs(wrong) };
      await people.put(counted);
      this.notBefore.set(person, this.env.monotonic() + pinDelayMs(wrong));
      return { row: counted, waitMs: 0 };
    });
  }

  /** A clock set back must not make the wait longer than it was, a clock set on not shorter. */
  private waitMs({ person, wrong, waitUntil }: EnrolledPerson): number {
    const wall = Math.min(waitUntil - this.env.now(), pinDelayMs(wrong));
    const steady = (this.notBefore.get(person) ?? -Infinity) - this.env.monotonic();
    return Math.max(0, wall, steady);
  }

  private async clear(person: string): Promise<void> {
    this.notBefore.delete(person);
    await this.outbox.write(['people'], async (transaction) => {
      const people = transaction.objectStore('people');
      const row = await people.get(person);
      if (row) await people.put({ ...row, wrong: 0, waitUntil: 0 });
    });
  }
}
