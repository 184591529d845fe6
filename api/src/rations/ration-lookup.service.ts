import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import type { CurrentUser } from '../common/current-user';
import { ofYards } from '../database/firm-scope';
import { VersionStale } from '../database/save-version';
import { YardModel } from '../yards/yard.model';
import { RationNotFound } from './ration.errors';
import { RationModel } from './ration.model';
import { RationVersionModel } from './ration-version.model';

type Sought = { user: CurrentUser; rationId: string };

/** Finds rations within the yards a person is assigned to. */
@Injectable()
export class RationLookup {
  async find({ user, rationId }: Sought, transaction?: Transaction): Promise<RationModel> {
    const ration = await RationModel.findOne({
      where: { ...ofYards(user), uuid: rationId },
      include: [YardModel],
      transaction: transaction ?? null,
    });
    if (!ration) throw new RationNotFound();
    return ration;
  }

  /**
   * Holds the ration until the transaction ends. Every act on a ration begins here, so that acts on one ration follow
   * each other and each sees what the one before has done.
   */
  async lock({ user, rationId }: Sought, transaction: Transaction): Promise<RationModel> {
    const ration = await RationModel.findOne({
      where: { ...ofYards(user), uuid: rationId },
      lock: transaction.LOCK.UPDATE,
      transaction,
    });
    if (!ration) throw new RationNotFound();
    return ration;
  }

  /** The same, refusing a person who saw an older version. */
  async lockAt({ version, ...sought }: Sought & { version: number }, transaction: Transaction): Promise<RationModel> {
    const ration = await this.lock(sought, transaction);
    if (ration.version !== version) throw new VersionStale(ration.version);
    return ration;
  }

  async newestVersion(ration: RationModel, transaction: Transaction): Promise<RationVersionModel> {
    const newest = await RationVersionModel.findOne({
      where: { firmId: ration.firmId, rationId: ration.id, isNewest: true },
      lock: transaction.LOCK.UPDATE,
      transaction,
    });
    if (!newest) throw new Error(`Ration ${ration.uuid} has no version`);
    return newest;
  }
}
