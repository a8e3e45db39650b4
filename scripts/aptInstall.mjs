import { existsSync } from 'node:fs';

import { run } from './prepare.mjs';

/** Installs Debian packages as root or through sudo; answers whether it could. */
export async function aptInstall(packages) {
  if (!existsSync('/usr/bin/apt-get')) return false;
  const prefix = process.getuid?.() === 0 ? [] : ['sudo', '-n'];
  const apt = async (...args) => {
    const [command, ...rest] = [...prefix, 'apt-get', ...args];
    const { code } = await run(command, rest, {
      env: { DEBIAN_FRONTEND: 'noninteractive' },
      quiet: true,
      allowFailure: true,
    });
    return code === 0;
  };
  try {
    const install = () => apt('install', '-y', '--no-install-recommends', ...packages);
    return (await install()) || ((await apt('update')) && (await install()));
  } catch {
    return false;
  }
}
