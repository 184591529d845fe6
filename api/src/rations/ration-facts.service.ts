import { createHash } from 'node:crypto';
import { NEWEST_EDITION } from '@brimgate/reference-tables';
import {
  assembleScreeningRequest,
  canonicalJson,
  contentText,
  RationContent,
  type RationDraft,
  type ScreeningRequest,
  type WaterAnalysisFacts,
} from '@brimgate/rules';
import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import * as v from 'valibot';
import type { CurrentUser } from '../common/current-user';
import type { FieldError } from '../common/domain-error';
import { fieldErrors } from '../common/valid.pipe';
import { FeedstuffFactsService } from '../feedstuffs/feedstuff-facts.service';
import { type AnalysedWater, WaterFactsService } from '../water/water-facts.service';
import type { YardModel } from '../yards/yard.model';
import { RationContentInvalid } from './ration.errors';

type Draft = { user: CurrentUser; yardId: number; draft: RationDraft };
type Content = { user: CurrentUser; yard: YardModel; content: RationDraft };

export type ResolvedRation = { request: ScreeningRequest; contentHash: string; requestHash: string };

const sha256 = (text: string) => createHash('sha256').update(text).digest('hex');

/** Waters come resolved to mg/L, with what lies below the laboratory's bound standing at the bound. */
function asAnalysis({ id, name, sulfate, nitrate, totalDissolvedSolidsMgPerL }: AnalysedWater): WaterAnalysisFacts {
  const entered = { unit: 'mg/L', qualifier: null } as const;
  return {
    id,
    waterSource: { id, name },
    sulfate: sulfate ? { value: sulfate.value, as: sulfate.as, ...entered } : null,
    nitrate: nitrate ? { ...nitrate, ...entered } : null,
    totalDissolvedSolidsMgPerL: totalDissolvedSolidsMgPerL ?? null,
  };
}

/** Turns what a ration refers to into the figures it is screened with. */
@Injectable()
export class RationFacts {
  constructor(
    private readonly feedstuffs: FeedstuffFactsService,
    private readonly water: WaterFactsService,
  ) {}

  /** Refuses a draft that refers to feedstuffs or waters that are not there for this yard, all of them at once. */
  async assertKnown({ user, yardId, draft }: Draft, transaction: Transaction): Promise<void> {
    const { errors } = await this.look({ user, yardId, draft }, transaction);
    if (errors.length > 0) throw new RationContentInvalid(errors);
  }

  /** The request to screen, with the hashes that name its content and itself; throws with every fault named. */
  async resolve({ user, yard, content }: Content, transaction: Transaction): Promise<ResolvedRation> {
    const parsed = v.safeParse(RationContent, content);
    if (!parsed.success) throw new RationContentInvalid(fieldErrors(parsed.issues));
    const { feedstuffs, waters, errors } = await this.look({ user, yardId: yard.id, draft: content }, transaction);
    if (errors.length > 0) throw new RationContentInvalid(errors);
    const { request, problems } = assembleScreeningRequest({
      content: parsed.output,
      feedstuffs: [...feedstuffs.values()],
      waters: [...waters.values()].map(asAnalysis),
      yard,
      edition: NEWEST_EDITION,
    });
    if (problems !== null) throw new RationContentInvalid([...problems]);
    return {
      request,
      contentHash: sha256(contentText(request)),
      requestHash: sha256(canonicalJson(request)),
    };
  }

  private async look({ user, yardId, draft }: Draft, transaction: Transaction) {
    const feedstuffIds = draft.lines.flatMap(({ feedstuffId }) => feedstuffId ?? []);
    const analysisIds = draft.waters.flatMap(({ waterAnalysisId }) => waterAnalysisId ?? []);
    const feedstuffs = await this.feedstuffs.resolveFeedstuffs(transaction, user, feedstuffIds);
    const waters = await this.water.resolveWaterAnalyses(transaction, user, yardId, analysisIds);
    const errors: FieldError[] = [
      ...draft.lines.flatMap(({ feedstuffId }, index) =>
        feedstuffId === undefined || feedstuffs.has(feedstuffId)
          ? []
          : {
              path: `lines.${index}.feedstuffId`,
              message: 'This feedstuff is neither in the book nor one of your firm',
            },
      ),
      ...draft.waters.flatMap(({ waterAnalysisId }, index) =>
        waterAnalysisId === undefined || waters.has(waterAnalysisId)
          ? []
          : { path: `waters.${index}.waterAnalysisId`, message: 'This is not a water analysis of this yard' },
      ),
    ];
    return { feedstuffs, waters, errors };
  }
}
