/** `npm run demo:reset`: empties the local database and fills the demo anew. */
import { rmSync } from 'node:fs';
import { Client } from 'pg';
import { queueSchema } from '../features/mail/queue';
import { createServices } from '../services';
import { seedOnce } from './demo/seedOnce';
import { localConfig } from './localConfig';
import { migrateLocal, openLocalDatabase } from './localDatabase';
import { claimStart, localPath } from './localFolder';

async function empty(url: string): Promise<void> {
  const client = new Client({ connectionString: url });
  await client.connect();
  try {
    await client.query(
      `DROP SCHEMA IF EXISTS ${queueSchema} CASCADE; DROP SCHEMA IF EXISTS public CASCADE; CREATE SCHEMA public`,
    );
  } finally {
    await client.end();
  }
}

/** Mails of the demo's own jobs go nowhere: nothing listens here. */
const noMailPort = 1;

const letGo = claimStart();
const database = await openLocalDatabase();
try {
  console.log('Emptying the database ...');
  await empty(database.url);
  rmSync(localPath('mail'), { recursive: true, force: true });
  await migrateLocal(database.url);
  const services = await createServices(await localConfig(database.url, noMailPort));
  await seedOnce(services);
  await services.close();
  console.log('The demo is as new. `npm start` serves it.');
} finally {
  database.stop();
  letGo();
}
process.exit(0);
