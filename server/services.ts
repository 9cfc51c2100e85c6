/** Builds everything the server is made of, by plain calls, in order of need. */
import pino, { type Logger } from 'pino';
import type { DataSource } from 'typeorm';
import type { Config } from './config';
import { appDataSource } from './database/dataSource';
import { DevicesService } from './features/devices/service';
import { EntriesService } from './features/entries/service';
import { EntryStore } from './features/entries/store';
import { JobBoards } from './features/jobs/boards';
import { JobChoices } from './features/jobs/choices';
import { Folding } from './features/jobs/folding';
import { JobsService } from './features/jobs/service';
import { JobTurns } from './features/jobs/turns';
import { bossOf, mailQueueOf, type MailQueue } from './features/mail/queue';
import { startMailWorker } from './features/mail/worker';
import { RecordBooks } from './features/records/books';
import { RecordPdfs } from './features/records/pdfStore';
import { SealingService } from './features/records/service';
import { repeatedly } from './features/records/repeatedly';
import { RecordVerifying } from './features/records/verifying';
import { RevisionsService } from './features/panels/revisions';
import { PanelsService } from './features/panels/service';
import { PeopleService } from './features/people/service';
import { sessionParts, type SessionParts } from './features/sessions/middleware';
import { SessionsService } from './features/sessions/service';
import { SitesService } from './features/sites/service';

/** What was missed when a server stopped in the wrong moment waits this long at most. */
const sealAgainMs = 5 * 60_000;

export interface Services {
  config: Config;
  log: Logger;
  database: DataSource;
  mail: MailQueue;
  people: PeopleService;
  sites: SitesService;
  sessions: SessionsService;
  session: SessionParts;
  devices: DevicesService;
  panels: PanelsService;
  revisions: RevisionsService;
  jobs: JobsService;
  boards: JobBoards;
  turns: JobTurns;
  entries: EntriesService;
  sealing: SealingService;
  records: RecordBooks;
  verifying: RecordVerifying;
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
  const devices = new DevicesService(database, mail, people);
  const panels = new PanelsService(database, people);
  const revisions = new RevisionsService(database, people);
  const store = new EntryStore();
  const folding = new Folding(store, people);
  const turns = new JobTurns(mail, people, store, folding);
  const boards = new JobBoards(database, people, folding, turns);
  const choices = new JobChoices(database, revisions, sites);
  const jobs = new JobsService({ database, mail, people, devices, choices, boards, turns });
  const notSealed = (job: string, error: unknown) =>
    log.error({ err: error, job }, 'not sealed; tried again soon');
  const sealing = new SealingService({ database, turns, people, mail, failed: notSealed });
  const sealingAgain = repeatedly(sealAgainMs, () => sealing.sealWaiting());
  const panelOf = async (pack: string) => (await folding.pack(database.manager, pack)).panel;
  const pdfs = new RecordPdfs({ database, baseUrl: config.baseUrl, panelOf });
  const records = new RecordBooks(database, pdfs);
  const verifying = new RecordVerifying(database);
  const afterEntries = (job: string) =>
    sealing.sealIfReady(job).then(
      () => undefined,
      (error: unknown) => notSealed(job, error),
    );
  const entries = new EntriesService({ database, people, devices, turns, boards, store, afterEntries });
  return {
    config,
    log,
    database,
    mail,
    people,
    sites,
    sessions,
    session,
    devices,
    panels,
    revisions,
    jobs,
    boards,
    turns,
    entries,
    sealing,
    records,
    verifying,
    start: async () => {
      await startMailWorker(boss, config, log, (record) => pdfs.of(record));
      sealingAgain.start();
    },
    close: async () => {
      await sealingAgain.stop();
      await boss.stop({ graceful: true, wait: true, timeout: 5_000 });
      await session.close();
      await database.destroy();
    },
  };
}
