import type { LedgerQuery } from '@brimgate/rules';
import { Injectable } from '@nestjs/common';
import { Op } from 'sequelize';
import type { CurrentUser } from '../common/current-user';
import { partsOfLot } from '../lots/lot-list.service';
import { LotModel } from '../lots/lot.model';
import { YardModel } from '../yards/yard.model';
import { LedgerYardNotFound } from './ledger.errors';

export type Period = { user: CurrentUser; yard: YardModel; from: string; to: string };

const ROWS_AT_ONCE = 200;

/** The lots that ended within a period, as they stand: nothing is computed anew. */
@Injectable()
export class LedgerLots {
  async period({ user, query }: { user: CurrentUser; query: LedgerQuery }): Promise<Period> {
    const yard = await YardModel.findOne({ where: { firmId: user.firmId, id: [...user.yardIds], uuid: query.yardId } });
    if (!yard) throw new LedgerYardNotFound();
    return { user, yard, from: query.from, to: query.to };
  }

  /** All of them, a few hundred at a time, by the day they ended. */
  async *each({ user, yard, from, to }: Period): AsyncGenerator<LotModel> {
    let last: LotModel | undefined;
    do {
      const rows: LotModel[] = await LotModel.findAll({
        where: {
          firmId: user.firmId,
          yardId: yard.id,
          [Op.and]: [{ endedOn: { [Op.between]: [from, to] } }, afterLot(last)],
        },
        include: partsOfLot(),
        order: [
          ['endedOn', 'ASC'],
          ['id', 'ASC'],
        ],
        limit: ROWS_AT_ONCE,
      });
      yield* rows;
      last = rows.length === ROWS_AT_ONCE ? rows.at(-1) : undefined;
    } while (last !== undefined);
  }

  /** Which rules and editions the stored figures rest on. */
  async bases({ user, yard, from, to }: Period): Promise<{ rulesVersion: string; edition: string }[]> {
    const rows = await LotModel.findAll({
      attributes: ['rulesVersion', 'edition'],
      where: { firmId: user.firmId, yardId: yard.id, endedOn: { [Op.between]: [from, to] } },
      group: ['rulesVersion', 'edition'],
      order: [
        ['edition', 'ASC'],
        ['rulesVersion', 'ASC'],
      ],
    });
    return rows.map(({ rulesVersion, edition }) => ({ rulesVersion, edition }));
  }
}

function afterLot(last: LotModel | undefined) {
  if (last === undefined) return {};
  return { [Op.or]: [{ endedOn: { [Op.gt]: last.endedOn } }, { endedOn: last.endedOn, id: { [Op.gt]: last.id } }] };
}
