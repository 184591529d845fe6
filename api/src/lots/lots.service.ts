import { randomUUID } from 'node:crypto';
import type { LotInput, LotView } from '@brimgate/rules';
import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import { AuditService } from '../audit/audit.service';
import { changesBetween, entered } from '../audit/changes';
import { lotWords } from '../audit/field-words';
import type { CurrentUser } from '../common/current-user';
import { TransactionsService } from '../common/transactions.service';
import { ofYards } from '../database/firm-scope';
import { saveVersion, VersionStale } from '../database/save-version';
import { ReleaseModel } from '../releases/release.model';
import { YardModel } from '../yards/yard.model';
import { LotInvalid, LotNotFound } from './lot.errors';
import { LotExcretions } from './lot-excretions.service';
import { LotList } from './lot-list.service';
import { LotModel } from './lot.model';

type Create = { input: LotInput; user: CurrentUser };
type Save = Create & { lotId: string; version: number };

/** Enters and changes lots; what they excreted is computed here, once, and kept. */
@Injectable()
export class LotsService {
  constructor(
    private readonly transactions: TransactionsService,
    private readonly excretions: LotExcretions,
    private readonly list: LotList,
    private readonly audit: AuditService,
  ) {}

  create({ input, user }: Create): Promise<LotView> {
    return this.transactions.run(async (transaction) => {
      const columns = await this.columnsOf({ input, user }, transaction);
      const lot = await LotModel.create(
        { firmId: user.firmId, uuid: randomUUID(), version: 1, ...columns },
        { transaction },
      );
      const view = await this.list.view({ user, lotId: lot.uuid }, transaction);
      await this.audit.record(transaction, {
        user,
        act: 'lot-entered',
        sentence: `Entered ${lotInWords(lot.name)}`,
        subject: { kind: 'lot', id: lot.uuid, name: lot.name },
        yardId: lot.yardId,
        changes: entered(lotWords, fieldsOf(view)),
      });
      return view;
    });
  }

  save({ lotId, input, version, user }: Save): Promise<LotView> {
    return this.transactions.run(async (transaction) => {
      const where = { ...ofYards(user), uuid: lotId };
      const lot = await LotModel.findOne({ where, lock: transaction.LOCK.UPDATE, transaction });
      if (!lot) throw new LotNotFound();
      if (lot.version !== version) throw new VersionStale(lot.version);
      const before = await this.list.view({ user, lotId }, transaction);
      const columns = await this.columnsOf({ input, user }, transaction);
      await saveVersion(LotModel, lot, columns, transaction);
      const view = await this.list.view({ user, lotId }, transaction);
      await this.audit.record(transaction, {
        user,
        act: 'lot-changed',
        sentence: `Changed ${lotInWords(columns.name)}`,
        subject: { kind: 'lot', id: lot.uuid, name: columns.name },
        yardId: columns.yardId,
        changes: changesBetween(lotWords, fieldsOf(before), fieldsOf(view)),
      });
      return view;
    });
  }

  private async columnsOf({ input, user }: Create, transaction: Transaction) {
    const { yardId, releaseId, ...entered } = input;
    const yard = await YardModel.findOne({
      where: { firmId: user.firmId, id: [...user.yardIds], uuid: yardId },
      transaction,
    });
    const release =
      releaseId === null || yard === null
        ? null
        : await ReleaseModel.findOne({ where: { firmId: user.firmId, yardId: yard.id, uuid: releaseId }, transaction });
    if (!yard) throw new LotInvalid([{ path: 'yardId', message: 'This is not one of your yards' }]);
    if (releaseId !== null && !release) {
      throw new LotInvalid([{ path: 'releaseId', message: 'This is not a release of the yard where the lot is fed' }]);
    }
    return {
      ...entered,
      yardId: yard.id,
      releaseId: release?.id ?? null,
      ...(await this.excretions.of({ input, release }, transaction)),
      savedById: user.personId,
      savedByName: user.name,
      savedAt: new Date(),
    };
  }
}

/** The yard and the ration fed by their names, as the audit trail tells them. */
const fieldsOf = ({ yard, release, ...lot }: LotView): Record<string, unknown> => ({
  ...lot,
  yard: yard.name,
  ration: release && `${release.rationName}, version ${release.versionNumber}`,
});

// Most lots are called "Lot 115" already.
const lotInWords = (name: string): string => (/^lot\b/i.test(name) ? name : `the lot ${name}`);
