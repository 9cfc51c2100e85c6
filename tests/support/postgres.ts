/** One throwaway cluster a run, with a migrated template database that each test file copies. */
import { mkdtempSync, chmodSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { TestProject } from 'vitest/node';
import { startThrowawayCluster } from '../../server/commands/cluster';
import { createDatabase } from '../../server/commands/createDatabase';
import { ensurePackages, packages } from '../../server/commands/debian';
import { migrate } from '../../server/database/migrate';

export const templateName = 'coldloop_template';

declare module 'vitest' {
  interface ProvidedContext {
    adminUrl: string;
  }
}

export default async function setup(project: TestProject): Promise<() => void> {
  ensurePackages([packages.postgresql]);
  const folder = mkdtempSync(join(tmpdir(), 'coldloop-test-'));
  chmodSync(folder, 0o755);
  const cluster = await startThrowawayCluster(folder);
  try {
    await createDatabase(cluster.url('postgres'), templateName);
    await migrate(cluster.url(templateName));
  } catch (error) {
    cluster.stop();
    throw error;
  }
  project.provide('adminUrl', cluster.url('postgres'));
  return () => cluster.stop();
}
