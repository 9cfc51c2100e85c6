/** Brings a database to this version: our migrations, then the job queue's own schema. */
import PgBoss from 'pg-boss';
import { mailQueue, queueSchema } from '../features/mail/queue';
import { ownerDataSource } from './dataSource';

export async function migrate(databaseUrl: string): Promise<string[]> {
  const database = await ownerDataSource(databaseUrl).initialize();
  try {
    const ran = await database.runMigrations({ transaction: 'each' });
    await prepareQueue(databaseUrl);
    await database.query(`
      GRANT USAGE ON SCHEMA ${queueSchema} TO coldloop_app;
      GRANT SELECT, INSERT, UPDATE, DELETE ON ALL TABLES IN SCHEMA ${queueSchema} TO coldloop_app;
      GRANT EXECUTE ON ALL FUNCTIONS IN SCHEMA ${queueSchema} TO coldloop_app;`);
    return ran.map((migration) => migration.name);
  } finally {
    await database.destroy();
  }
}

async function prepareQueue(connectionString: string): Promise<void> {
  const boss = new PgBoss({
    connectionString,
    schema: queueSchema,
    supervise: false,
    schedule: false,
    max: 2,
  });
  await boss.start();
  try {
    await boss.createQueue(mailQueue, { name: mailQueue });
  } finally {
    await boss.stop({ graceful: false, wait: true });
  }
}
