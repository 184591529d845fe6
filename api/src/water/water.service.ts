import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import {
  displayNumber,
  type WaterAnalysisInput,
  type WaterAnalysisView,
  type WaterSourceInput,
  type WaterSourceView,
} from '@brimgate/rules';
import { literal, Op } from 'sequelize';
import { PersonModel } from '../accounts/person.model';
import { AuditService } from '../audit/audit.service';
import { entered } from '../audit/changes';
import { waterAnalysisWords } from '../audit/field-words';
import type { CurrentUser } from '../common/current-user';
import { dayInWords } from '../common/day-in-words';
import { IdempotencyService } from '../common/idempotency.service';
import { InputInvalid } from '../common/request-errors';
import { TransactionsService } from '../common/transactions.service';
import { DUPLICATE_KEY, errorNumber } from '../database/error-number';
import { ofFirm, ofYards } from '../database/firm-scope';
import { YardModel } from '../yards/yard.model';
import { YardsService } from '../yards/yards.service';
import { WaterAnalysisModel } from './water-analysis.model';
import { toColumns } from './water-analysis.columns';
import { WaterSourceNotFound } from './water.errors';
import { WaterSourceModel } from './water-source.model';
import { toWaterAnalysisView, toWaterSourceView } from './water.view';

const NEWEST_ANALYSES = 20;

@Injectable()
export class WaterService {
  constructor(
    @InjectModel(WaterSourceModel) private readonly sources: typeof WaterSourceModel,
    @InjectModel(WaterAnalysisModel) private readonly analyses: typeof WaterAnalysisModel,
    private readonly yards: YardsService,
    private readonly transactions: TransactionsService,
    private readonly idempotency: IdempotencyService,
    private readonly audit: AuditService,
  ) {}

  /** The waters of one yard, or of all the person's yards, each with its newest analyses: two queries. */
  async list(yardUuid: string | undefined, user: CurrentUser): Promise<{ items: WaterSourceView[]; nextCursor: null }> {
    const where =
      yardUuid === undefined ? ofYards(user) : { ...ofFirm(user), yardId: (await this.yards.find(yardUuid, user)).id };
    const rows = await this.sources.findAll({ where, include: [YardModel], order: [['name', 'ASC']] });
    const analyses = await this.newestAnalyses(
      user.firmId,
      rows.map(({ id }) => id),
    );
    const items = rows.map((row) =>
      toWaterSourceView(
        row,
        analyses.filter(({ waterSourceId }) => waterSourceId === row.id),
      ),
    );
    return { items, nextCursor: null };
  }

  async create(input: WaterSourceInput, user: CurrentUser): Promise<WaterSourceView> {
    try {
      return await this.transactions.run(async (transaction) => {
        const yard = await this.yards.find(input.yardId, user, transaction);
        const row = await this.sources.create(
          {
            uuid: randomUUID(),
            firmId: user.firmId,
            yardId: yard.id,
            name: input.name,
            version: 1,
            createdAt: new Date(),
          },
          { transaction },
        );
        await this.audit.record(transaction, {
          user,
          act: 'water-source-entered',
          sentence: `Entered the water ${row.name} at ${yard.name}`,
          subject: { kind: 'water-source', id: row.uuid, name: row.name },
          yardId: yard.id,
        });
        row.yard = yard;
        return toWaterSourceView(row, []);
      });
    } catch (error) {
      if (errorNumber(error) !== DUPLICATE_KEY) throw error;
      throw new InputInvalid([{ path: 'name', message: 'Another water of this yard has this name' }]);
    }
  }

  /** Enters a laboratory's result, once for a key. */
  addAnalysis(
    { sourceUuid, input, key }: { sourceUuid: string; input: WaterAnalysisInput; key: string },
    user: CurrentUser,
  ): Promise<WaterAnalysisView> {
    const route = `POST /api/water-sources/${sourceUuid.slice(0, 36)}/analyses`;
    return this.idempotency.once({ user, route, key, body: input }, async (transaction) => {
      const source = await this.sources.findOne({ where: { ...ofYards(user), uuid: sourceUuid }, transaction });
      if (!source) throw new WaterSourceNotFound();
      const row = await this.analyses.create(
        {
          ...toColumns(input),
          uuid: randomUUID(),
          firmId: user.firmId,
          yardId: source.yardId,
          waterSourceId: source.id,
          enteredAt: new Date(),
          enteredById: user.personId,
        },
        { transaction },
      );
      await this.audit.record(transaction, {
        user,
        act: 'water-analysis-entered',
        sentence: `Entered an analysis of ${source.name}, sampled on ${dayInWords(input.sampledOn)}`,
        subject: { kind: 'water-analysis', id: row.uuid, name: source.name },
        yardId: source.yardId,
        changes: entered(waterAnalysisWords, {
          ...input,
          sulfate: figureInWords(input.sulfate),
          nitrate: figureInWords(input.nitrate),
        }),
      });
      return toWaterAnalysisView(row, source, user.name);
    });
  }

  private async newestAnalyses(firmId: number, sourceIds: readonly number[]): Promise<WaterAnalysisModel[]> {
    if (sourceIds.length === 0) return [];
    // Numbers from the database, so nothing to escape.
    const ranked = `SELECT id FROM (
      SELECT id, ROW_NUMBER() OVER (PARTITION BY water_source_id ORDER BY sampled_on DESC, id DESC) AS nth
      FROM water_analyses WHERE firm_id = ${Number(firmId)} AND water_source_id IN (${sourceIds.map(Number).join(', ')})
    ) AS ranked WHERE nth <= ${NEWEST_ANALYSES}`;
    return this.analyses.findAll({
      where: { firmId, id: { [Op.in]: literal(`(${ranked})`) } },
      include: [{ model: PersonModel, attributes: ['name'] }],
      order: [
        ['sampledOn', 'DESC'],
        ['id', 'DESC'],
      ],
    });
  }
}

/** As the laboratory printed it: "< 5 mg/L as SO4". */
function figureInWords(figure: WaterAnalysisInput['sulfate'] | WaterAnalysisInput['nitrate']): string | null {
  if (figure === null) return null;
  const { value, unit, qualifier } = figure;
  return `${qualifier === null ? '' : `${qualifier} `}${displayNumber(value)} ${unit} as ${figure.as}`;
}
