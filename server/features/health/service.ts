/** Whether this server can do its work now. */
import type { DataSource } from 'typeorm';

export const readiness = (database: DataSource) => (): Promise<boolean> =>
  database.query('SELECT 1').then(
    () => true,
    () => false,
  );
