import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

import { checkNode, ensureBuild, ensureModules, root, serve } from './prepare.mjs';

/** `npm start`: installs, builds, migrates, seeds the invented demo into an empty database and serves on loopback. */
checkNode();
await ensureModules();
await ensureBuild();

/** A session secret of this machine's own, made at the first start and kept beside the data. */
function sessionSecret() {
  const file = join(root, 'data', 'session-secret');
  if (existsSync(file)) return readFileSync(file, 'utf8');
  mkdirSync(join(root, 'data'), { recursive: true });
  const secret = randomBytes(32).toString('hex');
  writeFileSync(file, secret, { mode: 0o600 });
  return secret;
}

const port = process.env.PORT ?? '4300';
const password = process.env.DEMO_PASSWORD ?? 'groundward-demo';
console.log(`Groundward demo: http://127.0.0.1:${port}`);
console.log('Accounts: admin@demo.example, engineer@demo.example, checker@demo.example, drafter@demo.example');
console.log(`Password: ${password}`);
await serve({
  NODE_ENV: 'production',
  DEMO: '1',
  DEMO_PASSWORD: password,
  HOST: '127.0.0.1',
  PORT: port,
  SESSION_SECRET: process.env.SESSION_SECRET ?? sessionSecret(),
});
