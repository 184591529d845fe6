import { existsSync, mkdirSync, readFileSync, renameSync, rmSync, symlinkSync } from 'node:fs';
import { userInfo } from 'node:os';
import { basename, dirname, join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import { ensurePrograms } from './debian.mjs';
import { Fault } from './fault.mjs';
import { identityOf } from './process-identity.mjs';

const POLL_MS = 50;
const SECONDS_TO_READY = 120; // a restart after a crash first reads its log
const SECONDS_TO_STOP = 60; // it writes its pages before it goes

/** Settings every database of Brimgate runs with; the API refuses readiness without the ones it relies on. */
const SETTINGS = [
  '--bind-address=127.0.0.1',
  '--skip-name-resolve', // 127.0.0.1 is not "localhost", so the socket's root account cannot be reached over TCP
  '--local-infile=OFF',
  '--character-set-server=utf8mb4',
  '--collation-server=utf8mb4_unicode_520_ci',
  '--default-time-zone=+00:00',
  '--sql-mode=STRICT_ALL_TABLES,STRICT_TRANS_TABLES,ERROR_FOR_DIVISION_BY_ZERO,NO_ZERO_DATE,NO_ZERO_IN_DATE,NO_ENGINE_SUBSTITUTION',
  '--innodb-snapshot-isolation=ON', // without it, updates made from an old read are lost without an error
  '--innodb-lock-wait-timeout=5',
  '--innodb-flush-log-at-trx-commit=1',
  // One server without replicas keeps its promises by InnoDB's own log: a binary log would double every commit's disk
  // writes and grow for ever with nobody to read it. The setting holds from the day somebody switches one on.
  '--skip-log-bin',
  '--sync-binlog=1',
  '--innodb-log-file-size=32M',
];

/** For databases that are thrown away: nothing waits for the disk. They overrule the settings above. */
const THROW_AWAY_SETTINGS = [
  '--innodb-flush-log-at-trx-commit=0',
  '--innodb-doublewrite=0',
  '--innodb-flush-method=nosync',
  '--innodb-log-file-size=16M',
  '--innodb-buffer-pool-size=64M',
  '--performance-schema=OFF',
];

const isRoot = () => process.getuid() === 0;
// As root the server must be told to stay root: its usual user could not enter a checkout below a closed folder.
const asUser = () => (isRoot() ? ['--user=root'] : []);

export async function findMariaDb(processes) {
  const { paths, wasInstalled } = await ensurePrograms(
    processes,
    ['mariadbd', 'mariadb-install-db', 'mariadb'],
    ['mariadb-server-core', 'mariadb-client-core'],
  );
  const [server, installer, client] = paths;
  return { note: wasInstalled ? 'installed' : 'in place', value: { server, installer, client } };
}

/**
 * Prepares an empty data folder once. It appears under its name only when it is complete, so a start that is killed
 * half-way leaves nothing that looks like a database. The installer is a shell script that cannot take blanks in a
 * path, and is given a link in the runtime folder instead.
 */
export async function initialise(processes, programs, { dataFolder, runtimeFolder }) {
  if (existsSync(dataFolder)) return { note: 'kept' };
  const unfinished = `${dataFolder}.unfinished`;
  rmSync(unfinished, { recursive: true, force: true });
  mkdirSync(unfinished, { recursive: true, mode: 0o700 });
  const link = join(runtimeFolder, 'new-data');
  symlinkSync(unfinished, link);
  await processes.run(
    programs.installer,
    [
      '--no-defaults',
      ...asUser(),
      `--datadir=${link}`,
      // No password exists: the socket tells who calls, and over TCP this account does not answer.
      '--auth-root-authentication-method=socket',
      `--auth-root-socket-user=${userInfo().username}`,
      '--skip-test-db',
      '--skip-name-resolve',
    ],
    { title: 'mariadb-install-db' },
  );
  rmSync(link);
  renameSync(unfinished, dataFolder);
  return { note: 'created' };
}

/**
 * A second server on one data folder waits half a minute and gives up. The record of a killed starter names its server;
 * this finds one that no record names, by the pid file and the folder on its command line.
 */
export function serverInUse(dataFolder) {
  try {
    const pid = Number(readFileSync(pidFile(dataFolder), 'utf8'));
    const commandLine = readFileSync(`/proc/${pid}/cmdline`, 'utf8').split('\0');
    const identity = commandLine.includes(`--datadir=${dataFolder}`) ? identityOf(pid) : undefined;
    return identity && { name: 'database', graceSeconds: SECONDS_TO_STOP, ...identity };
  } catch {
    return undefined;
  }
}

function pidFile(dataFolder) {
  return join(dirname(dataFolder), `${basename(dataFolder)}.pid`);
}

/** Starts the private server and waits until it answers. `sql(text)` then runs statements as its root. */
export async function startMariaDb(
  processes,
  programs,
  { dataFolder, runtimeFolder, logFile, port, isThrowAway = false },
) {
  const socket = join(runtimeFolder, 'db.sock');
  const args = [
    '--no-defaults', // first, as the server wants it; the system's own configuration is none of ours
    ...asUser(),
    `--datadir=${dataFolder}`,
    `--socket=${socket}`,
    `--pid-file=${pidFile(dataFolder)}`,
    `--port=${port}`,
    ...SETTINGS,
    ...(isThrowAway ? THROW_AWAY_SETTINGS : []),
  ];
  const server = processes.start('database', programs.server, args, { logFile, graceSeconds: SECONDS_TO_STOP });
  const sql = (input) =>
    processes.run(
      programs.client,
      ['--no-defaults', `--socket=${socket}`, `--user=${userInfo().username}`, '--batch', '--skip-column-names'],
      { input, title: 'mariadb' },
    );
  await untilItAnswers(server, sql);
  return { server, sql };
}

async function untilItAnswers(server, sql) {
  const deadline = Date.now() + SECONDS_TO_READY * 1000;
  for (;;) {
    try {
      return await sql('SELECT 1;');
    } catch (error) {
      if (server.hasEnded()) throw new Fault(`The database ended while starting:\n${server.log()}`);
      if (Date.now() > deadline) throw new Fault(`The database did not answer: ${error.message}\n${server.log()}`);
    }
    await wait(POLL_MS);
  }
}
