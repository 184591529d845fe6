import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import type { YardInput, YardView } from '@brimgate/rules';
import type { Transaction } from 'sequelize';
import { AuditService } from '../audit/audit.service';
import { changesBetween } from '../audit/changes';
import { yardWords } from '../audit/field-words';
import type { CurrentUser } from '../common/current-user';
import { TransactionsService } from '../common/transactions.service';
import { DUPLICATE_KEY, errorNumber } from '../database/error-number';
import { ofFirm } from '../database/firm-scope';
import { saveVersion } from '../database/save-version';
import { YardNameTaken, YardNotFound } from './yard.errors';
import { YardModel } from './yard.model';
import { toYardView } from './yard.view';

@Injectable()
export class YardsService {
  constructor(
    @InjectModel(YardModel) private readonly yards: typeof YardModel,
    private readonly transactions: TransactionsService,
    private readonly audit: AuditService,
  ) {}

  async list(user: CurrentUser): Promise<{ items: YardView[]; nextCursor: null }> {
    const rows = await this.yards.findAll({
      where: { ...ofFirm(user), id: [...user.yardIds] },
      order: [['name', 'ASC']],
    });
    return { items: rows.map(toYardView), nextCursor: null };
  }

  async show(uuid: string, user: CurrentUser): Promise<YardView> {
    return toYardView(await this.find(uuid, user));
  }

  /** The yard by its public id, if the person is assigned to it; foreign and unknown yards are the same 404. */
  async find(uuid: string, user: CurrentUser, transaction?: Transaction): Promise<YardModel> {
    const row = await this.yards.findOne({
      where: { ...ofFirm(user), id: [...user.yardIds], uuid },
      transaction: transaction ?? null,
    });
    if (!row) throw new YardNotFound();
    return row;
  }

  update({
    uuid,
    input,
    version,
    user,
  }: {
    uuid: string;
    input: YardInput;
    version: number;
    user: CurrentUser;
  }): Promise<YardView> {
    return this.transactions.run(async (transaction) => {
      const row = await this.find(uuid, user, transaction);
      const changes = changesBetween(yardWords, row.get({ plain: true }) as Record<string, unknown>, input);
      await this.save(row, input, version, transaction);
      await this.audit.record(transaction, {
        user,
        act: 'yard-changed',
        sentence: `Changed the settings of ${row.name}`,
        subject: { kind: 'yard', id: row.uuid, name: input.name },
        yardId: row.id,
        changes,
      });
      return toYardView(await this.find(uuid, user, transaction));
    });
  }

  private async save(row: YardModel, input: YardInput, version: number, transaction: Transaction): Promise<void> {
    try {
      await saveVersion(this.yards, { firmId: row.firmId, id: row.id, version }, input, transaction);
    } catch (error) {
      throw errorNumber(error) === DUPLICATE_KEY ? new YardNameTaken() : error;
    }
  }
}
