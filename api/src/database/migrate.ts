import { env } from '../config/env';
import { runMigrations } from './run-migrations';

async function main(): Promise<void> {
  if (env.DATABASE_OWNER_USER === '') throw new Error('Set DATABASE_OWNER_USER and DATABASE_OWNER_PASSWORD to migrate');
  const applied = await runMigrations(env);
  process.stdout.write(applied.length === 0 ? 'The schema is up to date.\n' : `Applied ${applied.join(', ')}.\n`);
}

main().catch((error: unknown) => {
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
  process.exitCode = 1;
});
