import { Id, type ReleaseView } from '@brimgate/rules';
import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import * as v from 'valibot';
import { AdvisoryModel } from '../advisories/advisory.model';
import type { CurrentUser } from '../common/current-user';
import { afterCursor, type Page, pageOf } from '../common/keyset';
import { pageEntries } from '../common/page-query';
import { ofYards } from '../database/firm-scope';
import { RationModel } from '../rations/ration.model';
import { ScreeningModel } from '../screenings/screening.model';
import { YardModel } from '../yards/yard.model';
import { ReleaseNotFound } from './release.errors';
import { ReleaseModel } from './release.model';
import { toReleaseView } from './release.view';

export const ReleaseListQuery = v.strictObject({ ...pageEntries, yardId: v.optional(Id) });
export type ReleaseListQuery = v.InferOutput<typeof ReleaseListQuery>;

/** Reads releases, newest first. */
@Injectable()
export class ReleaseList {
  async page({ user, query }: { user: CurrentUser; query: ReleaseListQuery }): Promise<Page<ReleaseView>> {
    const { cursor, limit, yardId } = query;
    const rows = await ReleaseModel.findAll({
      where: { ...ofYards(user), ...afterCursor(cursor, { column: 'releasedAt', direction: 'DESC' }) },
      include: partsOf(yardId),
      order: [
        ['releasedAt', 'DESC'],
        ['id', 'DESC'],
      ],
      limit: limit + 1,
    });
    const advisoryIds = await advisoryIdsOf(user, rows);
    return pageOf(rows, limit, {
      toItem: (row) => toReleaseView(row, advisoryIds.get(row.id) ?? null),
      position: (row) => ({ at: row.releasedAt.toISOString(), id: row.id }),
    });
  }

  async view(
    { user, releaseId }: { user: CurrentUser; releaseId: string },
    transaction?: Transaction,
  ): Promise<ReleaseView> {
    const row = await ReleaseModel.findOne({
      where: { ...ofYards(user), uuid: releaseId },
      include: partsOf(undefined),
      transaction: transaction ?? null,
    });
    if (!row) throw new ReleaseNotFound();
    const advisoryIds = await advisoryIdsOf(user, [row], transaction);
    return toReleaseView(row, advisoryIds.get(row.id) ?? null);
  }
}

const partsOf = (yardId: string | undefined) => [
  { model: RationModel, attributes: ['uuid', 'name'] },
  {
    model: YardModel,
    attributes: ['uuid', 'name'],
    required: true,
    ...(yardId === undefined ? {} : { where: { uuid: yardId } }),
  },
  { model: ScreeningModel, attributes: ['uuid'] },
];

async function advisoryIdsOf(
  { firmId }: CurrentUser,
  releases: readonly ReleaseModel[],
  transaction?: Transaction,
): Promise<Map<number, string>> {
  const advisories = await AdvisoryModel.findAll({
    attributes: ['uuid', 'releaseId'],
    where: { firmId, kind: 'release', releaseId: releases.map((release) => release.id) },
    transaction: transaction ?? null,
  });
  return new Map(advisories.map((advisory) => [advisory.releaseId, advisory.uuid]));
}
