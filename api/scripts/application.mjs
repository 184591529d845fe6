import { join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import { Fault } from './fault.mjs';
import { apiFolder, uiOutputFolder } from './paths.mjs';
import { ownerEnvironment } from './settings.mjs';

const POLL_MS = 50;
const SECONDS_TO_READY = 60;
const SECONDS_TO_STOP = 15; // it finishes the requests it has begun, for at most ten

function program(...path) {
  return join(apiFolder, 'dist', 'src', ...path);
}

export function migrate(processes, environment, database) {
  return processes.run(process.execPath, [program('database', 'migrate.js')], {
    env: { ...environment, ...ownerEnvironment(database) },
    title: 'Migration of the database',
  });
}

/** Puts the demo firm in, once: run again it changes nothing. */
export function seedDemo(processes, environment, demoPassword) {
  return processes.run(process.execPath, [program('database', 'seed-demo.js')], {
    env: { ...environment, DEMO_PASSWORD: demoPassword },
    title: 'Demo firm',
  });
}

/** The demo's sign-ins, which the seed prints as one line of JSON: [{ name, role, email }]. */
export async function demoSignIns(processes, environment) {
  const printed = await processes.run(process.execPath, [program('database', 'seed-demo.js'), '--list'], {
    env: environment,
    title: 'List of the demo sign-ins',
  });
  return JSON.parse(printed.trimEnd().split('\n').at(-1));
}

/** Starts the API, which also serves the interface, and waits until it says that it is ready. */
export async function startApi(processes, environment, { port, host = '127.0.0.1', logFile }) {
  const env = { UI_FOLDER: uiOutputFolder, ...environment, PORT: String(port), HOST: host };
  const api = processes.start('API', process.execPath, ['--enable-source-maps', program('main.js')], {
    env,
    cwd: apiFolder,
    logFile,
    graceSeconds: SECONDS_TO_STOP,
  });
  const answeringHost = ['0.0.0.0', '::'].includes(host) ? '127.0.0.1' : host;
  await untilReady(api, `http://${answeringHost.includes(':') ? `[${answeringHost}]` : answeringHost}:${port}/readyz`);
  return api;
}

async function untilReady(api, url) {
  const deadline = Date.now() + SECONDS_TO_READY * 1000;
  let answer = 'nothing';
  while (Date.now() < deadline) {
    try {
      const response = await fetch(url, { signal: AbortSignal.timeout(5000) });
      if (response.status === 200) return;
      answer = `${response.status} ${await response.text()}`;
    } catch {
      // not listening yet
    }
    if (api.hasEnded()) throw new Fault(`The API ended while starting:\n${api.log()}`);
    await wait(POLL_MS);
  }
  throw new Fault(`The API is not ready after ${SECONDS_TO_READY} s; it answered ${answer}\n${api.log()}`);
}
