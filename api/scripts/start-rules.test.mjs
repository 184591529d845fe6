import assert from 'node:assert/strict';
import { mkdir, mkdtemp, readFile, rm, stat, writeFile } from 'node:fs/promises';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { after, before, test } from 'node:test';
import { accountsSql } from './database-accounts.mjs';
import { ensurePrograms } from './debian.mjs';
import { arePackagesInPlace } from './packages.mjs';
import { demandedPort, firstFreePort } from './ports.mjs';
import { openSecrets } from './secrets.mjs';
import { apiEnvironment, databaseSettings, usesSmtpFake } from './settings.mjs';
import { parseArguments } from './test-suites.mjs';

let folder;
before(async () => (folder = await mkdtemp(join(tmpdir(), 'brimgate-start-'))));
after(() => rm(folder, { recursive: true }));

const secret = (name) => `kept ${name}`;

test('generates a secret once, readable by its owner alone', async () => {
  const file = join(folder, 'secrets.json');
  const first = openSecrets(file, {})('DEMO_PASSWORD');
  assert.ok(first.length >= 15);
  assert.equal(openSecrets(file, {})('DEMO_PASSWORD'), first);
  assert.equal((await stat(file)).mode & 0o777, 0o600);
  assert.equal(JSON.parse(await readFile(file, 'utf8')).DEMO_PASSWORD, first);
});

test('prefers the environment, and in production refuses to generate', () => {
  const file = join(folder, 'none.json');
  assert.equal(openSecrets(file, { JWT_SECRET: 'mine', NODE_ENV: 'production' })('JWT_SECRET'), 'mine');
  assert.throws(() => openSecrets(file, { NODE_ENV: 'production' })('JWT_SECRET'), /Set JWT_SECRET in the environment/);
});

test('does not overwrite a secrets file it cannot read', async () => {
  const file = join(folder, 'broken.json');
  await writeFile(file, '{"JWT');
  assert.throws(() => openSecrets(file, {}), /cannot be read as JSON/);
  assert.equal(await readFile(file, 'utf8'), '{"JWT');
});

test('refuses a demanded port that is taken or is no port, and otherwise finds the next free one', async () => {
  const server = createServer();
  const taken = await new Promise((resolve) => server.listen(0, '127.0.0.1', () => resolve(server.address().port)));
  await assert.rejects(demandedPort('PORT', String(taken)), /PORT is \d+, but another program already listens there/);
  assert.ok((await firstFreePort(taken)) > taken);
  server.close();
  for (const text of ['0', '65536', '3000x', '-1', ''])
    await assert.rejects(demandedPort('PORT', text), /whole number/);
});

test('uses a server of one’s own only with its user and password', () => {
  assert.throws(() => databaseSettings({ DATABASE_HOST: 'db' }, secret), /DATABASE_USER is not set/);
  const own = { DATABASE_HOST: 'db', DATABASE_USER: 'u', DATABASE_PASSWORD: 'p' };
  assert.equal(databaseSettings(own, secret).owner.user, 'u');
  assert.throws(
    () => databaseSettings({ ...own, DATABASE_OWNER_USER: 'o' }, secret),
    /DATABASE_OWNER_PASSWORD is not set/,
  );
});

test('keeps the owner apart from the application on the private server', () => {
  const same = { DATABASE_USER: 'one', DATABASE_OWNER_USER: 'one' };
  assert.throws(() => databaseSettings(same, secret), /must differ/);
  const database = databaseSettings({}, secret);
  const environment = apiEnvironment({ DATABASE_OWNER_PASSWORD: 'x', DEMO_PASSWORD: 'y', PATH: '/bin' }, database, {});
  assert.deepEqual(
    Object.keys(environment).filter((name) => /OWNER|DEMO/.test(name)),
    [],
  );
  assert.equal(environment.PATH, '/bin');
});

test('demands a real mail server in production', () => {
  assert.equal(usesSmtpFake({}), true);
  assert.equal(usesSmtpFake({ SMTP_HOST: 'mail' }), false);
  assert.throws(() => usesSmtpFake({ NODE_ENV: 'production' }), /set SMTP_HOST/);
});

test('quotes a password that holds quotes, and never makes an account without one', () => {
  const sql = accountsSql({
    databases: ['a_b'],
    owner: { user: 'o', password: `it's\\` },
    application: { user: 'p', password: 'q' },
  });
  assert.match(sql, /CREATE USER IF NOT EXISTS 'o'@'127\.0\.0\.1' IDENTIFIED BY 'it''s\\\\';/);
  assert.match(sql, /GRANT ALL PRIVILEGES ON `a\\_b`\.\* TO 'o'@'127\.0\.0\.1'/);
});

test('tells who is not root the one command for a missing program', async () => {
  const without = { isRoot: false, find: () => undefined };
  await assert.rejects(
    ensurePrograms(undefined, ['mariadbd'], ['mariadb-server-core', 'mariadb-client-core'], without),
    /sudo sh -c 'apt-get update && apt-get install .* mariadb-server-core mariadb-client-core'/,
  );
});

test('does not take a cut-short installation of the packages for a whole one', async () => {
  const write = (name, content) => writeFile(join(folder, name), JSON.stringify(content));
  const one = { version: '1.0.0', integrity: 'sha512-a' };
  await write('package.json', { workspaces: [], dependencies: { one: '1.0.0' } });
  await write('package-lock.json', {
    packages: {
      '': { dependencies: { one: '1.0.0' } },
      'node_modules/one': one,
      'node_modules/two': { ...one, optional: true },
      'node_modules/three': { ...one, extraneous: true },
    },
  });
  assert.equal(arePackagesInPlace(folder), false);
  await mkdir(join(folder, 'node_modules'));
  await write('node_modules/.package-lock.json', { packages: { 'node_modules/one': one } });
  assert.equal(arePackagesInPlace(folder), true);
  await write('node_modules/.package-lock.json', { packages: {} });
  assert.equal(arePackagesInPlace(folder), false);
});

test('reads suites first and hands the rest to their runner', () => {
  assert.deepEqual(parseArguments(['api', '-t', 'sign-off']), { names: ['api'], extra: ['-t', 'sign-off'] });
  assert.deepEqual(parseArguments(['ui', 'rules', '--', 'x']), { names: ['rules', 'ui'], extra: ['x'] });
  assert.equal(parseArguments([]).names.length, 6);
  assert.match(parseArguments(['apo']).problem, /There is no suite "apo"/);
});
