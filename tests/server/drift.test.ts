import { Client } from 'pg';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ownerDataSource } from '../../server/database/dataSource';
import { testServices, type TestServer } from '../support/testServices';

let server: TestServer;
beforeAll(async () => {
  server = await testServices();
});
afterAll(() => server.close());

// Keys, checks and indexes are written by hand in the migrations alone: the entities do not repeat them.
const handWritten =
  /^(DROP INDEX|CREATE (UNIQUE )?INDEX|ALTER TABLE "\w+" (DROP|ADD) CONSTRAINT "[^"]+"( (UNIQUE|FOREIGN KEY|CHECK) .*)?$)/;

/** What would have to be done to the tables so that they are what the entities say. */
async function drift(): Promise<string[]> {
  const database = await ownerDataSource(server.ownerUrl).initialize();
  try {
    const log = await database.driver.createSchemaBuilder().log();
    return log.upQueries.map(({ query }) => query).filter((statement) => !handWritten.test(statement));
  } finally {
    await database.destroy();
  }
}

async function asOwner(sql: string): Promise<void> {
  const client = new Client({ connectionString: server.ownerUrl });
  await client.connect();
  await client.query(sql).finally(() => client.end());
}

describe('the migrated database', () => {
  it('has the tables and columns that the entities name, with their types, nullability and defaults', async () => {
    expect(await drift()).toEqual([]);
  });

  it.each([
    ['a column that no entity names', 'ALTER TABLE job ADD COLUMN stray text', 'stray'],
    ['a column of another type', 'ALTER TABLE device ALTER COLUMN name TYPE varchar(5)', '"name"'],
    ['a column that may be empty', 'ALTER TABLE pack ALTER COLUMN made_at DROP NOT NULL', 'made_at'],
  ])('would be seen to have %s', async (_name, change, named) => {
    await asOwner(change);
    expect((await drift()).join('\n')).toContain(named);
  });

  it('is worked by a role that owns no table', async () => {
    const rows = await server.services.database.query<{ me: string; owned: number }[]>(
      `SELECT current_user AS me, (SELECT count(*)::int FROM pg_class WHERE relowner = 'coldloop_app'::regrole) AS owned`,
    );
    expect(rows).toEqual([{ me: 'coldloop_app', owned: 0 }]);
  });
});
