import type { FeedstuffListItem } from '../feedstuffs/feedstuff.schema';
import type { YardInput } from '../firms/yard.schema';
import { mgPerLFromPpm } from '../quantities/units';
import type { RationContent } from '../rations/ration.schema';
import type { WaterAnalysisView } from '../water/water.schema';
import { parseScreeningRequest, type ParsedRequest, type RequestProblem } from './request-problems';

export type FeedstuffFacts = Pick<FeedstuffListItem, 'id' | 'name' | 'composition' | 'spread'>;
export type WaterAnalysisFacts = Pick<
  WaterAnalysisView,
  'id' | 'waterSource' | 'sulfate' | 'nitrate' | 'totalDissolvedSolidsMgPerL'
>;
export type YardFacts = Pick<YardInput, 'capNitrogenKgPerHead' | 'capPhosphorusKgPerHead' | 'capSignOff'>;

export interface AssemblyFacts {
  readonly content: RationContent;
  readonly feedstuffs: readonly FeedstuffFacts[];
  readonly waters: readonly WaterAnalysisFacts[];
  readonly yard: YardFacts;
  readonly edition: string;
}

/** Makes a screening request of a ration's content and the facts it names, the same for browser and server. */
export function assembleScreeningRequest(facts: AssemblyFacts): ParsedRequest {
  const { content, edition } = facts;
  const problems: RequestProblem[] = [];
  const lines = linesOf(facts, problems);
  const waters = watersOf(facts, problems);
  if (problems.length > 0) return { request: null, problems };
  return parseScreeningRequest({
    edition,
    cattle: content.cattle,
    lines,
    ...(waters.length > 0 && { waters }),
    ...(content.waterIntake && { waterIntake: content.waterIntake }),
    ...yardCapOf(facts.yard),
  });
}

function linesOf({ content, feedstuffs }: AssemblyFacts, problems: RequestProblem[]) {
  const byId = new Map(feedstuffs.map((feedstuff) => [feedstuff.id, feedstuff]));
  return content.lines.flatMap(({ feedstuffId, sharePctDm }, index) => {
    const feedstuff = byId.get(feedstuffId);
    if (!feedstuff) {
      problems.push({
        path: `lines.${index}.feedstuffId`,
        message: 'This feedstuff is not known here: choose another',
      });
      return [];
    }
    const { name, composition, spread } = feedstuff;
    return [{ feedstuff: name, sharePctDm, composition, spread }];
  });
}

function watersOf({ content, waters }: AssemblyFacts, problems: RequestProblem[]) {
  const byId = new Map(waters.map((analysis) => [analysis.id, analysis]));
  return content.waters.flatMap(({ waterAnalysisId, sharePct }, index) => {
    const analysis = byId.get(waterAnalysisId);
    if (!analysis) {
      const message = 'This water analysis is not known here: choose another';
      problems.push({ path: `waters.${index}.waterAnalysisId`, message });
      return [];
    }
    const { sulfate, nitrate, totalDissolvedSolidsMgPerL: solids } = analysis;
    return [
      {
        name: analysis.waterSource.name,
        sharePct,
        ...(sulfate && { sulfate: { value: mgPerL(sulfate), as: sulfate.as } }),
        ...(nitrate && { nitrate: { value: mgPerL(nitrate), as: nitrate.as } }),
        ...(solids !== null && { totalDissolvedSolidsMgPerL: solids }),
      },
    ];
  });
}

/** A figure reported as below what the laboratory can measure counts as that bound, which never understates it. */
const mgPerL = ({ value, unit }: { value: number; unit: 'mg/L' | 'ppm' }): number =>
  unit === 'ppm' ? mgPerLFromPpm(value) : value;

function yardCapOf({ capNitrogenKgPerHead: nitrogen, capPhosphorusKgPerHead: phosphorus, capSignOff }: YardFacts) {
  if (nitrogen === null && phosphorus === null) return {};
  return {
    yardCap: {
      ...(nitrogen !== null && { nitrogenKgPerHead: nitrogen }),
      ...(phosphorus !== null && { phosphorusKgPerHead: phosphorus }),
      signOff: capSignOff,
    },
  };
}
