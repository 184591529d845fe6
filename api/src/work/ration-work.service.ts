import type { WorkGroup } from '@brimgate/rules';
import { Injectable } from '@nestjs/common';
import type { CurrentUser } from '../common/current-user';
import { RationModel } from '../rations/ration.model';
import { RationVersionModel } from '../rations/ration-version.model';
import { DecisionModel } from '../reviews/decision.model';
import { ReviewModel } from '../reviews/review.model';
import { ScreeningModel } from '../screenings/screening.model';
import { YardModel } from '../yards/yard.model';
import { groupOf } from './group-of';
import { rationItem, sentBackItem } from './work-items';

// More unfinished rations than a firm works on at once; the list says what is newest of them.
const MOST_READ = 500;

const needsNoDesk = ({ ration, screening }: RationVersionModel) =>
  screening !== null &&
  !ration.yard.complianceGate &&
  screening.signOff !== 'compliance' &&
  screening.signOff !== 'veterinarian';

const isReady = (row: RationVersionModel) => row.state === 'signed' || (row.state === 'screened' && needsNoDesk(row));

/** The nutritionist's rations that are on the way to release. */
@Injectable()
export class RationWork {
  async groups(user: CurrentUser): Promise<WorkGroup[]> {
    const rows = await this.unfinished(user);
    const sentBack = rows.filter((row) => row.state === 'sent-back');
    const reviews = await this.sendBacks(user, sentBack);
    const ready = rows.filter(isReady);
    const drafts = rows.filter((row) => !isReady(row) && (row.state === 'draft' || row.state === 'screened'));
    return [
      groupOf('sent-back', sentBack, (row) => sentBackItem(row, reviews.get(row.id))),
      groupOf('ready-to-release', ready, rationItem),
      groupOf('drafts', drafts, rationItem),
    ];
  }

  private unfinished(user: CurrentUser): Promise<RationVersionModel[]> {
    return RationVersionModel.findAll({
      // The drafts themselves are long and a work list does not show them.
      attributes: { exclude: ['draft'] },
      where: { firmId: user.firmId, isNewest: true, state: ['draft', 'screened', 'signed', 'sent-back'] },
      include: [
        {
          model: RationModel,
          required: true,
          where: { firmId: user.firmId, yardId: [...user.yardIds] },
          include: [{ model: YardModel, required: true, attributes: ['name', 'complianceGate'] }],
        },
        { model: ScreeningModel, attributes: ['verdict', 'signOff', 'headline'] },
      ],
      order: [
        ['savedAt', 'DESC'],
        ['id', 'DESC'],
      ],
      limit: MOST_READ,
    });
  }

  private async sendBacks(
    user: CurrentUser,
    versions: readonly RationVersionModel[],
  ): Promise<Map<number, ReviewModel>> {
    const { firmId } = user;
    if (versions.length === 0) return new Map();
    const reviews = await ReviewModel.findAll({
      where: { firmId, state: 'sent-back', rationVersionId: versions.map((version) => version.id) },
      include: [{ model: DecisionModel, separate: true, where: { firmId } }],
    });
    return new Map(reviews.map((review) => [review.rationVersionId, review]));
  }
}
