/** One IndexedDB connection a tab and database: opened when needed, dropped when lost, then reopened once. */
import { wrap, type DBSchema, type IDBPDatabase, type IDBPTransaction, type StoreNames } from 'idb';

export interface DatabaseSpec<S extends DBSchema> {
  name: string;
  version: number;
  upgrade(
    database: IDBPDatabase<S>,
    oldVersion: number,
    transaction: IDBPTransaction<S, StoreNames<S>[], 'versionchange'>,
  ): void;
}

/** Another tab keeps an older version of the database open. */
export class DatabaseBlockedError extends Error {}

// InvalidStateError: the connection was closed under us. UnknownError: what WebKit says after it killed its
// database process in the background. AbortError with no cause of ours: the same, seen by a running transaction.
const lostNames = new Set(['InvalidStateError', 'UnknownError', 'AbortError']);
const isLost = (error: unknown): boolean => error instanceof Error && lostNames.has(error.name);

export class Connection<S extends DBSchema> {
  private opening: Promise<IDBPDatabase<S>> | null = null;

  constructor(
    private readonly factory: IDBFactory,
    private readonly spec: DatabaseSpec<S>,
  ) {}

  /** Runs `work` on the database; on a lost connection once more on a new one. `work` must bear being repeated. */
  async run<T>(work: (database: IDBPDatabase<S>) => Promise<T>): Promise<T> {
    try {
      return await work(await this.open());
    } catch (error) {
      if (!isLost(error)) throw error;
      await this.close();
      return work(await this.open());
    }
  }

  async close(): Promise<void> {
    const opening = this.opening;
    this.opening = null;
    const database = await opening?.catch(() => null);
    database?.close();
  }

  private open(): Promise<IDBPDatabase<S>> {
    this.opening ??= this.request().catch((error: unknown) => {
      this.opening = null;
      throw error;
    });
    return this.opening;
  }

  private request(): Promise<IDBPDatabase<S>> {
    const { name, version, upgrade } = this.spec;
    const request = this.factory.open(name, version);
    request.addEventListener('upgradeneeded', ({ oldVersion }) => {
      const transaction = request.transaction;
      if (!transaction) throw new Error('an upgrade without its transaction');
      upgrade(wrap(request.result) as unknown as IDBPDatabase<S>, oldVersion, wrap(transaction) as never);
    });
    const blocked = new Promise<never>((_, reject) => {
      request.addEventListener('blocked', () => {
        reject(new DatabaseBlockedError(`another tab keeps "${name}" open`));
      });
    });
    const opened = wrap(request).then((database) => {
      const drop = () => {
        this.opening = null;
      };
      database.addEventListener('close', drop);
      database.addEventListener('versionchange', () => {
        database.close();
        drop();
      });
      return database as unknown as IDBPDatabase<S>;
    });
    return Promise.race([opened, blocked]);
  }
}
