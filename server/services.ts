/** Builds everything the server is made of, by plain calls, in order of need. */
import pino, { type Logger } from 'pino';
import type { DataSource } from 'typeorm';
import type { Config } from './config';
import { appDataSource } from './database/dataSource';
import { bossOf, mailQueueOf, type MailQueue } from './features/mail/queue';
import { startMailWorker } from './features/mail/worker';
import { PeopleService } from './features/people/service';
import { sessionParts, type SessionParts } from './features/sessions/middleware';
import { SessionsService } from './features/sessions/service';
import { SitesService } from './features/sites/service';

export interface Services {
  config: Config;
  log: Logger;
  database: DataSource;
  mail: MailQueue;
  people: PeopleService;
  sites: SitesService;
  sessions: SessionsService;
  session: SessionParts;
  /** Begins work in the background (mails). */
  start: () => Promise<void>;
  close: () => Promise<void>;
}

export async function createServices(config: Config): Promise<Services> {
  const log = pino({ level: config.logLevel });
  const database = await appDataSource(config.databaseUrl).initialize();
  const boss = bossOf(config.databaseUrl);
  boss.on('error', (error) => log.error({ err: error }, 'mail queue'));
  await boss.start();
  const mail = mailQueueOf(boss);
  const people = new PeopleService(database, mail);
  const sites = new SitesService(database);
  const sessions = new SessionsService(database);
  const session = sessionParts(config, people);
  return {
    config,
    log,
    database,
    mail,
    people,
    sites,
    sessions,
    session,
    start: () => startMailWorker(boss, config, log, () => Promise.resolve(null)),
    close: async () => {
      await boss.stop({ graceful: true, wait: true, timeout: 5_000 });
      await session.close();
      await database.destroy();
    },
  };
}
