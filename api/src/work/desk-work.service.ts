import type { SignerRole, WorkGroup } from '@brimgate/rules';
import { Injectable } from '@nestjs/common';
import { Op, type WhereOptions } from 'sequelize';
import type { CurrentUser } from '../common/current-user';
import { ofYards } from '../database/firm-scope';
import { RationModel } from '../rations/ration.model';
import { ReleaseModel } from '../releases/release.model';
import { ReviewModel } from '../reviews/review.model';
import { ScreeningModel } from '../screenings/screening.model';
import { YardModel } from '../yards/yard.model';
import { groupOf, ITEMS_SHOWN } from './group-of';
import { awaitedReviewItem, releaseItem, reviewItem } from './work-items';

const RECENT_MS = 14 * 86_400_000;

const PARTS = [
  { model: RationModel, attributes: ['uuid', 'name'] },
  { model: YardModel, attributes: ['name'] },
  { model: ScreeningModel, attributes: ['verdict', 'headline'] },
];

/** What stands at the review desk, and what left it lately. */
@Injectable()
export class DeskWork {
  /** The oldest first: it has waited longest. */
  async toSign(user: CurrentUser, role: SignerRole): Promise<WorkGroup> {
    const own = role === 'veterinarian' ? { submittedById: { [Op.ne]: user.personId } } : {};
    const { rows, count } = await this.open(user, { awaits: { [Op.substring]: role }, ...own });
    return groupOf('to-sign', rows, reviewItem, count);
  }

  async waitingForOthers(user: CurrentUser): Promise<WorkGroup> {
    const { rows, count } = await this.open(user, {});
    return groupOf('waiting-for-others', rows, awaitedReviewItem, count);
  }

  async recentlyReleased(user: CurrentUser): Promise<WorkGroup> {
    const { rows, count } = await ReleaseModel.findAndCountAll({
      where: { ...ofYards(user), state: 'released', releasedAt: { [Op.gte]: new Date(Date.now() - RECENT_MS) } },
      include: PARTS,
      order: [
        ['releasedAt', 'DESC'],
        ['id', 'DESC'],
      ],
      limit: ITEMS_SHOWN,
    });
    return groupOf('recently-released', rows, releaseItem, count);
  }

  private open(user: CurrentUser, where: WhereOptions) {
    return ReviewModel.findAndCountAll({
      where: { ...ofYards(user), state: 'open', ...where },
      include: PARTS,
      order: [
        ['submittedAt', 'ASC'],
        ['id', 'ASC'],
      ],
      limit: ITEMS_SHOWN,
    });
  }
}
