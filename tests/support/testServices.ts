/** The real server on a database of its own, copied from the migrated template. */
import { randomUUID } from 'node:crypto';
import { mkdtempSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Express } from 'express';
import { inject } from 'vitest';
import { createApp } from '../../server/app';
import { createDatabase, dropDatabase } from '../../server/commands/createDatabase';
import type { Config } from '../../server/config';
import { createServices, type Services } from '../../server/services';
import { templateName } from './postgres';

export interface TestServer {
  services: Services;
  app: Express;
  /** URL as the tables' owner: for looking and for trying forbidden SQL. */
  ownerUrl: string;
  close: () => Promise<void>;
}

export async function testServices(overrides: Partial<Config> = {}): Promise<TestServer> {
  const adminUrl = inject('adminUrl');
  const name = `test_${randomUUID().replaceAll('-', '')}`;
  await createDatabase(adminUrl, name, templateName);
  const ownerUrl = adminUrl.replace(/\/postgres$/, `/${name}`);
  const services = await createServices({
    production: false,
    databaseUrl: ownerUrl,
    port: 0,
    host: '127.0.0.1',
    baseUrl: 'http://localhost:4310',
    sessionSecret: randomUUID() + randomUUID(),
    smtpUrl: 'smtp://127.0.0.1:1',
    mailFrom: 'Coldloop <coldloop@localhost>',
    devMailFolder: mkdtempSync(join(tmpdir(), 'coldloop-mail-')),
    trustProxy: 0,
    logLevel: 'silent',
    ...overrides,
  });
  return {
    services,
    ownerUrl,
    app: createApp(services),
    close: async () => {
      await services.close();
      await dropDatabase(adminUrl, name);
    },
  };
}
