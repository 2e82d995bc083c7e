import { AsyncLocalStorage } from 'node:async_hooks';
import { Sequelize } from 'sequelize';

const storage = new AsyncLocalStorage<Map<string, unknown>>();

/**
 * The four methods Sequelize asks of a continuation-local namespace, over AsyncLocalStorage:
 * every query inside `Transactions.run` joins its transaction without being handed it.
 */
const namespace = {
  get: (key: string) => storage.getStore()?.get(key),
  set: (key: string, value: unknown) => {
    storage.getStore()?.set(key, value);
  },
  run: (work: (context: object) => void) => {
    const store = new Map(storage.getStore());
    storage.run(store, () => work(store));
    return store;
  },
  bind: <T>(work: T): T => work,
};

/** Call once before the first Sequelize instance is made. */
export function useAmbientTransactions(): void {
  Sequelize.useCLS(namespace);
}

/** The transaction of the running call, if any. */
export function ambientTransaction(): unknown {
  return storage.getStore()?.get('transaction');
}
