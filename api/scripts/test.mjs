// `npm test`: whatever the tests need, every suite, and one last line that adds them up.
// npm test -- api            only that suite        npm run test:api -- -t "sign-off"   the rest goes to its runner
import './node-version.mjs';
import { readdirSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { buildServer, buildUi } from './build.mjs';
import { runToTheEnd } from './ending.mjs';
import { Fault, printFailure } from './fault.mjs';
import { ensurePackages } from './packages.mjs';
import { isAlive } from './process-identity.mjs';
import { endLeftovers, Processes, readRecord } from './processes.mjs';
import { signalExitCode } from './signal-exit-code.mjs';
import { step } from './steps.mjs';
import { baseOfTemporaryFolders, shortTemporaryFolder } from './temporary-folder.mjs';
import { addUp, lastLine, readReport } from './test-reports.mjs';
import { jestEnvironment, neutralEnvironment, startProduct, startTestDatabase } from './test-servers.mjs';
import { parseArguments, SUITES } from './test-suites.mjs';

const PREFIX = 'brimgate-test-';

const folder = shortTemporaryFolder(PREFIX);
const processes = new Processes(join(folder, 'running.json'));
processes.note({});
let product;

/** Runs that were killed outright could not tidy up: end their servers and remove their folders. */
async function clearKilledRuns() {
  const base = baseOfTemporaryFolders(PREFIX);
  for (const name of readdirSync(base).filter((entry) => entry.startsWith(PREFIX))) {
    const record = readRecord(join(base, name, 'running.json'));
    if (!record?.starter || isAlive(record.starter)) continue;
    await endLeftovers(record);
    rmSync(join(base, name), { recursive: true, force: true });
  }
}

let databasePromise;
const testDatabase = () => (databasePromise ??= startTestDatabase(processes, folder));

/** Starts what a suite needs, if it was asked for, and returns the environment that tells it where. */
const prepare = {
  nothing: neutralEnvironment,
  database: async () => jestEnvironment(await testDatabase()),
  product: async () => {
    await step('Server compiled', () => buildServer(processes));
    await step('Interface bundled', () => buildUi(processes));
    product = await startProduct(processes, await testDatabase(), folder);
    return product.environment;
  },
};

async function runSuite(name, extra) {
  const { format, cwd, command, needs = 'nothing', environment } = SUITES[name];
  const reportFile = join(folder, `${name}.report`);
  console.log(`\n== ${name} ==`);
  const env = { ...(await prepare[needs]()), ...environment?.(reportFile) };
  const exitCode = await processes.show(process.execPath, [...command(reportFile), ...extra], { cwd, env });
  if (needs === 'product' && product.api.hasEnded()) console.error(`The API stopped early:\n${product.api.log()}`);
  return readReport({ format, file: reportFile, exitCode });
}

/** A suite that cannot even be started is a failure of its own; the other suites run all the same. */
async function resultOf(name, extra) {
  try {
    return { name, ...(await runSuite(name, extra)) };
  } catch (error) {
    printFailure(error);
    return { name, passed: 0, failed: 1, skipped: 0, trouble: 'could not be started' };
  }
}

function printSummary(results) {
  console.log('');
  for (const { name, passed, failed, skipped, trouble } of results) {
    const remark = [skipped > 0 && `${skipped} skipped`, trouble && `the runner ${trouble}`].filter(Boolean).join('; ');
    console.log(`${name.padEnd(8)} ${lastLine({ passed, failed })}${remark && `  (${remark})`}`);
  }
}

async function test() {
  const { names, extra, problem } = parseArguments(process.argv.slice(2));
  if (problem) throw new Fault(problem);
  await clearKilledRuns();
  await step('Packages', () => ensurePackages(processes));
  const results = [];
  for (const name of names) results.push(await resultOf(name, extra));
  printSummary(results);
  return addUp(results);
}

async function testAndCount() {
  let total = { passed: 0, failed: 1 };
  try {
    total = await test();
  } catch (error) {
    printFailure(error);
  }
  console.log(lastLine(total));
  return total.failed === 0 ? 0 : 1;
}

await runToTheEnd(testAndCount, {
  async cleanUp() {
    await processes.endAll();
    await product?.smtpFake.close();
    rmSync(folder, { recursive: true, force: true });
  },
  killNow: () => processes.killAll(),
  codeOnSignal: signalExitCode,
});
