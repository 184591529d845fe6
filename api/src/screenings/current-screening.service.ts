import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import type { CurrentUser } from '../common/current-user';
import { RationFacts } from '../rations/ration-facts.service';
import type { RationModel } from '../rations/ration.model';
import type { RationVersionModel } from '../rations/ration-version.model';
import { ContentChanged } from '../reviews/review.errors';
import { YardModel } from '../yards/yard.model';
import { ScreeningRequestModel } from './screening-request.model';
import { ScreeningModel } from './screening.model';

type Standing = { user: CurrentUser; ration: RationModel; newest: RationVersionModel };

/** The stored screening that an act rests on, and whether it still says what stands. */
@Injectable()
export class CurrentScreening {
  constructor(private readonly facts: RationFacts) {}

  async load({ firmId, id }: { firmId: number; id: number }, transaction?: Transaction): Promise<ScreeningModel> {
    const screening = await ScreeningModel.findOne({
      where: { firmId, id },
      include: [ScreeningRequestModel],
      transaction: transaction ?? null,
    });
    if (!screening) throw new Error(`Screening ${id} is not there`);
    return screening;
  }

  /** The screening the person saw, if it is the one of this version and every figure under it is as it was. */
  async assertCurrent(
    { screeningId, ...standing }: Standing & { screeningId: string },
    transaction: Transaction,
  ): Promise<ScreeningModel> {
    const { newest } = standing;
    if (newest.screeningId === null) throw new ContentChanged();
    const screening = await this.load({ firmId: newest.firmId, id: newest.screeningId }, transaction);
    if (screening.uuid !== screeningId) throw new ContentChanged();
    await this.assertFactsStand({ ...standing, screening }, transaction);
    return screening;
  }

  /** An approval falls when a figure under it changes, though nobody touched the ration. */
  async assertFactsStand(
    { user, ration, newest, screening }: Standing & { screening: ScreeningModel },
    transaction: Transaction,
  ): Promise<void> {
    const yard = await YardModel.findOne({ where: { firmId: ration.firmId, id: ration.yardId }, transaction });
    if (!yard) throw new Error(`Ration ${ration.uuid} has no yard`);
    const { contentHash } = await this.facts.resolve({ user, yard, content: newest.draft }, transaction);
    if (contentHash !== screening.contentHash) throw new ContentChanged();
  }
}
