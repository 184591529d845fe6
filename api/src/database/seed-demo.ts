import 'reflect-metadata';
import { NestFactory } from '@nestjs/core';
import { AppModule } from '../app.module';
import { env } from '../config/env';
import { demoSignIns } from './seeds/demo-people';
import { seedDemoFirm } from './seeds/seed-demo-firm';

const SHORTEST_PASSWORD = 15;
const HOUR_MS = 60 * 60_000;

async function main(): Promise<void> {
  if (process.argv.includes('--list')) {
    process.stdout.write(`${JSON.stringify(demoSignIns())}\n`);
    return;
  }
  if (env.DEMO_PASSWORD.length < SHORTEST_PASSWORD) {
    throw new Error(`Set DEMO_PASSWORD, of at least ${SHORTEST_PASSWORD} characters, to make the demo firm`);
  }
  // Mail that the story leads to is the server's to send.
  env.OUTBOX_POLL_MS = HOUR_MS;
  const app = await NestFactory.createApplicationContext(AppModule, { logger: ['error', 'warn'] });
  try {
    await seedDemoFirm(app, env.DEMO_PASSWORD);
  } finally {
    await app.close();
  }
}

main().catch((error: unknown) => {
  process.stderr.write(`${error instanceof Error ? (error.stack ?? error.message) : String(error)}\n`);
  process.exitCode = 1;
});
