import { AsyncLocalStorage } from 'node:async_hooks';

import type { DataSource, EntityManager } from 'typeorm';

import { readiness, type Readiness } from './readiness.ts';
import { Store } from './Store.ts';

export interface WriteOptions {
  /** table replacement: the one deed that may hold the connection for long */
  readonly long?: boolean;
}

export interface Gate {
  /** Reads that belong together see one state. Nothing but SQL may be awaited inside. */
  read<T>(work: (store: Store) => Promise<T>): Promise<T>;
  /** One transaction. A nested call joins the open one. Nothing but SQL may be awaited inside. */
  write<T>(work: (store: Store) => Promise<T>, options?: WriteOptions): Promise<T>;
  readiness(): Promise<Readiness>;
  close(): Promise<void>;
}

export interface GateOptions {
  /** a hold longer than `longestHoldMs`; tests throw here */
  readonly onLongHold: (milliseconds: number, kind: 'read' | 'write') => void;
  readonly longestHoldMs?: number;
}

interface Open {
  readonly store: Store;
  readonly kind: 'read' | 'write';
}

const serializationFailures = new Set(['40001', '40P01']);

function isSerializationFailure(error: unknown): boolean {
  if (typeof error !== 'object' || error === null || !('driverError' in error)) return false;
  const { driverError } = error;
  if (typeof driverError !== 'object' || driverError === null || !('code' in driverError)) return false;
  return typeof driverError.code === 'string' && serializationFailures.has(driverError.code);
}

/**
 * The one way to the database. SQLite has one connection: an open transaction's rows are visible to every other statement on it,
 * and a rollback takes other people's writes along; so reads and writes wait in one queue. On PostgreSQL a read is a
 * repeatable-read transaction and a write a plain one, tried once more where the engine could not put it in order.
 */
export function createGate(dataSource: DataSource, options: GateOptions): Gate {
  const current = new AsyncLocalStorage<Open>();
  const postgres = dataSource.options.type === 'postgres';
  const longestHoldMs = options.longestHoldMs ?? 250;
  let queue: Promise<unknown> = Promise.resolve();

  const inTurn = <T>(deed: () => Promise<T>): Promise<T> => {
    if (postgres) return deed();
    const next = queue.then(deed, deed);
    queue = next.catch(() => undefined);
    return next;
  };

  const timed = async <T>(kind: 'read' | 'write', long: boolean, deed: () => Promise<T>): Promise<T> => {
    const start = performance.now();
    const done = await deed();
    const held = performance.now() - start;
    if (held > longestHoldMs && !long) options.onLongHold(held, kind);
    return done;
  };

  const gate: Gate = {
    read<T>(work: (store: Store) => Promise<T>): Promise<T> {
      const open = current.getStore();
      if (open !== undefined) return work(open.store);
      const reading = (manager: EntityManager): Promise<T> => {
        const store = new Store(manager);
        return timed('read', false, () => current.run({ store, kind: 'read' }, () => work(store)));
      };
      return inTurn(() =>
        postgres ? dataSource.transaction('REPEATABLE READ', reading) : reading(dataSource.manager),
      );
    },
    async write(work, { long = false } = {}) {
      const open = current.getStore();
      if (open !== undefined) {
        if (open.kind === 'read') throw new Error('a write may not start inside a read');
        return work(open.store);
      }
      const once = () =>
        inTurn(() =>
          dataSource.transaction((manager) => {
            const store = new Store(manager);
            return timed('write', long, () => current.run({ store, kind: 'write' }, () => work(store)));
          }),
        );
      try {
        return await once();
      } catch (error) {
        if (!postgres || !isSerializationFailure(error)) throw error;
        return once();
      }
    },
    readiness: () => inTurn(() => readiness(dataSource)),
    async close() {
      await inTurn(() => dataSource.destroy());
    },
  };
  return gate;
}
