import { pino } from 'pino';
import request from 'supertest';

import { createApp, type App } from '../app.ts';
import { PasswordHasher } from '../auth/PasswordHasher.ts';
import type { SignInLimit } from '../auth/signInLimiter.ts';
import { inlineRunner } from '../compute/createRunner.ts';
import type { Runner } from '../compute/Runner.ts';
import { createGate, type Gate } from '../db/gate.ts';
import { newId } from '../newId.ts';

import { openTestDatabase, type TestDatabase } from '../db/testing/openTestDatabase.ts';
import { addressOf, testPassword, testPeople, type TestKey } from './people.ts';

export type Agent = ReturnType<typeof request.agent>;

export interface TestServer {
  readonly app: App;
  readonly database: TestDatabase;
  readonly gate: Gate;
  /** signed in, sends the header that changes ask for */
  as(key: TestKey): Agent;
  /** not signed in, sends the header */
  nobody(): Agent;
  /** a new process on the same database, with nothing in memory; everybody signs in anew */
  restart(): Promise<(key: TestKey) => Agent>;
  /** on PostgreSQL another process with its own connections; null on SQLite, which has one */
  secondProcess(): Promise<((key: TestKey) => Agent) | null>;
  close(): Promise<void>;
}

export interface TestServerOptions {
  readonly signInLimit?: SignInLimit;
  readonly runner?: Runner;
  readonly overTls?: boolean;
  readonly pagesRoot?: string | null;
}

/** Argon2 at its cheapest: tests sign in often. */
const hasher = new PasswordHasher({ memoryKib: 1024, passes: 1 });
const secret = 'secret of the tests, not of any server';

async function addPeople(gate: Gate): Promise<void> {
  const passwordHash = await hasher.hash(testPassword);
  const offices = { ours: newId(), theirs: newId() };
  await gate.write(async (store) => {
    await store.people.addOffice(offices.ours, 'Our office');
    await store.people.addOffice(offices.theirs, 'Their office');
    for (const { key, role, office } of testPeople) {
      const person = { id: newId(), officeId: offices[office], email: addressOf(key), name: `The ${key}` };
      await store.people.add({ ...person, role, passwordHash });
    }
  });
}

/** The whole application on a database of its own, with everybody signed in. A long hold of the connection fails the test. */
export async function startTestServer(options: TestServerOptions = {}): Promise<TestServer> {
  const database = await openTestDatabase();
  const longHolds: string[] = [];
  const others: Gate[] = [];
  const gate = createGate(database.dataSource, {
    onLongHold: (milliseconds, kind) => longHolds.push(`${kind} ${Math.round(milliseconds)} ms`),
    // the machine of the tests is shared: the limit is that of production times four; on PostgreSQL writers of one building wait
    // for its row inside, and hold nobody else up
    longestHoldMs: database.url.startsWith('postgres') ? 10_000 : 1000,
  });
  await addPeople(gate);
  const start = async (
    through: Gate,
  ): Promise<{ app: App; nobody: () => Agent; agents: ReadonlyMap<TestKey, Agent> }> => {
    const app = createApp({
      gate: through,
      now: () => new Date().toISOString(),
      newId: () => newId(),
      hasher,
      sessionSecret: secret,
      overTls: options.overTls ?? false,
      signInLimit: options.signInLimit ?? { windowSeconds: 60, perAccount: 1000, perAddress: 1000 },
      logger: pino({ level: 'silent' }),
      runner: options.runner ?? inlineRunner(),
      resultFolder: null,
      engineBuild: 'tests',
      pagesRoot: options.pagesRoot ?? null,
    });
    const nobody = (): Agent => {
      const agent = request.agent(app.express);
      agent.set('X-Requested-With', 'groundward');
      return agent;
    };
    const agents = new Map<TestKey, Agent>();
    for (const { key } of testPeople) {
      const agent = nobody();
      await agent
        .post('/api/session')
        .send({ email: addressOf(key), password: testPassword })
        .expect(200);
      agents.set(key, agent);
    }
    return { app, nobody, agents };
  };
  const pick =
    (agents: ReadonlyMap<TestKey, Agent>) =>
    (key: TestKey): Agent => {
      const agent = agents.get(key);
      if (agent === undefined) throw new Error(`nobody is called ${key}`);
      return agent;
    };
  const { app, nobody, agents } = await start(gate);
  return {
    app,
    database,
    gate,
    nobody,
    as: pick(agents),
    restart: async () => pick((await start(gate)).agents),
    secondProcess: async () => {
      if (!database.url.startsWith('postgres')) return null;
      const other = createGate(await database.reopen(), { onLongHold: () => undefined });
      others.push(other);
      return pick((await start(other)).agents);
    },
    close: async () => {
      for (const other of others) await other.close();
      await gate.close();
      await database.drop();
      if (longHolds.length > 0) throw new Error(`the connection was held for long: ${longHolds.join(', ')}`);
    },
  };
}
