/** The real server with the built client on a port of its own, for a real browser. */
import { randomUUID } from 'node:crypto';
import { mkdtempSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { inject } from 'vitest';
import { freePort } from '../../../server/commands/cluster';
import { createDatabase, dropDatabase } from '../../../server/commands/createDatabase';
import { startMailFake } from '../../../server/features/mail/devMail';
import { serve } from '../../../server/serve';
import type { Services } from '../../../server/services';
import { templateName } from '../postgres';

export interface LiveServer {
  url: string;
  readonly services: Services;
  mailFolder: string;
  /** Stops answering, as a server that is being restarted does; what it returns starts it again on the same database. */
  stop: () => Promise<() => Promise<void>>;
  close: () => Promise<void>;
}

export async function liveServer(): Promise<LiveServer> {
  const adminUrl = inject('adminUrl');
  const name = `test_${randomUUID().replaceAll('-', '')}`;
  await createDatabase(adminUrl, name, templateName);
  const mailFolder = mkdtempSync(join(tmpdir(), 'coldloop-mail-'));
  const mail = await startMailFake(mailFolder);
  const port = await freePort();
  const url = `http://localhost:${port}`;
  const config = {
    production: false,
    databaseUrl: adminUrl.replace(/\/postgres$/, `/${name}`),
    port,
    host: '127.0.0.1',
    baseUrl: url,
    sessionSecret: randomUUID() + randomUUID(),
    smtpUrl: `smtp://127.0.0.1:${mail.port}`,
    mailFrom: 'Coldloop <coldloop@localhost>',
    devMailFolder: mailFolder,
    trustProxy: 0,
    logLevel: 'silent' as const,
  };
  let serving = await serve(config);
  return {
    url,
    get services() {
      return serving.services;
    },
    mailFolder,
    stop: async () => {
      await serving.close();
      return async () => {
        serving = await serve(config);
      };
    },
    close: async () => {
      await serving.close();
      await mail.close();
      await dropDatabase(adminUrl, name);
    },
  };
}
