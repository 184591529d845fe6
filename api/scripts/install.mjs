// Installs the npm packages when they are not in place: the first step of .ci/run, before anything can be checked.
import './node-version.mjs';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { runToTheEnd } from './ending.mjs';
import { ensurePackages } from './packages.mjs';
import { Processes } from './processes.mjs';
import { signalExitCode } from './signal-exit-code.mjs';
import { step } from './steps.mjs';

const folder = mkdtempSync(join(tmpdir(), 'brimgate-install-'));
const processes = new Processes(join(folder, 'running.json'));

await runToTheEnd(
  async () => {
    await step('Packages', () => ensurePackages(processes));
    return 0;
  },
  {
    cleanUp: async () => {
      await processes.endAll();
      rmSync(folder, { recursive: true });
    },
    killNow: () => processes.killAll(),
    codeOnSignal: signalExitCode,
  },
);
