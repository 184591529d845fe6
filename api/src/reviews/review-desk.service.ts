import { ReviewState, type ReviewListItem, type ReviewView } from '@brimgate/rules';
import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import * as v from 'valibot';
import type { CurrentUser } from '../common/current-user';
import { afterCursor, type Page, pageOf } from '../common/keyset';
import { pageEntries } from '../common/page-query';
import { ofYards } from '../database/firm-scope';
import { LotModel } from '../lots/lot.model';
import { RationModel } from '../rations/ration.model';
import { ReleaseModel } from '../releases/release.model';
import { ScreeningRequestModel } from '../screenings/screening-request.model';
import { ScreeningModel } from '../screenings/screening.model';
import { toScreeningView } from '../screenings/screening.view';
import { YardModel } from '../yards/yard.model';
import { DecisionModel } from './decision.model';
import { gateOf } from './gate';
import { ReviewNotFound } from './review.errors';
import { awaitedOf, ReviewModel } from './review.model';
import { toReviewListItem, toReviewSummary } from './review.view';
import { refusalToSign, signerRoleOf } from './signing';

export const ReviewListQuery = v.strictObject({ ...pageEntries, state: v.optional(ReviewState) });
export type ReviewListQuery = v.InferOutput<typeof ReviewListQuery>;

/** The review desk: what waits, and one review in full. */
@Injectable()
export class ReviewDesk {
  async page({ user, query }: { user: CurrentUser; query: ReviewListQuery }): Promise<Page<ReviewListItem>> {
    const { limit, cursor, state } = query;
    const rows = await ReviewModel.findAll({
      where: {
        ...ofYards(user),
        ...(state === undefined ? {} : { state }),
        ...afterCursor(cursor, { column: 'submittedAt', direction: 'ASC' }),
      },
      include: [
        { model: RationModel, attributes: ['uuid', 'name'] },
        { model: YardModel, attributes: ['uuid', 'name'] },
        { model: ScreeningModel, attributes: ['verdict', 'signOff', 'headline'] },
      ],
      order: [
        ['submittedAt', 'ASC'],
        ['id', 'ASC'],
      ],
      limit: limit + 1,
    });
    return pageOf(rows, limit, {
      toItem: toReviewListItem,
      position: (row) => ({ at: row.submittedAt.toISOString(), id: row.id }),
    });
  }

  async view(
    { user, reviewId }: { user: CurrentUser; reviewId: string },
    transaction?: Transaction,
  ): Promise<ReviewView> {
    const review = await ReviewModel.findOne({
      where: { ...ofYards(user), uuid: reviewId },
      include: [
        RationModel,
        YardModel,
        { model: ScreeningModel, include: [ScreeningRequestModel] },
        { model: DecisionModel, separate: true, where: { firmId: user.firmId }, order: [['id', 'ASC']] },
      ],
      transaction: transaction ?? null,
    });
    if (!review) throw new ReviewNotFound();
    const { ration, yard, screening } = review;
    const fed = await this.fedNow(review, transaction);
    const replaced = fed !== null && fed.rationVersionId !== review.rationVersionId ? fed.screening : null;
    return {
      ...toReviewSummary(review),
      ration: { id: ration.uuid, name: ration.name },
      yard: { id: yard.uuid, name: yard.name },
      versionNumber: review.versionNumber,
      contentHash: review.contentHash,
      screening: toScreeningView(screening, ration),
      replaces: replaced && toScreeningView(replaced, ration),
      lotsFed: fed === null ? [] : await this.lotsOn(fed, transaction),
      gate: gateOf({ screening, review, yard }),
      awaits: awaitedOf(review),
      mySignature: signatureOf(user, review),
    };
  }

  /** The release of the same ration that is being fed. */
  private fedNow(review: ReviewModel, transaction?: Transaction): Promise<ReleaseModel | null> {
    return ReleaseModel.findOne({
      where: { firmId: review.firmId, rationId: review.rationId, state: 'released' },
      include: [{ model: ScreeningModel, include: [ScreeningRequestModel] }],
      transaction: transaction ?? null,
    });
  }

  private async lotsOn(release: ReleaseModel, transaction?: Transaction): Promise<ReviewView['lotsFed']> {
    const lots = await LotModel.findAll({
      attributes: ['uuid', 'name', 'head'],
      where: { firmId: release.firmId, releaseId: release.id, endedOn: null },
      order: [['name', 'ASC']],
      transaction: transaction ?? null,
    });
    return lots.map((lot) => ({ id: lot.uuid, name: lot.name, head: lot.head }));
  }
}

function signatureOf(user: CurrentUser, review: ReviewModel): ReviewView['mySignature'] {
  const role = signerRoleOf(user.role);
  if (role === null) return { as: null, refusal: 'Veterinarians and compliance staff sign here' };
  const refusal = refusalToSign({ user, role, review, decisions: review.decisions });
  return { as: role, refusal: refusal?.title ?? null };
}
