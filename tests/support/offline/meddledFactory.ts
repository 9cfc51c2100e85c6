/** An IDBFactory whose transactions a test can make fail as real phones make them fail. */
type Meddle = (stores: string[], mode: IDBTransactionMode) => Fault | undefined;

export type Fault =
  /** The disk is full: the transaction aborts with that as its error, its requests with AbortError. */
  | 'quota'
  /** The browser killed the connection: asking for a transaction throws. */
  | 'lost'
  /** The page is killed here: nothing comes back any more, nothing more is written. */
  | 'killed';

const abortAsFull = (transaction: IDBTransaction) => {
  Object.defineProperty(transaction, 'error', { value: new DOMException('full', 'QuotaExceededError') });
  queueMicrotask(() => {
    transaction.abort();
  });
};

function meddledTransaction(database: IDBDatabase, meddle: Meddle): IDBDatabase['transaction'] {
  const real = database.transaction.bind(database);
  return (stores, mode = 'readonly', options) => {
    const fault = meddle(typeof stores === 'string' ? [stores] : [...stores], mode);
    if (fault === 'lost') {
      database.close();
      throw new DOMException('the connection is gone', 'InvalidStateError');
    }
    const transaction = real(stores, mode, options);
    if (fault === 'quota') abortAsFull(transaction);
    if (fault === 'killed') {
      transaction.abort();
      // An aborted transaction that nobody hears of is what is left of a killed page.
      transaction.addEventListener = () => undefined;
      transaction.objectStore = () => {
        throw new Error('killed');
      };
    }
    return transaction;
  };
}

/** `meddle` is asked at each transaction; undefined lets it be. */
export function meddledFactory(factory: IDBFactory, meddle: Meddle): IDBFactory {
  const open = (name: string, version?: number) => {
    const request = factory.open(name, version);
    request.addEventListener('success', () => {
      request.result.transaction = meddledTransaction(request.result, meddle);
    });
    return request;
  };
  return { open, deleteDatabase: factory.deleteDatabase.bind(factory) } as IDBFactory;
}
