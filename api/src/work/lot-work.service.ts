import type { WorkGroup } from '@brimgate/rules';
import { Injectable } from '@nestjs/common';
import { Op } from 'sequelize';
import type { CurrentUser } from '../common/current-user';
import { ofYards } from '../database/firm-scope';
import { LotModel } from '../lots/lot.model';
import { YardModel } from '../yards/yard.model';
import { groupOf, ITEMS_SHOWN } from './group-of';
import { lotItem } from './work-items';

/** Lots whose excretion lacks a figure that somebody can enter; one that is merely still on feed is not among them. */
@Injectable()
export class LotWork {
  async incomplete(user: CurrentUser): Promise<WorkGroup> {
    const { rows, count } = await LotModel.findAndCountAll({
      where: {
        ...ofYards(user),
        isDetermined: false,
        [Op.or]: [{ endedOn: { [Op.ne]: null } }, { releaseId: null }, { dryMatterIntakeKgPerDay: null }],
      },
      include: [{ model: YardModel, attributes: ['name'] }],
      order: [
        ['savedAt', 'DESC'],
        ['id', 'DESC'],
      ],
      limit: ITEMS_SHOWN,
    });
    return groupOf('lots-incomplete', rows, lotItem, count);
  }
}
