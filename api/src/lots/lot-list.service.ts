import { Id, type LotView } from '@brimgate/rules';
import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import * as v from 'valibot';
import type { CurrentUser } from '../common/current-user';
import { afterCursor, type Page, pageOf } from '../common/keyset';
import { pageEntries } from '../common/page-query';
import { ofYards } from '../database/firm-scope';
import { RationModel } from '../rations/ration.model';
import { ReleaseModel } from '../releases/release.model';
import { YardModel } from '../yards/yard.model';
import { LotNotFound } from './lot.errors';
import { LotModel } from './lot.model';
import { toLotView } from './lot.view';

export const LotListQuery = v.strictObject({ ...pageEntries, yardId: v.optional(Id) });
export type LotListQuery = v.InferOutput<typeof LotListQuery>;

/** What a lot's view needs beside the row itself. */
export const partsOfLot = (yardId?: string) => [
  {
    model: YardModel,
    attributes: ['uuid', 'name'],
    required: true,
    ...(yardId === undefined ? {} : { where: { uuid: yardId } }),
  },
  {
    model: ReleaseModel,
    attributes: ['uuid', 'versionNumber'],
    include: [{ model: RationModel, attributes: ['name'] }],
  },
];

/** Reads lots, newest start first. */
@Injectable()
export class LotList {
  async page({ user, query }: { user: CurrentUser; query: LotListQuery }): Promise<Page<LotView>> {
    const { cursor, limit, yardId } = query;
    const rows = await LotModel.findAll({
      where: { ...ofYards(user), ...afterCursor(cursor, { column: 'startedOn', direction: 'DESC', isTime: false }) },
      include: partsOfLot(yardId),
      order: [
        ['startedOn', 'DESC'],
        ['id', 'DESC'],
      ],
      limit: limit + 1,
    });
    return pageOf(rows, limit, { toItem: toLotView, position: (row) => ({ at: row.startedOn, id: row.id }) });
  }

  async view({ user, lotId }: { user: CurrentUser; lotId: string }, transaction?: Transaction): Promise<LotView> {
    const row = await LotModel.findOne({
      where: { ...ofYards(user), uuid: lotId },
      include: partsOfLot(),
      transaction: transaction ?? null,
    });
    if (!row) throw new LotNotFound();
    return toLotView(row);
  }
}
