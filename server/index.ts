import { existsSync } from 'node:fs';
import { resolve } from 'node:path';

import { pino } from 'pino';

import { createApp } from './app.ts';
import { PasswordHasher, productionCost } from './auth/PasswordHasher.ts';
import { productionSignInLimit } from './auth/signInLimiter.ts';
import { createGate } from './db/gate.ts';
import { openDatabase } from './db/openDatabase.ts';
import { seedDemo } from './demo/seedDemo.ts';
import { readEnvironment } from './env.ts';
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
  if (environment.demoPassword !== null) await seedDemo(context, hasher, environment.demoPassword);

  const pages = resolve('dist/client');
  const app = createApp({
    ...context,
    hasher,
    sessionSecret: environment.sessionSecret,
    overTls: environment.overTls,
    signInLimit: productionSignInLimit,
    logger,
    pagesRoot: existsSync(pages) ? pages : null,
  });
  const server = app.express.listen(environment.port, environment.host, () => {
    logger.info({ port: environment.port, host: environment.host }, 'listening');
  });
  server.on('error', (error) => {
    logger.fatal({ err: error }, 'the address can not be listened on');
    process.exit(1);
  });

  let stopping = false;
  const stop = (): void => {
    if (stopping) return;
    stopping = true;
    server.close(() => {
      void gate.close().then(() => process.exit(0));
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
