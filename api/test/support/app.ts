import { Test } from '@nestjs/testing';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { getConnectionToken } from '@nestjs/sequelize';
import { Logger } from 'nestjs-pino';
import { Sequelize } from 'sequelize-typescript';
import { AppModule } from '../../src/app.module';
import { configureApp } from '../../src/configure-app';
import { prepareDatabase } from './database';

export type TestApp = {
  app: NestExpressApplication;
  /** The application's own connection, with the application's rights. */
  sequelize: Sequelize;
  close: () => Promise<void>;
};

/** The real application on this worker's own, empty database. */
export async function createTestApp(): Promise<TestApp> {
  await prepareDatabase();
  const testing = await Test.createTestingModule({ imports: [AppModule] }).compile();
  const app = testing.createNestApplication<NestExpressApplication>({ bufferLogs: true, bodyParser: false });
  app.useLogger(app.get(Logger));
  configureApp(app);
  await app.init();
  return { app, sequelize: app.get<Sequelize>(getConnectionToken()), close: () => app.close() };
}

/** The statements that a piece of work sends to the database. */
export async function statementsOf(sequelize: Sequelize, work: () => Promise<unknown>): Promise<string[]> {
  const statements: string[] = [];
  const before = sequelize.options.logging;
  sequelize.options.logging = (sql) => statements.push(sql);
  try {
    await work();
  } finally {
    sequelize.options.logging = before ?? false;
  }
  return statements;
}
