import type { ReleaseView, StopInput } from '@brimgate/rules';
import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import { AdvisoryWriter } from '../advisories/advisory-writer.service';
import { AuditService } from '../audit/audit.service';
import { told } from '../audit/changes';
import type { CurrentUser } from '../common/current-user';
import { IdempotencyService } from '../common/idempotency.service';
import { ofYards } from '../database/firm-scope';
import { saveVersion } from '../database/save-version';
import { RationLookup } from '../rations/ration-lookup.service';
import { RationModel } from '../rations/ration.model';
import { RationVersionModel } from '../rations/ration-version.model';
import { CurrentScreening } from '../screenings/current-screening.service';
import { YardModel } from '../yards/yard.model';
import { ReleaseNotFed, ReleaseNotFound } from './release.errors';
import { ReleaseList } from './release-list.service';
import { ReleaseModel } from './release.model';

type Stop = { releaseId: string; input: StopInput; key: string; user: CurrentUser };

/** Stops what is being fed, and tells the yard. */
@Injectable()
export class StopsService {
  constructor(
    private readonly idempotency: IdempotencyService,
    private readonly lookup: RationLookup,
    private readonly current: CurrentScreening,
    private readonly advisories: AdvisoryWriter,
    private readonly list: ReleaseList,
    private readonly audit: AuditService,
  ) {}

  async stop({ releaseId, input, key, user }: Stop): Promise<ReleaseView> {
    const rationId = await this.rationIdOf(user, releaseId);
    const route = `POST /api/releases/${releaseId}/stop`;
    return this.idempotency.once({ user, route, key, body: input }, async (transaction) => {
      const ration = await this.lookup.lock({ user, rationId }, transaction);
      const where = { ...ofYards(user), uuid: releaseId };
      const release = await ReleaseModel.findOne({ where, lock: transaction.LOCK.UPDATE, transaction });
      if (!release) throw new ReleaseNotFound();
      if (release.state !== 'released') throw new ReleaseNotFed();
      await this.write({ user, ration, release, reason: input.reason }, transaction);
      return this.list.view({ user, releaseId }, transaction);
    });
  }

  private async write(
    {
      user,
      ration,
      release,
      reason,
    }: { user: CurrentUser; ration: RationModel; release: ReleaseModel; reason: string },
    transaction: Transaction,
  ): Promise<void> {
    const { firmId } = user;
    const stoppedAt = new Date();
    await release.update(
      { state: 'stopped', stoppedById: user.personId, stoppedByName: user.name, stoppedAt, stopReason: reason },
      { transaction },
    );
    await RationVersionModel.update(
      { state: 'stopped' },
      { where: { firmId, id: release.rationVersionId }, transaction },
    );
    await saveVersion(RationModel, ration, { releasedVersionNumber: null }, transaction);
    const yard = await YardModel.findOne({ where: { firmId, id: ration.yardId }, transaction });
    if (!yard) throw new Error(`Ration ${ration.uuid} has no yard`);
    const screening = await this.current.load({ firmId, id: release.screeningId }, transaction);
    await this.advisories.write(
      { kind: 'stop', user, yard, ration, screening, decisions: [], reason, actedAt: stoppedAt },
      release.id,
      transaction,
    );
    await this.audit.record(transaction, {
      user,
      act: 'release-stopped',
      sentence: `Stopped version ${release.versionNumber} of ${ration.name} at ${yard.name}`,
      subject: { kind: 'ration', id: ration.uuid, name: ration.name },
      yardId: yard.id,
      changes: told('Reason', reason),
    });
  }

  private async rationIdOf(user: CurrentUser, releaseId: string): Promise<string> {
    const release = await ReleaseModel.findOne({
      attributes: ['id'],
      where: { ...ofYards(user), uuid: releaseId },
      include: [{ model: RationModel, attributes: ['uuid'] }],
    });
    if (!release) throw new ReleaseNotFound();
    return release.ration.uuid;
  }
}
