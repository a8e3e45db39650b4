import { spawn } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, readdirSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { dirname, join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';

/** What start, serve and test share: installing packages and building only when something they depend on has changed. */
export const root = resolve(dirname(fileURLToPath(import.meta.url)), '..');
const modulesStamp = join(root, 'node_modules', '.stamps', 'modules');
const buildStamp = join(root, 'dist', '.stamp');

/** Runs a program to its end with its output shown. Signals are passed on, so that no orphan is left behind. */
export function run(command, args, { env = {}, quiet = false, allowFailure = false, cwd = root } = {}) {
  return new Promise((fulfill, reject) => {
    const child = spawn(command, args, {
      cwd,
      env: { ...process.env, ...env },
      stdio: quiet ? ['ignore', 'pipe', 'pipe'] : 'inherit',
    });
    let output = '';
    child.stdout?.on('data', (chunk) => (output += chunk));
    child.stderr?.on('data', (chunk) => (output += chunk));
    const forward = (signal) => child.kill(signal);
    process.on('SIGINT', forward).on('SIGTERM', forward);
    child.on('error', reject);
    child.on('close', (code) => {
      process.off('SIGINT', forward).off('SIGTERM', forward);
      if (code === 0 || allowFailure) fulfill({ code, output });
      else reject(new Error(`${command} ${args.join(' ')} ended with ${code}\n${output}`));
    });
  });
}

/** Prints how long a step took. */
export async function timed(name, work) {
  const start = Date.now();
  const result = await work();
  console.log(`${name}: ${((Date.now() - start) / 1000).toFixed(1)} s`);
  return result;
}

export function checkNode() {
  const [major] = process.versions.node.split('.').map(Number);
  if (major !== 20) {
    console.error(`Groundward runs on Node 20; this is Node ${process.versions.node}.`);
    process.exit(1);
  }
}

function hashOf(files, extra = '') {
  const hash = createHash('sha256').update(extra);
  for (const file of files) hash.update(file.slice(root.length)).update(readFileSync(file));
  return hash.digest('hex');
}

function filesUnder(path) {
  if (!existsSync(path)) return [];
  if (statSync(path).isFile()) return [path];
  return readdirSync(path, { withFileTypes: true })
    .sort((a, b) => (a.name < b.name ? -1 : 1))
    .flatMap((entry) => filesUnder(join(path, entry.name)));
}

const readStamp = (file) => (existsSync(file) ? readFileSync(file, 'utf8') : '');
const writeStamp = (file, value) => {
  mkdirSync(dirname(file), { recursive: true });
  writeFileSync(file, value);
};

/** Node's own headers beside the running Node, so that native packages compile without a download. */
function nodeHeaders() {
  const base = resolve(dirname(process.execPath), '..');
  return existsSync(join(base, 'include', 'node', 'node.h')) ? { npm_config_nodedir: base } : {};
}

export async function ensureModules() {
  const wanted = hashOf(
    [join(root, 'package.json'), join(root, 'package-lock.json')],
    `${process.versions.modules} ${process.platform} ${process.arch}`,
  );
  if (readStamp(modulesStamp) === wanted) return;
  await timed('install packages', () =>
    run('npm', ['ci', '--include=dev', '--no-audit', '--no-fund'], {
      env: { NODE_ENV: '', PLAYWRIGHT_SKIP_BROWSER_DOWNLOAD: '1', ...nodeHeaders() },
    }),
  );
  writeStamp(modulesStamp, wanted);
}

export async function ensureBuild() {
  const sources = [
    'client',
    'server',
    'shared',
    'package.json',
    'package-lock.json',
    'vite.config.ts',
    'tailwind.config.ts',
    'tsconfig.json',
  ];
  const wanted = hashOf(sources.flatMap((path) => filesUnder(join(root, path))));
  if (readStamp(buildStamp) === wanted) return;
  rmSync(buildStamp, { force: true });
  const vite = join(root, 'node_modules', 'vite', 'bin', 'vite.js');
  await timed('build client', () => run(process.execPath, [vite, 'build', '--logLevel', 'warn']));
  await timed('build server', () => run(process.execPath, [vite, 'build', '--ssr', '--logLevel', 'warn']));
  writeStamp(buildStamp, wanted);
}

/** Replaces this process by the server as far as signals and the exit code go. */
export async function serve(env) {
  const { code } = await run(process.execPath, ['--enable-source-maps', join(root, 'dist', 'server', 'index.js')], {
    env,
    allowFailure: true,
  });
  process.exit(code ?? 0);
}
