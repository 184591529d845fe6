import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import { migrate, seedDemo, startApi } from './application.mjs';
import { accountsSql } from './database-accounts.mjs';
import { ensurePrograms } from './debian.mjs';
import { findMariaDb, initialise, startMariaDb } from './mariadb.mjs';
import { anyFreePort } from './ports.mjs';
import { randomToken, readablePassword } from './secrets.mjs';
import { apiEnvironment } from './settings.mjs';
import { startSmtpFake } from './smtp-fake.mjs';
import { step } from './steps.mjs';
import { JEST_WORKERS } from './test-suites.mjs';

const BROWSER_DATABASE = 'brimgate_browser';
const WORKER_DATABASES = Array.from({ length: JEST_WORKERS }, (_, index) => `brimgate_test_${index + 1}`);

const NOT_FOR_TESTS = /^(DATABASE_|SMTP_|PORT$|HOST$|PUBLIC_URL$|JWT_SECRET$|DEMO_PASSWORD$|UI_FOLDER$|NODE_ENV$)/;

/** The caller's environment without anything that leads to a database or mail server of somebody's own. */
export function neutralEnvironment() {
  return Object.fromEntries(Object.entries(process.env).filter(([name]) => !NOT_FOR_TESTS.test(name)));
}

/** A MariaDB in the temporary folder, with one empty database for each Jest worker and one for the browser. */
export async function startTestDatabase(processes, folder) {
  const programs = await step('MariaDB', () => findMariaDb(processes));
  const dataFolder = join(folder, 'mariadb');
  const settings = {
    host: '127.0.0.1',
    port: await anyFreePort(),
    owner: { user: 'brimgate_owner', password: randomToken() },
    application: { user: 'brimgate', password: randomToken() },
  };
  await step('Test databases', async () => {
    await initialise(processes, programs, { dataFolder, runtimeFolder: folder });
    const logFile = join(folder, 'mariadb.log');
    const where = { dataFolder, runtimeFolder: folder, logFile, port: settings.port, isThrowAway: true };
    const started = await startMariaDb(processes, programs, where);
    const databases = [...WORKER_DATABASES, BROWSER_DATABASE];
    await started.sql(accountsSql({ databases, ...settings, ownedPattern: 'brimgate\\_test\\_%' }));
    return {};
  });
  return settings;
}

/** What Jest needs to know: where the databases are and both accounts. A test may use more named brimgate_test_…. */
export function jestEnvironment(database) {
  return {
    ...neutralEnvironment(),
    TEST_DATABASE_HOST: database.host,
    TEST_DATABASE_PORT: String(database.port),
    TEST_DATABASE_OWNER_USER: database.owner.user,
    TEST_DATABASE_OWNER_PASSWORD: database.owner.password,
    TEST_DATABASE_USER: database.application.user,
    TEST_DATABASE_PASSWORD: database.application.password,
  };
}

/** The built product with its demo firm, its mail server and a browser to open it in; the answer is what the browser's tests need to know. */
export async function startProduct(processes, database, folder) {
  const [chromium] = await step('Chromium', async () => {
    const { paths, wasInstalled } = await ensurePrograms(processes, ['chromium'], ['chromium']);
    return { note: wasInstalled ? 'installed' : 'in place', value: paths };
  });
  const mailFolder = join(folder, 'mail');
  mkdirSync(mailFolder);
  const smtpFake = await startSmtpFake({ folder: mailFolder });
  const demoPassword = readablePassword();
  const port = await anyFreePort();
  const address = `http://127.0.0.1:${port}`;
  const environment = apiEnvironment(
    neutralEnvironment(),
    { ...database, name: BROWSER_DATABASE },
    {
      DATABASE_RELAX_DURABILITY: 'true',
      JWT_SECRET: randomToken(),
      PUBLIC_URL: address,
      SMTP_HOST: '127.0.0.1',
      SMTP_PORT: String(smtpFake.port),
      SMTP_SECURE: 'false',
    },
  );
  const api = await step('Product started', async () => {
    await migrate(processes, environment, database);
    await seedDemo(processes, environment, demoPassword);
    return { value: await startApi(processes, environment, { port, logFile: join(folder, 'api.log') }) };
  });
  return {
    api,
    smtpFake,
    environment: {
      ...neutralEnvironment(),
      BASE_URL: address,
      MAIL_FOLDER: mailFolder,
      MAIL_URL: smtpFake.pageAddress,
      DEMO_PASSWORD: demoPassword,
      CHROMIUM_PATH: chromium,
    },
  };
}
