/** The queue that mails wait in: pg-boss on our own database, written in the same transaction as its cause. */
import PgBoss from 'pg-boss';
import type { EntityManager } from 'typeorm';
import type { MailMessage } from './message';

export const queueSchema = 'mail_queue';
export const mailQueue = 'mail';

// Fourteen tries with growing pauses reach over a weekend's outage of the mail server.
const retry = { retryLimit: 14, retryDelay: 20, retryBackoff: true };

export interface MailQueue {
  /** Queues a mail; it exists only if the transaction commits. */
  queue(tx: EntityManager, message: MailMessage): Promise<void>;
}

export const bossOf = (connectionString: string): PgBoss =>
  new PgBoss({
    connectionString,
    schema: queueSchema,
    migrate: false,
    schedule: false,
    max: 4,
    options: '-c role=coldloop_app',
  } as PgBoss.ConstructorOptions);

export const mailQueueOf = (boss: PgBoss): MailQueue => ({
  async queue(tx, message) {
    await boss.send(mailQueue, message, {
      ...retry,
      db: { executeSql: async (text, values) => ({ rows: await tx.query<unknown[]>(text, values) }) },
    });
  },
});
