/** Makes a database where it does not exist yet. */
import { Client } from 'pg';

export async function createDatabase(adminUrl: string, name: string, template?: string): Promise<boolean> {
  const client = new Client({ connectionString: adminUrl });
  await client.connect();
  try {
    const found = await client.query('SELECT 1 FROM pg_database WHERE datname = $1', [name]);
    if (found.rowCount !== 0) return false;
    const quoted = client.escapeIdentifier(name);
    await client.query(
      `CREATE DATABASE ${quoted}${template ? ` TEMPLATE ${client.escapeIdentifier(template)}` : ''}`,
    );
    return true;
  } finally {
    await client.end();
  }
}

export async function dropDatabase(adminUrl: string, name: string): Promise<void> {
  const client = new Client({ connectionString: adminUrl });
  await client.connect();
  try {
    await client.query(`DROP DATABASE IF EXISTS ${client.escapeIdentifier(name)} WITH (FORCE)`);
  } finally {
    await client.end();
  }
}
