/** The database of the local commands: the one DATABASE_URL names, else a private cluster under .local. */
import { migrate } from '../database/migrate';
import { startCluster } from './cluster';
import { createDatabase } from './createDatabase';
import { ensurePackages, packages } from './debian';
import { localPath } from './localFolder';

export interface LocalDatabase {
  url: string;
  stop: () => void;
}

export async function openLocalDatabase(): Promise<LocalDatabase> {
  const given = process.env.DATABASE_URL;
  if (given) {
    console.log('Using the PostgreSQL server of DATABASE_URL ...');
    return { url: given, stop: () => undefined };
  }
  ensurePackages([packages.postgresql]);
  console.log('Starting PostgreSQL (kept under .local/postgres) ...');
  const cluster = await startCluster(localPath('postgres'));
  await createDatabase(cluster.url('postgres'), 'coldloop');
  return { url: cluster.url('coldloop'), stop: cluster.stop };
}

/** Brings it to this version and says what it did. */
export async function migrateLocal(url: string): Promise<void> {
  const ran = await migrate(url);
  console.log(ran.length === 0 ? 'The database is up to date.' : `Migrated the database: ${ran.join(', ')}`);
}
