import { randomUUID } from 'node:crypto';
import type { AdvisoryPreview, RationView, ReleaseInput } from '@brimgate/rules';
import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import { AdvisoryWriter } from '../advisories/advisory-writer.service';
import { AuditService } from '../audit/audit.service';
import { contentOf, told } from '../audit/changes';
import type { CurrentUser } from '../common/current-user';
import { IdempotencyService } from '../common/idempotency.service';
import { saveVersion } from '../database/save-version';
import { RationInReview } from '../rations/ration.errors';
import { RationLookup } from '../rations/ration-lookup.service';
import { RationModel } from '../rations/ration.model';
import { RationViews } from '../rations/ration-views.service';
import { RationVersionModel } from '../rations/ration-version.model';
import { RationNotScreened } from '../reviews/review.errors';
import { CurrentScreening } from '../screenings/current-screening.service';
import { AlreadyReleased, GateClosed } from './release.errors';
import { type ReleaseMatter, ReleaseMatters } from './release-matter.service';
import { ReleaseModel } from './release.model';

type Release = { rationId: string; input: ReleaseInput; version: number; key: string; user: CurrentUser };
type Frozen = ReleaseMatter & {
  user: CurrentUser;
  ration: RationModel;
  newest: RationVersionModel;
  reason: string | null;
};

/** Releases versions to be fed. */
@Injectable()
export class ReleasesService {
  constructor(
    private readonly idempotency: IdempotencyService,
    private readonly lookup: RationLookup,
    private readonly current: CurrentScreening,
    private readonly matters: ReleaseMatters,
    private readonly advisories: AdvisoryWriter,
    private readonly views: RationViews,
    private readonly audit: AuditService,
  ) {}

  /** The mail as a release now would send it; nothing is written. */
  async preview({ rationId, user }: { rationId: string; user: CurrentUser }): Promise<AdvisoryPreview> {
    const ration = await this.lookup.find({ user, rationId });
    const newest = await RationVersionModel.findOne({
      where: { firmId: user.firmId, rationId: ration.id, isNewest: true },
    });
    if (!newest) throw new RationNotScreened();
    const { yard, screening, review } = await this.matters.of(ration, newest);
    return this.advisories.preview({
      kind: 'release',
      user,
      yard,
      ration,
      screening,
      decisions: review?.decisions ?? [],
      reason: review?.reason ?? null,
      actedAt: new Date(),
    });
  }

  release({ rationId, input, version, key, user }: Release): Promise<RationView> {
    const route = `POST /api/rations/${rationId}/releases`;
    return this.idempotency.once({ user, route, key, body: { ...input, version } }, async (transaction) => {
      const ration = await this.lookup.lockAt({ user, rationId, version }, transaction);
      const newest = await this.lookup.newestVersion(ration, transaction);
      refuseState(newest);
      await this.current.assertCurrent({ user, ration, newest, screeningId: input.screeningId }, transaction);
      const matter = await this.matters.of(ration, newest, transaction);
      const reason = input.reason ?? matter.review?.reason ?? null;
      const gate = this.matters.gate(matter, reason);
      if (!gate.isOpen) throw new GateClosed(gate);
      await this.freeze({ ...matter, user, ration, newest, reason }, transaction);
      return this.views.view({ user, rationId }, transaction);
    });
  }

  private async freeze(frozen: Frozen, transaction: Transaction): Promise<void> {
    const { user, ration, newest, yard, screening, review, reason } = frozen;
    const releasedAt = new Date();
    await this.supersedeEarlier(ration, transaction);
    await newest.update({ state: 'released' }, { transaction });
    const release = await this.insert(frozen, releasedAt, transaction);
    await saveVersion(RationModel, ration, { releasedVersionNumber: newest.number }, transaction);
    await this.advisories.write(
      {
        kind: 'release',
        user,
        yard,
        ration,
        screening,
        decisions: review?.decisions ?? [],
        reason,
        actedAt: releasedAt,
      },
      release.id,
      transaction,
    );
    await this.audit.record(transaction, {
      user,
      act: 'ration-released',
      sentence: `Released version ${newest.number} of ${ration.name} to ${yard.name}`,
      subject: { kind: 'ration', id: ration.uuid, name: ration.name },
      yardId: yard.id,
      changes: [...contentOf(screening.contentHash), ...told('Reason', reason)],
    });
  }

  private insert({ user, ration, newest, screening, reason }: Frozen, releasedAt: Date, transaction: Transaction) {
    return ReleaseModel.create(
      {
        firmId: user.firmId,
        uuid: randomUUID(),
        yardId: ration.yardId,
        rationId: ration.id,
        rationVersionId: newest.id,
        versionNumber: newest.number,
        screeningId: screening.id,
        contentHash: screening.contentHash,
        state: 'released',
        reason,
        fedLines: screening.request.request.lines.map(({ feedstuff, sharePctDm }) => ({ feedstuff, sharePctDm })),
        releasedById: user.personId,
        releasedByName: user.name,
        releasedAt,
        stoppedById: null,
        stoppedByName: null,
        stoppedAt: null,
        stopReason: null,
      },
      { transaction },
    );
  }

  /** Of one ration, one version is fed. */
  private async supersedeEarlier({ firmId, id }: RationModel, transaction: Transaction): Promise<void> {
    const where = { firmId, rationId: id, state: 'released' };
    await ReleaseModel.update({ state: 'superseded' }, { where, transaction });
    await RationVersionModel.update({ state: 'superseded' }, { where, transaction });
  }
}

function refuseState({ state }: RationVersionModel): void {
  if (state === 'in-review') throw new RationInReview();
  if (state === 'draft') throw new RationNotScreened();
  if (state === 'released' || state === 'superseded' || state === 'stopped') throw new AlreadyReleased();
}
