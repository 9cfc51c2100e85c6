/** The two databases of a device: what only it has, and what the server can give again. */
import { openOutbox, type Outbox } from './outboxDatabase';
import { openWork, type Work } from './workDatabase';

export interface Databases {
  outbox: Outbox;
  work: Work;
}

export const openDatabases = (factory: IDBFactory): Databases => ({
  outbox: openOutbox(factory),
  work: openWork(factory),
});
