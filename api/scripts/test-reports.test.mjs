import assert from 'node:assert/strict';
import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { after, before, test } from 'node:test';
import { addUp, lastLine, readReport } from './test-reports.mjs';

let folder;
before(async () => (folder = await mkdtemp(join(tmpdir(), 'brimgate-reports-'))));
after(() => rm(folder, { recursive: true }));

async function read(format, content, exitCode) {
  const file = join(folder, 'report');
  await writeFile(file, typeof content === 'string' ? content : JSON.stringify(content));
  return readReport({ format, file, exitCode });
}

const jest = (passed, failed, testResults = []) => ({
  numPassedTests: passed,
  numFailedTests: failed,
  numPendingTests: 0,
  numTodoTests: 0,
  testResults,
});

test('adds up the tests of all runners in one line', async () => {
  const results = [
    await read('jest', jest(5, 1), 1),
    await read('playwright', { stats: { expected: 2, unexpected: 1, flaky: 0, skipped: 0 }, errors: [] }, 1),
    await read('tap', '# tests 4\n# pass 3\n# fail 1\n# cancelled 0\n# skipped 0\n# todo 0\n', 1),
  ];
  // 5 + 2 + 3 passed, 1 + 1 + 1 failed
  assert.equal(lastLine(addUp(results)), '10 passed, 3 failed');
});

test('counts a test file that could not be loaded as a failure', async () => {
  const { passed, failed } = await read('jest', jest(5, 0, [{ status: 'failed', assertionResults: [] }]), 1);
  assert.deepEqual({ passed, failed }, { passed: 5, failed: 1 });
});

test('counts a browser test that passed only when repeated, and an error outside all tests, as failures', async () => {
  const stats = { expected: 2, unexpected: 0, flaky: 1, skipped: 0 };
  assert.equal((await read('playwright', { stats, errors: [{ message: 'no server' }] }, 1)).failed, 2);
});

test('takes a runner that ran nothing for a failure', async () => {
  const result = await read('jest', jest(0, 0), 0);
  assert.deepEqual({ failed: result.failed, trouble: result.trouble }, { failed: 1, trouble: 'ran no test' });
});

test('takes a bad exit code that no failed test explains for a failure, and keeps what passed', async () => {
  const { passed, failed } = await read('jest', jest(7, 0), 3);
  assert.deepEqual({ passed, failed }, { passed: 7, failed: 1 });
});

test('takes a missing, cut-off or empty report for a failure', async () => {
  assert.equal(readReport({ format: 'jest', file: join(folder, 'none'), exitCode: 0 }).failed, 1);
  assert.equal((await read('jest', '{"numPassedTests": 5', 0)).failed, 1);
  assert.equal((await read('jest', { testResults: [] }, 0)).failed, 1);
  assert.equal((await read('tap', '# tests 4\n', 0)).failed, 1);
});
