import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { isDeepStrictEqual } from 'node:util';
import { rootFolder } from './paths.mjs';

function readJson(file) {
  return JSON.parse(readFileSync(file, 'utf8'));
}

/** The lock file describes each workspace's wishes; when they differ from its package.json, npm must say so. */
function lockMatchesWorkspaces(folder, lock) {
  return ['', ...readJson(join(folder, 'package.json')).workspaces].every((workspace) => {
    const wished = readJson(join(folder, workspace, 'package.json'));
    const locked = lock.packages[workspace] ?? {};
    return ['dependencies', 'devDependencies'].every((kind) => isDeepStrictEqual(wished[kind], locked[kind]));
  });
}

/**
 * Whether node_modules is what the lock file asks for, by the record npm writes at the end of every installation
 * (node_modules/.package-lock.json). One that was cut short or left development packages out does not count.
 */
export function arePackagesInPlace(folder = rootFolder) {
  const recordFile = join(folder, 'node_modules', '.package-lock.json');
  if (!existsSync(recordFile)) return false;
  const lock = readJson(join(folder, 'package-lock.json'));
  const { packages: installed } = readJson(recordFile);
  const isInstalled = ([path, { version, integrity }]) =>
    path in installed && installed[path].version === version && installed[path].integrity === integrity;
  return (
    lockMatchesWorkspaces(folder, lock) &&
    Object.entries(lock.packages)
      // Optional packages are for other machines, and extraneous ones are entries npm itself passes over.
      .filter(([path, { optional, extraneous }]) => path.includes('node_modules/') && !optional && !extraneous)
      .every(isInstalled)
  );
}

export async function ensurePackages(processes) {
  if (arePackagesInPlace()) return { note: 'in place' };
  // Development packages hold the compilers, so NODE_ENV=production must not drop them; no package needs its script.
  const args = ['ci', '--include=dev', '--ignore-scripts'];
  const npm = process.env.npm_execpath;
  const [command, first] = npm?.endsWith('.js') ? [process.execPath, [npm]] : ['npm', []];
  await processes.run(command, [...first, ...args], { cwd: rootFolder, title: `npm ${args.join(' ')}` });
  return {
    note: arePackagesInPlace() ? 'installed' : 'installed, though npm recorded something else than the lock file',
  };
}
