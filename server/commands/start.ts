/** `npm start`: everything a person needs to use Coldloop on this machine, and Ctrl-C to end it. */
import { startMailFake } from '../features/mail/devMail';
import { serve } from '../serve';
import { untilStopped } from '../untilStopped';
import { buildClient } from './clientBuild';
import { seedOnce } from './demo/seedOnce';
import { printSignIns } from './demo/signIns';
import { localConfig } from './localConfig';
import { migrateLocal, openLocalDatabase } from './localDatabase';
import { claimStart, localPath } from './localFolder';

type Stop = () => unknown;

async function start(stops: Stop[]): Promise<void> {
  stops.unshift(claimStart());
  const stopped = untilStopped();
  const database = await openLocalDatabase();
  stops.unshift(database.stop);
  await migrateLocal(database.url);
  buildClient();
  const mail = await startMailFake(localPath('mail'));
  stops.unshift(mail.close);
  const config = await localConfig(database.url, mail.port);
  const serving = await serve(config);
  stops.unshift(serving.close);
  await seedOnce(serving.services);
  console.log(`\nColdloop: http://localhost:${serving.port}`);
  console.log(`Mails:    http://localhost:${serving.port}/dev/mail`);
  printSignIns();
  console.log('Ctrl-C stops everything; the data stays.');
  await stopped;
  console.log('\nStopping ...');
}

/** Newest first, each given its chance: the database stops last. */
async function stopAll(stops: Stop[]): Promise<void> {
  for (const stop of stops)
    try {
      await stop();
    } catch (error) {
      console.error(error instanceof Error ? error.message : error);
    }
}

const stops: Stop[] = [];
let code = 0;
try {
  await start(stops);
} catch (error) {
  console.error(error instanceof Error ? error.message : error);
  code = 1;
}
await stopAll(stops);
process.exit(code);
