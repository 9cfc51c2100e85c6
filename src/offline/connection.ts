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

  /**
   * One read-write transaction on disk: resolves with what `work` answers when the transaction has completed,
   * rejects with why it did not. `work` may await nothing but its own requests.
   */
  write<N extends StoreNames<S>, T>(
    stores: N[],
    work: (transaction: IDBPTransaction<S, N[], 'readwrite'>) => Promise<T>,
  ): Promise<T> {
    return this.run(async (database) => {
      const transaction = database.transaction(stores, 'readwrite', { durability: 'strict' });
      const ended = transaction.done.then(
        () => undefined,
        (error: unknown) => error,
      );
      try {
        const answer = await work(transaction);
        await transaction.done;
        return answer;
      } catch (error) {
        abort(transaction);
        await ended;
        // A full disk aborts the whole transaction: its own error says why, those of its requests do not.
        throw transaction.error ?? error;
      }
    });
  }

  async close(): Promise<void> {
    const opening = this.opening;
    this.opening = null;
    const database = await opening?.catch(() => null);
    database?.close();
  }

  private open(): Promise<IDBPDatabase<S>> {
    if (this.opening) return this.opening;
    const opening = this.request(() => {
      if (this.opening === opening) this.opening = null;
    });
    this.opening = opening;
    opening.catch(() => {
      if (this.opening === opening) this.opening = null;
    });
    return opening;
  }

  private request(lost: () => void): Promise<IDBPDatabase<S>> {
    const { name, version } = this.spec;
    const request = this.factory.open(name, version);
    request.addEventListener('upgradeneeded', ({ oldVersion }) => {
      const transaction = request.transaction;
      if (!transaction) throw new Error('an upgrade without its transaction');
      this.spec.upgrade(
        wrap(request.result) as unknown as IDBPDatabase<S>,
        oldVersion,
        wrap(transaction) as never,
      );
    });
    return new Promise((resolve, reject) => {
      let isBlocked = false;
      request.addEventListener('blocked', () => {
        isBlocked = true;
        reject(new DatabaseBlockedError(`another tab keeps "${name}" open`));
      });
      request.addEventListener('error', () => {
        reject(request.error ?? new Error(`"${name}" cannot be opened`));
      });
      request.addEventListener('success', () => {
        const database = request.result;
        database.addEventListener('close', lost);
        database.addEventListener('versionchange', () => {
          database.close();
          lost();
        });
        // Nobody waits for it any more: kept open it would block the next version in its turn.
        if (isBlocked) database.close();
        else resolve(wrap(database) as unknown as IDBPDatabase<S>);
      });
    });
  }
}

/** Ends a transaction that is still running; one that has ended stays as it ended. */
function abort(transaction: { abort(): void }): void {
  try {
    transaction.abort();
  } catch (error) {
    if (!(error instanceof Error && error.name === 'InvalidStateError')) throw error;
  }
}
