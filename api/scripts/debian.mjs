import { accessSync, constants, existsSync } from 'node:fs';
import { join } from 'node:path';
import { Fault } from './fault.mjs';

// An ordinary user's PATH on Debian leaves out the folder where servers are installed.
const SERVER_FOLDERS = ['/usr/sbin', '/usr/local/sbin'];

export function findProgram(name, path = process.env.PATH ?? '') {
  for (const folder of [...path.split(':').filter(Boolean), ...SERVER_FOLDERS]) {
    const file = join(folder, name);
    try {
      accessSync(file, constants.X_OK);
      return file;
    } catch {
      // not here
    }
  }
  return undefined;
}

/**
 * Finds the programs, installing Debian packages when one is missing: as root by itself, otherwise it stops and names
 * the one command. Returns { paths, wasInstalled }.
 */
export async function ensurePrograms(
  processes,
  programs,
  packages,
  { isRoot = process.getuid() === 0, find = findProgram } = {},
) {
  const missing = programs.filter((name) => !find(name));
  if (missing.length > 0) await installPackages(processes, missing, packages, isRoot);
  const stillMissing = programs.filter((name) => !find(name));
  if (stillMissing.length > 0) {
    throw new Fault(`After installing ${packages.join(' and ')} there is still no ${stillMissing.join(', ')}.`);
  }
  return { paths: programs.map((name) => find(name)), wasInstalled: missing.length > 0 };
}

async function installPackages(processes, missing, packages, isRoot) {
  if (!existsSync('/usr/bin/apt-get')) {
    throw new Fault(
      `${missing.join(', ')} not found. Install ${packages.join(' and ')} (Debian's names) and run this again.`,
    );
  }
  if (!isRoot) {
    const install = `apt-get install --yes --no-install-recommends ${packages.join(' ')}`;
    throw new Fault(
      `${missing.join(', ')} not found, and only root may install it. Run this once, then start again:\n\n` +
        `  sudo sh -c 'apt-get update && ${install}'`,
    );
  }
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  // Another apt may be at work on a fresh machine: wait for its lock instead of failing.
  const patience = ['-o', 'DPkg::Lock::Timeout=300'];
  const install = ['install', '--yes', '--no-install-recommends', ...patience, ...packages];
  await processes.run('apt-get', ['update', ...patience], { env, title: 'apt-get update' });
  await processes.run('apt-get', install, { env, title: `apt-get install ${packages.join(' ')}` });
}
