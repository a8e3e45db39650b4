import { chownSync, existsSync, mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir, userInfo } from 'node:os';
import { join } from 'node:path';
import { execFileSync } from 'node:child_process';

import { aptInstall } from './aptInstall.mjs';
import { run } from './prepare.mjs';

/** Debian's PostgreSQL programs, newest first; they are not on the path. */
function findPostgres() {
  const base = '/usr/lib/postgresql';
  if (!existsSync(base)) return null;
  const versions = readdirSync(base).sort((a, b) => Number(b) - Number(a));
  return versions.map((version) => join(base, version, 'bin')).find((path) => existsSync(join(path, 'initdb'))) ?? null;
}

function freePort() {
  return new Promise((fulfill, reject) => {
    const server = createServer();
    server.on('error', reject);
    server.listen(0, '127.0.0.1', () => {
      const { port } = server.address();
      server.close(() => fulfill(port));
    });
  });
}

/**
 * Runs work against a cluster of its own on loopback, in a temporary folder, and removes it afterwards. Answers whether it ran and,
 * if not, why. PostgreSQL refuses to run as root, so that root hands it to the user postgres.
 */
export async function withPostgres(work) {
  const bin = findPostgres() ?? ((await aptInstall(['postgresql'])) ? findPostgres() : null);
  if (bin === null) return { ran: false, reason: 'PostgreSQL is not installed and could not be installed' };
  const folder = mkdtempSync(join(tmpdir(), 'groundward-postgres-'));
  const asRoot = userInfo().uid === 0;
  const as = (program, args) =>
    asRoot
      ? run('runuser', ['-u', 'postgres', '--', join(bin, program), ...args], { quiet: true, cwd: '/' })
      : run(join(bin, program), args, { quiet: true });
  if (asRoot) {
    const uid = Number(execFileSync('id', ['-u', 'postgres'], { encoding: 'utf8' }));
    const gid = Number(execFileSync('id', ['-g', 'postgres'], { encoding: 'utf8' }));
    chownSync(folder, uid, gid);
  }
  const data = join(folder, 'data');
  const port = await freePort();
  try {
    await as('initdb', ['-D', data, '-U', 'groundward', '-A', 'trust', '-E', 'UTF8', '--no-sync']);
    await as('pg_ctl', [
      '-D',
      data,
      '-w',
      '-l',
      join(folder, 'log'),
      '-o',
      `-p ${port} -k ${folder} -c listen_addresses=127.0.0.1 -c fsync=off`,
      'start',
    ]);
    try {
      await work(`postgres://groundward@127.0.0.1:${port}/postgres`);
    } finally {
      await as('pg_ctl', ['-D', data, '-w', '-m', 'immediate', 'stop']);
    }
    return { ran: true };
  } catch (error) {
    return { ran: false, reason: error instanceof Error ? error.message : String(error) };
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}
