// `npm start`: everything from an empty checkout to a running product, in order, with one line for each step.
import './node-version.mjs';
import { mkdirSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { demoSignIns, migrate, seedDemo, startApi } from './application.mjs';
import { buildServer, buildUi } from './build.mjs';
import { runToTheEnd } from './ending.mjs';
import { Fault } from './fault.mjs';
import { ensurePackages } from './packages.mjs';
import { dataFolder } from './paths.mjs';
import { demandedPort, firstFreePort } from './ports.mjs';
import { startPrivateDatabase } from './private-database.mjs';
import { endLeftovers, Processes, readRecord } from './processes.mjs';
import { openSecrets } from './secrets.mjs';
import { apiEnvironment, databaseSettings, usesSmtpFake } from './settings.mjs';
import { holdFolder } from './single-start.mjs';
import { startSmtpFake } from './smtp-fake.mjs';
import { secondsSinceStart, step } from './steps.mjs';
import { shortTemporaryFolder } from './temporary-folder.mjs';

const FIRST_PORT = 3000;
const FIRST_SMTP_PORT = 2525;
const FIRST_MAIL_PAGE_PORT = 8025;

const env = process.env;
const isProduction = env.NODE_ENV === 'production';
const recordFile = join(dataFolder, 'running.json');
const processes = new Processes(recordFile);
let runtimeFolder;
let smtpFake;

async function holdThisCheckout() {
  mkdirSync(join(dataFolder, 'logs'), { recursive: true, mode: 0o700 });
  const isHeld = await holdFolder(dataFolder);
  const before = readRecord(recordFile);
  if (!isHeld) {
    const where = before?.address ? ` at ${before.address}` : '';
    throw new Fault(`Brimgate already runs from this checkout${where} (process ${before?.starter?.pid ?? 'unknown'}).`);
  }
  if (before) await step('Left over from a start that was killed', () => clearLeftovers(before));
}

async function clearLeftovers(before) {
  const ended = await endLeftovers(before);
  if (before.runtimeFolder) rmSync(before.runtimeFolder, { recursive: true, force: true });
  return { note: ended.length > 0 ? `stopped ${ended.join(', ')}` : 'nothing still runs' };
}

/** Everything the environment decides, judged before anything slow is begun. */
async function readSettings() {
  const secret = openSecrets(join(dataFolder, 'secrets.json'), env);
  const host = env.HOST || '127.0.0.1';
  const port = env.PORT ? await demandedPort('PORT', env.PORT, host) : await firstFreePort(FIRST_PORT, host);
  return {
    host,
    port,
    address: env.PUBLIC_URL || `http://127.0.0.1:${port}`,
    database: databaseSettings(env, secret),
    isMailFaked: usesSmtpFake(env),
    jwtSecret: secret('JWT_SECRET'),
    // The demo firm's password is in the terminal of whoever starts it: in production only for who asks for it.
    demoPassword: isProduction ? env.DEMO_PASSWORD : secret('DEMO_PASSWORD'),
  };
}

async function startMail() {
  smtpFake = await startSmtpFake({
    port: await firstFreePort(FIRST_SMTP_PORT),
    pagePort: await firstFreePort(FIRST_MAIL_PAGE_PORT),
    folder: join(dataFolder, 'mail'),
  });
  return { value: { SMTP_HOST: '127.0.0.1', SMTP_PORT: String(smtpFake.port), SMTP_SECURE: 'false' } };
}

function printWelcome(settings, signIns) {
  console.log(`\nBrimgate is ready after ${secondsSinceStart()}:  ${settings.address}\n`);
  if (signIns) {
    const width = Math.max(...signIns.map(({ email }) => email.length));
    console.log(`Sign in as one of these, password  ${settings.demoPassword}`);
    for (const { email, role, name } of signIns) console.log(`  ${email.padEnd(width)}  ${role}, ${name}`);
    console.log('');
  }
  const mail = smtpFake ? `can be read at  ${smtpFake.pageAddress}` : `goes to ${env.SMTP_HOST}`;
  console.log(`Mail ${mail}`);
  console.log(`Logs are in ${join(dataFolder, 'logs')}; Ctrl-C stops everything.`);
}

async function start() {
  await holdThisCheckout();
  const settings = await readSettings();
  const { database } = settings;
  runtimeFolder = shortTemporaryFolder('brimgate-');
  processes.note({ runtimeFolder });

  await step('Packages', () => ensurePackages(processes));
  const privateServer = database.isPrivate
    ? await startPrivateDatabase(processes, { database, dataFolder, runtimeFolder })
    : undefined;
  await step('Server compiled', () => buildServer(processes));
  await step('Interface bundled', () => buildUi(processes));
  const mail = settings.isMailFaked ? await step('Mail server for trying out', startMail) : {};

  const environment = apiEnvironment(env, privateServer?.settings ?? database, {
    JWT_SECRET: settings.jwtSecret,
    PUBLIC_URL: settings.address,
    ...mail,
  });
  await step('Database migrated', () => migrate(processes, environment, database).then(() => ({})));
  let signIns;
  if (settings.demoPassword) {
    await step('Demo firm', () => seedDemo(processes, environment, settings.demoPassword).then(() => ({})));
    signIns = await demoSignIns(processes, environment);
  }
  const logFile = join(dataFolder, 'logs', 'api.log');
  const api = await step('API', async () => ({
    value: await startApi(processes, environment, { port: settings.port, host: settings.host, logFile }),
  }));
  processes.note({ address: settings.address });
  printWelcome(settings, signIns);

  const servers = privateServer ? [api, privateServer.server] : [api];
  const stopped = await Promise.race(servers.map((server) => server.ended.then(() => server)));
  throw new Fault(`The ${stopped.name} stopped by itself. The end of its log:\n${stopped.log()}`);
}

await runToTheEnd(start, {
  async cleanUp() {
    await processes.endAll(); // the API first, the database last
    await smtpFake?.close();
    if (runtimeFolder) rmSync(runtimeFolder, { recursive: true, force: true });
  },
  killNow: () => processes.killAll(),
  codeOnSignal: () => 0, // it was asked to stop, and did
});
