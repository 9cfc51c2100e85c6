/**
 * `npm run verify-records`: walks the chain of every site and names its first break.
 * Exit code 0: every chain holds; 1: one does not; 2: the database could not be read.
 */
import { appDataSource } from '../database/dataSource';
import { chainBreaks, type ChainReport } from '../features/records/chainBreaks';
import { openLocalDatabase } from './localDatabase';
import { claimStart } from './localFolder';

/** While Coldloop runs from this folder its database is in use and must not be stopped with this command. */
function claimUnlessRunning(): (() => void) | null {
  try {
    return claimStart();
  } catch {
    return null;
  }
}

const line = ({ site, records, broken }: ChainReport): string =>
  broken
    ? `${site}: BROKEN at record ${broken.number} (${broken.why}), ${records} records`
    : `${site}: holds, ${records} records`;

async function run(): Promise<number> {
  const letGo = claimUnlessRunning();
  const local = await openLocalDatabase();
  const database = await appDataSource(local.url).initialize();
  try {
    const reports = await chainBreaks(database);
    for (const report of reports) console.log(line(report));
    if (reports.length === 0) console.log('No record is sealed yet.');
    return reports.some(({ broken }) => broken !== null) ? 1 : 0;
  } finally {
    await database.destroy();
    if (letGo) {
      local.stop();
      letGo();
    }
  }
}

try {
  process.exit(await run());
} catch (error) {
  console.error(error instanceof Error ? error.message : String(error));
  process.exit(2);
}
