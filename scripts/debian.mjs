import { execFileSync, spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';

/** Whether this process may install Debian packages: it runs as root and apt-get is there. */
export function canInstallPackages() {
  return process.getuid?.() === 0 && existsSync('/usr/bin/apt-get');
}

/** Installs one package of the machine's own Debian archive, without recommendations; throws one clear sentence. */
export function installPackage(name) {
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive', LC_ALL: 'C.UTF-8' };
  const wait = ['-o', 'DPkg::Lock::Timeout=300'];
  aptGet(
    [...wait, 'update', '-qq'],
    env,
    `The list of Debian packages could not be fetched, so ${name} could not be installed`,
  );
  aptGet(
    [...wait, 'install', '-y', '-qq', '--no-install-recommends', name],
    env,
    `The Debian package ${name} could not be installed`,
  );
}

/** The absolute path of a program on PATH, or undefined. */
export function findOnPath(program) {
  const found = spawnSync('sh', ['-c', `command -v ${program}`], { encoding: 'utf8' }).stdout.trim();
  return found.startsWith('/') ? found : undefined;
}

function aptGet(args, env, refusal) {
  try {
    execFileSync('apt-get', args, { env, stdio: ['ignore', 'pipe', 'pipe'], maxBuffer: 64 * 1024 * 1024 });
  } catch (error) {
    throw new Error(`${refusal}: ${lastLine(error.stderr) || error.message}`, { cause: error });
  }
}

function lastLine(output) {
  return String(output ?? '')
    .trim()
    .split('\n')
    .at(-1);
}
