import type { RationView } from '@brimgate/rules';
import { Injectable } from '@nestjs/common';
import { Op, type Transaction } from 'sequelize';
import type { CurrentUser } from '../common/current-user';
import { ReleaseModel } from '../releases/release.model';
import { DecisionModel } from '../reviews/decision.model';
import { gateOf } from '../reviews/gate';
import { ReviewModel } from '../reviews/review.model';
import { toReviewSummary } from '../reviews/review.view';
import { ScreeningRequestModel } from '../screenings/screening-request.model';
import { ScreeningModel } from '../screenings/screening.model';
import { toScreeningView } from '../screenings/screening.view';
import { RationLookup } from './ration-lookup.service';
import type { RationModel } from './ration.model';
import { toRationView } from './ration.view';
import { RationVersionModel } from './ration-version.model';

type Sought = { user: CurrentUser; rationId: string };

/** The whole ration as its page shows it: newest version, its screening, review, gate and release. */
@Injectable()
export class RationViews {
  constructor(private readonly lookup: RationLookup) {}

  async view({ user, rationId }: Sought, transaction?: Transaction): Promise<RationView> {
    const ration = await this.lookup.find({ user, rationId }, transaction);
    const versions = await this.versionsOf(ration, transaction);
    const newest = versions.find((version) => version.isNewest);
    if (!newest) throw new Error(`Ration ${ration.uuid} has no version`);
    const screening = await this.screeningOf(newest, transaction);
    const review = await this.reviewOf(newest, transaction);
    return toRationView({
      ration,
      newest,
      versions,
      screening: screening && toScreeningView(screening, ration),
      review: review && toReviewSummary(review),
      gate: screening && gateOf({ screening, review, yard: ration.yard }),
      releaseId: await this.releaseIdOf(ration, newest, transaction),
    });
  }

  private versionsOf({ firmId, id }: RationModel, transaction?: Transaction): Promise<RationVersionModel[]> {
    return RationVersionModel.findAll({
      where: { firmId, rationId: id },
      include: [{ model: ScreeningModel, attributes: ['verdict'] }],
      order: [['number', 'DESC']],
      transaction: transaction ?? null,
    });
  }

  private async screeningOf(newest: RationVersionModel, transaction?: Transaction): Promise<ScreeningModel | null> {
    if (newest.screeningId === null) return null;
    return ScreeningModel.findOne({
      where: { firmId: newest.firmId, id: newest.screeningId },
      include: [ScreeningRequestModel],
      transaction: transaction ?? null,
    });
  }

  /** The latest review of exactly this content. */
  private async reviewOf(newest: RationVersionModel, transaction?: Transaction): Promise<ReviewModel | null> {
    if (newest.contentHash === null) return null;
    return ReviewModel.findOne({
      where: { firmId: newest.firmId, rationVersionId: newest.id, contentHash: newest.contentHash },
      include: [{ model: DecisionModel, separate: true, where: { firmId: newest.firmId }, order: [['id', 'ASC']] }],
      order: [['id', 'DESC']],
      transaction: transaction ?? null,
    });
  }

  /** The release being fed, or else the one that this version had. */
  private async releaseIdOf(
    ration: RationModel,
    newest: RationVersionModel,
    transaction?: Transaction,
  ): Promise<string | null> {
    const releases = await ReleaseModel.findAll({
      attributes: ['id', 'uuid', 'state'],
      where: {
        firmId: ration.firmId,
        rationId: ration.id,
        [Op.or]: [{ state: 'released' }, { rationVersionId: newest.id }],
      },
      transaction: transaction ?? null,
    });
    return (releases.find((release) => release.state === 'released') ?? releases[0])?.uuid ?? null;
  }
}
