import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import type { WaterFacts } from '@brimgate/rules';
import type { Transaction } from 'sequelize';
import type { CurrentUser } from '../common/current-user';
import { ofFirm } from '../database/firm-scope';
import { WaterAnalysisModel } from './water-analysis.model';
import { WaterSourceModel } from './water-source.model';

/** What an analysis says of a water; how much of it is drunk is the ration's to say. */
export type AnalysedWater = Omit<WaterFacts, 'sharePct'> & { id: string; sampledOn: string };

/**
 * A figure below what the laboratory can measure counts as the least it can measure: the most it can be.
 * ppm and mg/L are the same in water.
 */
function toAnalysedWater(row: WaterAnalysisModel): AnalysedWater {
  const { sulfateValue, sulfateAs, nitrateValue, nitrateAs, totalDissolvedSolidsMgPerL } = row;
  return {
    id: row.uuid,
    sampledOn: row.sampledOn,
    name: row.waterSource.name,
    ...(sulfateValue !== null && sulfateAs !== null && { sulfate: { value: sulfateValue, as: sulfateAs } }),
    ...(nitrateValue !== null && nitrateAs !== null && { nitrate: { value: nitrateValue, as: nitrateAs } }),
    ...(totalDissolvedSolidsMgPerL !== null && { totalDissolvedSolidsMgPerL }),
  };
}

/** The facts that a ration's waters refer to. */
@Injectable()
export class WaterFactsService {
  constructor(@InjectModel(WaterAnalysisModel) private readonly analyses: typeof WaterAnalysisModel) {}

  /** Analyses of one yard by public id, in one query; one that is unknown or of another yard is not in the answer. */
  async resolveWaterAnalyses(
    transaction: Transaction | null,
    user: Pick<CurrentUser, 'firmId'>,
    yardId: number,
    uuids: readonly string[],
  ): Promise<ReadonlyMap<string, AnalysedWater>> {
    if (uuids.length === 0) return new Map();
    const rows = await this.analyses.findAll({
      where: { ...ofFirm(user), yardId, uuid: [...new Set(uuids)] },
      include: [{ model: WaterSourceModel, attributes: ['name'] }],
      transaction,
    });
    return new Map(rows.map((row) => [row.uuid, toAnalysedWater(row)]));
  }
}
