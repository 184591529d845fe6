import { join } from 'node:path';
import { accountsSql } from './database-accounts.mjs';
import { findMariaDb, initialise, serverInUse, startMariaDb } from './mariadb.mjs';
import { anyFreePort, demandedPort } from './ports.mjs';
import { endLeftovers } from './processes.mjs';
import { step } from './steps.mjs';

/** The demo's own MariaDB, from Debian's packages to a database with its two accounts. */
export async function startPrivateDatabase(processes, { database, dataFolder, runtimeFolder }) {
  const folder = join(dataFolder, 'mariadb');
  const programs = await step('MariaDB', () => findMariaDb(processes));
  await step('Database folder', async () => {
    const left = serverInUse(folder);
    if (left) await endLeftovers({ children: [left] });
    return initialise(processes, programs, { dataFolder: folder, runtimeFolder });
  });
  const port = database.port ? await demandedPort('DATABASE_PORT', database.port) : await anyFreePort();
  const { server, sql } = await step('Database started', async () => ({
    value: await startMariaDb(processes, programs, {
      dataFolder: folder,
      runtimeFolder,
      logFile: join(dataFolder, 'logs', 'mariadb.log'),
      port,
    }),
  }));
  await sql(accountsSql({ databases: [database.name], owner: database.owner, application: database.application }));
  return { server, settings: { ...database, port } };
}
