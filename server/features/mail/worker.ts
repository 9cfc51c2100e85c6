/** Takes mails from the queue and hands them to SMTP; a failure is retried by the queue, and given up in its log. */
import type PgBoss from 'pg-boss';
import type { Logger } from 'pino';
import { createTransport } from 'nodemailer';
import type { Config } from '../../config';
import { mailMessage } from './message';
import { mailQueue } from './queue';
import { renderMail } from './render';

/** Bytes of a file a mail carries, by record id; null when it is gone. */
export type AttachmentOf = (record: string) => Promise<Buffer | null>;

export async function startMailWorker(
  boss: PgBoss,
  config: Config,
  log: Logger,
  attachmentOf: AttachmentOf,
): Promise<void> {
  const transport = createTransport(config.smtpUrl);
  await boss.work<unknown>(mailQueue, { pollingIntervalSeconds: 1 }, async (jobs) => {
    for (const job of jobs) {
      const message = mailMessage.parse(job.data);
      const content = message.attachment ? await attachmentOf(message.attachment.record) : null;
      await transport.sendMail({
        from: config.mailFrom,
        to: message.to,
        ...renderMail(message, config.baseUrl),
        ...(message.attachment && content
          ? { attachments: [{ filename: message.attachment.name, content }] }
          : {}),
      });
      log.info({ kind: message.kind }, 'mail sent');
    }
  });
}
