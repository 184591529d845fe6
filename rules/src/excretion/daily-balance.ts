import type { ReferenceTables } from '@brimgate/reference-tables';
import { citedInWords } from '../quantities/cited-in-words';
import type { Diet } from '../rations/diet';
import type { CattleInput } from '../screenings/screening-request.schema';
import type { ExcretionEstimate } from '../screenings/screening.schema';
import type { Retention } from './finished-head';
import { nitrogenIntakeKg } from './nitrogen';
import { phosphorusIntakeKg } from './phosphorus';
import { potassiumIntakeKg, potassiumRetained } from './potassium';

export interface DailyBalanceFacts {
  readonly cattle: CattleInput;
  readonly diet: Diet;
  readonly retention: Retention | null;
  readonly daysOnFeed: number | null;
  readonly tables: ReferenceTables;
}

const G_PER_KG = 1000;

/**
 * Excretion of an average day: intake less what stays in the body. [g per head and day]
 *
 * What stays is the finished animal's retention spread over its days, nothing in a dry cow, and not known otherwise: milk
 * and growth without weights are not guessed. Potassium keeps a fixed share of the intake. Shares: excretion/retained-share.
 */
export function dailyBalance(facts: DailyBalanceFacts): {
  perHeadPerDay: ExcretionEstimate['perHeadPerDay'];
  assumptions: readonly string[];
} {
  const { diet, tables } = facts;
  const dryMatterKg = diet.dryMatterIntakeKgPerDay.value;
  const retained = retainedKgPerDay(facts);
  const intakeKg = (pct: number | null, of: (dryMatterKg: number, pct: number) => number) =>
    dryMatterKg === null || pct === null ? null : of(dryMatterKg, pct);
  const nitrogen = intakeKg(diet.crudeProteinPctDm.value, (kg, pct) => nitrogenIntakeKg(kg, pct, tables));
  const phosphorus = intakeKg(diet.phosphorusPctDm.value, phosphorusIntakeKg);
  const potassium = intakeKg(diet.potassiumPctDm.value, potassiumIntakeKg);
  const grams = (intake: number | null, kept: number | null) =>
    intake === null || kept === null ? null : (intake - kept) * G_PER_KG;
  const perHeadPerDay = {
    nitrogenG: grams(nitrogen, retained.nitrogen),
    phosphorusG: grams(phosphorus, retained.phosphorus),
    potassiumG: potassium === null ? null : (potassium - potassiumRetained(potassium, tables)) * G_PER_KG,
  };
  const isKnown = Object.values(perHeadPerDay).some((figure) => figure !== null);
  return { perHeadPerDay: isKnown ? perHeadPerDay : null, assumptions: isKnown ? retained.assumptions : [] };
}

function retainedKgPerDay({ cattle, retention, daysOnFeed, tables }: DailyBalanceFacts) {
  if (retention && daysOnFeed !== null) {
    return {
      nitrogen: retention.nitrogenRetainedKg / daysOnFeed,
      phosphorus: retention.phosphorusRetainedKg / daysOnFeed,
      assumptions: ['Daily excretion is the mean over the days on feed, with this ration fed throughout.'],
    };
  }
  const share = tables.excretion.retainedShare.constants.dryCowRetainedPctOfIntake;
  if (cattle.stage === 'cow-dry' && share.value === 0) {
    return {
      nitrogen: 0,
      phosphorus: 0,
      assumptions: [
        `A dry cow was taken to keep nothing of what she eats (${citedInWords(share)}); the calf she carries is left out.`,
      ],
    };
  }
  return { nitrogen: null, phosphorus: null, assumptions: [] };
}
