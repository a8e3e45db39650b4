import { afterEach, beforeEach, describe, expect, it } from 'vitest';

import { createGate, type Gate } from './gate.ts';
import type { Store } from './Store.ts';
import { openTestDatabase, type TestDatabase } from './testing/openTestDatabase.ts';

let database: TestDatabase;
let gate: Gate;
let holds: number[];
beforeEach(async () => {
  database = await openTestDatabase();
  holds = [];
  gate = createGate(database.dataSource, { onLongHold: (milliseconds) => holds.push(milliseconds), longestHoldMs: 60 });
});
afterEach(() => database.drop());

const pause = (milliseconds: number): Promise<void> =>
  new Promise((resolve) => {
    setTimeout(resolve, milliseconds);
  });
const addOffice =
  (name: string) =>
  (store: Store): Promise<void> =>
    store.people.addOffice(name, name);
const offices = (): Promise<number> => gate.read((store) => store.people.officeCount());

describe('gate', () => {
  it('keeps what others committed while a transaction that rolls back was open', async () => {
    const failing = gate.write(async (store) => {
      await addOffice('a')(store);
      await pause(20);
      throw new Error('turned back');
    });
    const others = Promise.all([gate.write(addOffice('b')), gate.write(addOffice('c'))]);
    await expect(failing).rejects.toThrow('turned back');
    await others;
    expect(await offices()).toBe(2);
  });

  it('shows no row of an open transaction to a read', async () => {
    const open = gate.write(async (store) => {
      await addOffice('a')(store);
      await pause(20);
      throw new Error('turned back');
    });
    const seen = offices();
    await expect(open).rejects.toThrow('turned back');
    expect(await seen).toBe(0);
  });

  it('lets a nested call join the open transaction, and turns both back together', async () => {
    const outer = gate.write(async (store) => {
      await addOffice('a')(store);
      await gate.write(addOffice('b'));
      expect(await gate.read((inner) => inner.people.officeCount())).toBe(2);
      throw new Error('turned back');
    });
    await expect(outer).rejects.toThrow('turned back');
    expect(await offices()).toBe(0);
  });

  it('refuses a write inside a read', async () => {
    await expect(gate.read(() => gate.write(addOffice('a')))).rejects.toThrow('may not start inside a read');
  });

  it('reports a hold that is too long, unless it was announced', async () => {
    await gate.write(() => pause(80), { long: true });
    expect(holds).toHaveLength(0);
    await gate.write(() => pause(80));
    expect(holds).toHaveLength(1);
  });

  it('commits fully: the live connection says so', async () => {
    const ready = await gate.readiness();
    expect(ready.ok).toBe(true);
    expect(ready.migrations).toBe('current');
    if (ready.database === 'sqlite') {
      expect(ready.synchronous).toBe('full');
      expect(await database.dataSource.query('PRAGMA synchronous')).toEqual([{ synchronous: 2 }]);
      expect(await database.dataSource.query('PRAGMA journal_mode')).toEqual([{ journal_mode: 'wal' }]);
      expect(await database.dataSource.query('PRAGMA foreign_keys')).toEqual([{ foreign_keys: 1 }]);
      expect(await database.dataSource.query('PRAGMA busy_timeout')).toEqual([{ timeout: 5000 }]);
    } else {
      expect(ready.synchronous).toBe('on');
    }
  });
});
