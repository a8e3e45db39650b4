import { existsSync } from 'node:fs';
import { join, resolve } from 'node:path';

import { pino } from 'pino';

import { createApp } from './app.ts';
import { PasswordHasher, productionCost } from './auth/PasswordHasher.ts';
import { productionSignInLimit } from './auth/signInLimiter.ts';
import { buildHash } from './compute/buildHash.ts';
import { inlineRunner, pooledRunner } from './compute/createRunner.ts';
import { createGate } from './db/gate.ts';
import { openDatabase } from './db/openDatabase.ts';
import { seedDemo } from './demo/seedDemo.ts';
import { seedDemoBuilding } from './demo/seedDemoBuilding.ts';
import { readEnvironment } from './env.ts';
import { errorForLog } from './http/errorForLog.ts';
import { newId } from './newId.ts';

/** Opens, migrates, seeds where asked, listens; stops gracefully. */
async function start(): Promise<void> {
  const environment = readEnvironment(process.env);
  const logger = pino({ level: environment.logLevel });
  const dataSource = await openDatabase(environment.databaseUrl);
  await dataSource.runMigrations();
  const gate = createGate(dataSource, {
    onLongHold: (milliseconds, kind) => logger.warn({ milliseconds: Math.round(milliseconds), kind }, 'long hold'),
  });
  const context = { gate, now: () => new Date().toISOString(), newId: () => newId() };
  const hasher = new PasswordHasher(productionCost);
  const threads = join(import.meta.dirname, 'worker.js');
  const built = existsSync(threads);
  const runner = built ? pooledRunner(threads) : inlineRunner();
  const pages = resolve('dist/client');
  const app = createApp({
    ...context,
    hasher,
    sessionSecret: environment.sessionSecret,
    overTls: environment.overTls,
    signInLimit: productionSignInLimit,
    logger,
    pagesRoot: existsSync(pages) ? pages : null,
    runner,
    // from its sources the engine changes under the cache, so nothing outlives the process
    resultFolder: built ? resolve('data/cache') : null,
    engineBuild: built ? buildHash(import.meta.dirname) : 'sources',
  });
  if (environment.demoPassword !== null) {
    const engineerId = await seedDemo(context, hasher, environment.demoPassword);
    if (engineerId !== null) {
      await seedDemoBuilding(context, app.services.buildings, engineerId, resolve('fixtures/buildings/demo'), logger);
    }
  }
  const server = app.express.listen(environment.port, environment.host, (error?: Error) => {
    // told of by the event below
    if (error !== undefined) return;
    const address = server.address();
    const port = typeof address === 'object' && address !== null ? address.port : environment.port;
    logger.info({ port, host: environment.host }, 'listening');
  });
  server.on('error', (error) => {
    logger.fatal({ err: errorForLog(error) }, 'the address can not be listened on');
    process.exit(1);
  });

  let stopping = false;
  const stop = (): void => {
    if (stopping) return;
    stopping = true;
    server.close(() => {
      void Promise.all([gate.close(), runner.close()]).then(() => process.exit(0));
    });
    server.closeIdleConnections();
    setTimeout(() => process.exit(1), 10_000).unref();
  };
  process.on('SIGTERM', stop);
  process.on('SIGINT', stop);
}

start().catch((error: unknown) => {
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
  process.exit(1);
});
