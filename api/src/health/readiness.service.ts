import { Injectable, Logger, type OnModuleDestroy } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { QueryTypes } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import { env } from '../config/env';
import { migrationNames, MIGRATIONS_TABLE } from '../database/migrator';
import { readSettings, wrongSettings } from './durability';

const known = migrationNames();

/** Whether requests may come: the database answers, its schema is this program's, and it keeps what it acknowledges. */
@Injectable()
export class ReadinessService implements OnModuleDestroy {
  private readonly logger = new Logger(ReadinessService.name);
  private isStopping = false;

  constructor(@InjectConnection() private readonly sequelize: Sequelize) {}

  onModuleDestroy(): void {
    this.isStopping = true;
  }

  /** What stands in the way; empty when ready. */
  async obstacles(): Promise<string[]> {
    if (this.isStopping) return ['stopping'];
    try {
      const settings = wrongSettings(await readSettings(this.sequelize), env.DATABASE_RELAX_DURABILITY);
      return [...settings, ...(await this.missingMigrations())];
    } catch (error) {
      this.logger.warn({ err: error }, 'The database does not answer');
      return ['the database does not answer'];
    }
  }

  private async missingMigrations(): Promise<string[]> {
    const rows = await this.sequelize.query<{ name: string }>(`SELECT name FROM ${MIGRATIONS_TABLE}`, {
      type: QueryTypes.SELECT,
    });
    const applied = new Set(rows.map(({ name }) => name));
    return known.filter((name) => !applied.has(name)).map((name) => `${name} is not applied`);
  }
}
