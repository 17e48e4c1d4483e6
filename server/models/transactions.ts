import { AsyncLocalStorage, AsyncResource } from 'node:async_hooks';
import { Sequelize } from 'sequelize';

type Store = Map<string, unknown>;

const storage = new AsyncLocalStorage<Store>();

/** The namespace Sequelize asks for, on Node's own AsyncLocalStorage. */
const namespace = {
  get: (key: string): unknown => storage.getStore()?.get(key),
  set: (key: string, value: unknown): void => void storage.getStore()?.set(key, value),
  run: (work: (context: Store) => unknown): void => {
    const context: Store = new Map(storage.getStore());
    storage.run(context, () => work(context));
  },
  bind: (work: () => void) => AsyncResource.bind(work),
};

/**
 * Lets every query inside `sequelize.transaction(async () => …)` join that transaction by itself,
 * so that no command has to hand the transaction from call to call and none can forget it.
 */
export const bindTransactions = (): void => {
  // Sequelize's types ask for the whole of cls-hooked; it uses these four methods only.
  (Sequelize.useCLS as (namespace: unknown) => void)(namespace);
};
