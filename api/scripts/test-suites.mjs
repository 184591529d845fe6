import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import { npmProgram } from './npm-program.mjs';
import { apiFolder, rootFolder, uiFolder } from './paths.mjs';

export const JEST_WORKERS = 2;

const scriptsFolder = join(apiFolder, 'scripts');

function vitest(workspace) {
  return {
    format: 'jest',
    cwd: join(rootFolder, workspace),
    command: (reportFile) => [
      npmProgram('vitest', workspace),
      ...['run', '--reporter=default', '--reporter=json', `--outputFile.json=${reportFile}`],
    ],
  };
}

/**
 * The suites in the order they run. `command(reportFile)` is what Node.js is given; `needs` names what must stand first:
 * `database` (the test databases) or `product` (the built product, running on one of them).
 */
export const SUITES = {
  scripts: {
    format: 'tap',
    cwd: scriptsFolder,
    command: (reportFile) => [
      ...['--test', '--test-reporter=spec', '--test-reporter-destination=stdout'],
      ...['--test-reporter=tap', `--test-reporter-destination=${reportFile}`],
      ...readdirSync(scriptsFolder).filter((name) => name.endsWith('.test.mjs')),
    ],
  },
  tables: vitest('reference-tables'),
  rules: vitest('rules'),
  ui: vitest('ui'),
  api: {
    needs: 'database',
    format: 'jest',
    cwd: apiFolder,
    command: (reportFile) => [
      npmProgram('jest', 'api'),
      ...['--json', `--outputFile=${reportFile}`, `--maxWorkers=${JEST_WORKERS}`],
    ],
  },
  browser: {
    needs: 'product',
    format: 'playwright',
    cwd: uiFolder,
    command: () => [npmProgram('playwright', 'ui'), 'test', '--reporter=list,json'],
    environment: (reportFile) => ({ PLAYWRIGHT_JSON_OUTPUT_FILE: reportFile }),
  },
};

/** "api browser -- -t sulfur": suites first, the rest is handed to their runners. No suite named means all. */
export function parseArguments(words) {
  const firstOther = words.findIndex((word) => !(word in SUITES));
  const names = firstOther < 0 ? words : words.slice(0, firstOther);
  const others = firstOther < 0 ? [] : words.slice(firstOther);
  const extra = others[0] === '--' ? others.slice(1) : others;
  if (names.length === 0 && extra.length > 0 && !extra[0].startsWith('-')) {
    return { problem: `There is no suite "${extra[0]}". There are: ${Object.keys(SUITES).join(', ')}.` };
  }
  return { names: Object.keys(SUITES).filter((name) => names.length === 0 || names.includes(name)), extra };
}
