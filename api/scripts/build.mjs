import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join, relative } from 'node:path';
import { npmProgram } from './npm-program.mjs';
import { rootFolder, uiFolder, uiOutputFolder } from './paths.mjs';

const SERVER_PACKAGES = ['reference-tables', 'rules', 'api'];
const UI_SOURCES = ['ui', 'rules', 'reference-tables', 'package-lock.json', 'tsconfig.base.json'];
const NOT_SOURCES = new Set([
  'node_modules',
  'dist',
  '.data',
  'coverage',
  'e2e',
  'test',
  'test-results',
  'playwright-report',
]);

function filesBelow(path, isLeftOut = () => false) {
  if (!existsSync(path)) return [];
  return readdirSync(path, { withFileTypes: true })
    .filter(({ name }) => !isLeftOut(name))
    .flatMap((entry) => {
      const inside = join(path, entry.name);
      return entry.isDirectory() ? filesBelow(inside, isLeftOut) : [inside];
    })
    .sort();
}

/** The compiler never removes the output of a source that is gone, and a deleted migration must not run again. */
function removeOrphanedOutput() {
  for (const name of SERVER_PACKAGES) {
    const folder = join(rootFolder, name);
    const output = join(folder, 'dist', 'src');
    for (const file of filesBelow(output)) {
      const source = join(folder, 'src', relative(output, file)).replace(/(\.d)?\.(js|ts)(\.map)?$/, '.ts');
      if (/\.(js|d\.ts)(\.map)?$/.test(file) && !existsSync(source)) rmSync(file);
    }
  }
}

/** Compiles what the server runs. The compiler itself knows what is up to date, so it is always asked. */
export async function buildServer(processes) {
  await processes.run(process.execPath, [npmProgram('tsc'), '-b'], { cwd: rootFolder, title: 'tsc -b' });
  removeOrphanedOutput();
  return {};
}

function uiSourcesHash() {
  const hash = createHash('sha256');
  for (const source of UI_SOURCES) {
    const path = join(rootFolder, source);
    const files = /\.json$/.test(source) ? [path] : filesBelow(path, (name) => NOT_SOURCES.has(name));
    for (const file of files)
      hash.update(relative(rootFolder, file)).update('\0').update(readFileSync(file)).update('\0');
  }
  return hash.digest('hex');
}

/** Bundles the interface when its sources changed. The stamp lies in the bundle's folder, which every bundling empties. */
export async function buildUi(processes) {
  const stampFile = join(uiOutputFolder, '.built-from');
  const hash = uiSourcesHash();
  if (existsSync(stampFile) && readFileSync(stampFile, 'utf8') === hash) return { note: 'unchanged' };
  await processes.run(process.execPath, [npmProgram('vite', 'ui'), 'build'], { cwd: uiFolder, title: 'vite build' });
  writeFileSync(stampFile, hash);
  return {};
}
