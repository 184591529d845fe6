import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import type { CurrentUser } from '../common/current-user';
import { ofYards } from '../database/firm-scope';
import { RationLookup } from '../rations/ration-lookup.service';
import { RationModel } from '../rations/ration.model';
import { RationVersionModel } from '../rations/ration-version.model';
import { DecisionModel } from './decision.model';
import { ReviewNotFound } from './review.errors';
import { ReviewModel } from './review.model';

type Sought = { user: CurrentUser; reviewId: string };

export type LockedReview = { ration: RationModel; version: RationVersionModel; review: ReviewModel };

/** Finds reviews within the yards a person is assigned to. */
@Injectable()
export class ReviewLookup {
  constructor(private readonly rations: RationLookup) {}

  /** Refuses a review that is not there or not theirs, before anything is asked of the person. */
  async rationIdOf({ user, reviewId }: Sought, transaction?: Transaction): Promise<string> {
    const review = await ReviewModel.findOne({
      attributes: ['id'],
      where: { ...ofYards(user), uuid: reviewId },
      include: [{ model: RationModel, attributes: ['uuid'] }],
      transaction: transaction ?? null,
    });
    if (!review) throw new ReviewNotFound();
    return review.ration.uuid;
  }

  /** Holds the ration first, as every act on it does, then its version and the review with its decisions. */
  async lock(
    { user, reviewId, rationId }: Sought & { rationId: string },
    transaction: Transaction,
  ): Promise<LockedReview> {
    const ration = await this.rations.lock({ user, rationId }, transaction);
    const review = await ReviewModel.findOne({
      where: { ...ofYards(user), uuid: reviewId },
      lock: transaction.LOCK.UPDATE,
      transaction,
    });
    if (!review) throw new ReviewNotFound();
    review.decisions = await DecisionModel.findAll({
      where: { firmId: user.firmId, reviewId: review.id },
      order: [['id', 'ASC']],
      transaction,
    });
    const version = await this.rations.newestVersion(ration, transaction);
    return { ration, version, review };
  }
}
