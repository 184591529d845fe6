import type { RationListItem } from '@brimgate/rules';
import { Injectable } from '@nestjs/common';
import type { CurrentUser } from '../common/current-user';
import { afterCursor, type Page, pageOf } from '../common/keyset';
import { ScreeningModel } from '../screenings/screening.model';
import { YardModel } from '../yards/yard.model';
import type { RationListQuery } from './ration-list-query';
import { RationModel } from './ration.model';
import { toRationListItem } from './ration.view';
import { RationVersionModel } from './ration-version.model';

type Request = { user: CurrentUser; query: RationListQuery };

/** Rations with their newest version, newest saved first, in one query however many there are. */
@Injectable()
export class RationList {
  async page({ user, query }: Request): Promise<Page<RationListItem>> {
    const { limit, cursor, state, yardId } = query;
    const rows = await RationVersionModel.findAll({
      where: {
        firmId: user.firmId,
        isNewest: true,
        ...(state === undefined ? {} : { state }),
        ...afterCursor(cursor, { column: 'savedAt', direction: 'DESC' }),
      },
      include: [
        {
          model: RationModel,
          required: true,
          where: { firmId: user.firmId, yardId: [...user.yardIds] },
          include: [{ model: YardModel, required: true, ...(yardId === undefined ? {} : { where: { uuid: yardId } }) }],
        },
        { model: ScreeningModel, attributes: ['verdict', 'signOff', 'sulfurPctDm'] },
      ],
      order: [
        ['savedAt', 'DESC'],
        ['id', 'DESC'],
      ],
      limit: limit + 1,
    });
    return pageOf(rows, limit, {
      toItem: toRationListItem,
      position: (row) => ({ at: row.savedAt.toISOString(), id: row.id }),
    });
  }
}
