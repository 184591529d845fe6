import { randomUUID } from 'node:crypto';
import type { RationView, ReviewInput } from '@brimgate/rules';
import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import { AuditService } from '../audit/audit.service';
import { told } from '../audit/changes';
import type { CurrentUser } from '../common/current-user';
import { IdempotencyService } from '../common/idempotency.service';
import { saveVersion } from '../database/save-version';
import { RationInReview } from '../rations/ration.errors';
import { RationLookup } from '../rations/ration-lookup.service';
import { RationModel } from '../rations/ration.model';
import { RationViews } from '../rations/ration-views.service';
import type { RationVersionModel } from '../rations/ration-version.model';
import { CurrentScreening } from '../screenings/current-screening.service';
import type { ScreeningModel } from '../screenings/screening.model';
import { YardModel } from '../yards/yard.model';
import { awaitedSigners, gateOf } from './gate';
import { RationNotScreened, ReviewClosed, ReviewDecided, ReviewNotNeeded, VersionDecided } from './review.errors';
import { ReviewLookup } from './review-lookup.service';
import { ReviewModel } from './review.model';

type Submit = { rationId: string; input: ReviewInput; version: number; key: string; user: CurrentUser };
type Withdraw = { reviewId: string; key: string; user: CurrentUser };
type Submitted = {
  user: CurrentUser;
  ration: RationModel;
  newest: RationVersionModel;
  screening: ScreeningModel;
  reason: string;
};

/** Sends versions to the review desk and takes them back. */
@Injectable()
export class SubmissionsService {
  constructor(
    private readonly idempotency: IdempotencyService,
    private readonly rations: RationLookup,
    private readonly reviews: ReviewLookup,
    private readonly current: CurrentScreening,
    private readonly views: RationViews,
    private readonly audit: AuditService,
  ) {}

  submit({ rationId, input, version, key, user }: Submit): Promise<RationView> {
    const route = `POST /api/rations/${rationId}/reviews`;
    return this.idempotency.once({ user, route, key, body: { ...input, version } }, async (transaction) => {
      const ration = await this.rations.lockAt({ user, rationId, version }, transaction);
      const newest = await this.rations.newestVersion(ration, transaction);
      refuseState(newest);
      const screening = await this.current.assertCurrent(
        { user, ration, newest, screeningId: input.screeningId },
        transaction,
      );
      await this.open({ user, ration, newest, screening, reason: input.reason }, transaction);
      await newest.update({ state: 'in-review' }, { transaction });
      await saveVersion(RationModel, ration, {}, transaction);
      return this.views.view({ user, rationId }, transaction);
    });
  }

  private async open({ user, ration, newest, screening, reason }: Submitted, transaction: Transaction): Promise<void> {
    const yard = await YardModel.findOne({ where: { firmId: user.firmId, id: ration.yardId }, transaction });
    if (!yard) throw new Error(`Ration ${ration.uuid} has no yard`);
    const awaits = awaitedSigners(gateOf({ screening, review: null, yard }));
    if (awaits.length === 0) throw new ReviewNotNeeded();
    await ReviewModel.create(
      {
        firmId: user.firmId,
        uuid: randomUUID(),
        yardId: ration.yardId,
        rationId: ration.id,
        rationVersionId: newest.id,
        versionNumber: newest.number,
        screeningId: screening.id,
        contentHash: screening.contentHash,
        reason,
        state: 'open',
        awaits: awaits.join(','),
        submittedById: user.personId,
        submittedByName: user.name,
        submittedAt: new Date(),
        closedAt: null,
      },
      { transaction },
    );
    await this.audit.record(transaction, {
      user,
      act: 'review-submitted',
      sentence: `Sent version ${newest.number} of ${ration.name} to the review desk`,
      subject: { kind: 'ration', id: ration.uuid, name: ration.name },
      yardId: ration.yardId,
      changes: told('Reason', reason),
    });
  }

  async withdraw({ reviewId, key, user }: Withdraw): Promise<RationView> {
    const rationId = await this.reviews.rationIdOf({ user, reviewId });
    const route = `POST /api/reviews/${reviewId}/withdrawal`;
    return this.idempotency.once({ user, route, key, body: null }, async (transaction) => {
      const { ration, version, review } = await this.reviews.lock({ user, reviewId, rationId }, transaction);
      if (review.decisions.length > 0) throw new ReviewDecided();
      if (review.state !== 'open') throw new ReviewClosed();
      await review.update({ state: 'withdrawn', awaits: '', closedAt: new Date() }, { transaction });
      await version.update({ state: 'screened' }, { transaction });
      await saveVersion(RationModel, ration, {}, transaction);
      await this.audit.record(transaction, {
        user,
        act: 'review-withdrawn',
        sentence: `Took version ${version.number} of ${ration.name} back from the review desk`,
        subject: { kind: 'ration', id: ration.uuid, name: ration.name },
        yardId: ration.yardId,
      });
      return this.views.view({ user, rationId }, transaction);
    });
  }
}

function refuseState({ state }: RationVersionModel): void {
  if (state === 'in-review') throw new RationInReview();
  if (state === 'draft') throw new RationNotScreened();
  if (state !== 'screened') throw new VersionDecided();
}
