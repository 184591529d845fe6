import type { GateView } from '@brimgate/rules';
import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import type { RationModel } from '../rations/ration.model';
import type { RationVersionModel } from '../rations/ration-version.model';
import { DecisionModel } from '../reviews/decision.model';
import { gateOf } from '../reviews/gate';
import { RationNotScreened } from '../reviews/review.errors';
import { ReviewModel } from '../reviews/review.model';
import { CurrentScreening } from '../screenings/current-screening.service';
import type { ScreeningModel } from '../screenings/screening.model';
import { YardModel } from '../yards/yard.model';

export type ReleaseMatter = {
  yard: YardModel;
  screening: ScreeningModel;
  /** The latest review of exactly this content that was not withdrawn. */
  review: ReviewModel | null;
};

/** What a version's release rests on, as stored. */
@Injectable()
export class ReleaseMatters {
  constructor(private readonly current: CurrentScreening) {}

  async of(ration: RationModel, version: RationVersionModel, transaction?: Transaction): Promise<ReleaseMatter> {
    const { firmId } = ration;
    if (version.screeningId === null) throw new RationNotScreened();
    const yard = await YardModel.findOne({ where: { firmId, id: ration.yardId }, transaction: transaction ?? null });
    if (!yard) throw new Error(`Ration ${ration.uuid} has no yard`);
    const screening = await this.current.load({ firmId, id: version.screeningId }, transaction);
    const review = await ReviewModel.findOne({
      where: {
        firmId,
        rationVersionId: version.id,
        contentHash: screening.contentHash,
        state: ['open', 'signed', 'sent-back'],
      },
      include: [{ model: DecisionModel, separate: true, where: { firmId }, order: [['id', 'ASC']] }],
      order: [['id', 'DESC']],
      transaction: transaction ?? null,
    });
    return { yard, screening, review };
  }

  gate(matter: ReleaseMatter, reason: string | null): GateView {
    return gateOf({ ...matter, reason });
  }
}
