import 'reflect-metadata';
import { join } from 'node:path';

// Read by src/config/env.ts when it is first imported; imports are hoisted above assignments, so this is a setup file.
const worker = process.env['JEST_WORKER_ID'] ?? '1';
const given = (name: string, otherwise: string) => process.env[name] ?? otherwise;

Object.assign(process.env, {
  NODE_ENV: 'test',
  DATABASE_HOST: given('TEST_DATABASE_HOST', '127.0.0.1'),
  DATABASE_PORT: given('TEST_DATABASE_PORT', '3306'),
  DATABASE_NAME: `brimgate_test_${worker}`,
  DATABASE_USER: given('TEST_DATABASE_USER', 'brimgate'),
  DATABASE_PASSWORD: given('TEST_DATABASE_PASSWORD', 'not given'),
  DATABASE_OWNER_USER: given('TEST_DATABASE_OWNER_USER', ''),
  DATABASE_OWNER_PASSWORD: given('TEST_DATABASE_OWNER_PASSWORD', ''),
  DATABASE_RELAX_DURABILITY: 'true',
  JWT_SECRET: 'a secret that only the tests know, long enough',
  PUBLIC_URL: 'http://127.0.0.1:3000',
  UI_FOLDER: join(__dirname, 'ui'),
  LOG_LEVEL: given('TEST_LOG_LEVEL', 'silent'),
  OUTBOX_POLL_MS: '3600000',
  OUTBOX_BACKOFF_MS: '10',
});
