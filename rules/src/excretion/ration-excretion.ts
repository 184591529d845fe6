import type { ReferenceTables } from '@brimgate/reference-tables';
import { between, exactly, joinMissing, unknown, type BoundedQuantity } from '../quantities/bounded-quantity';
import type { Diet } from '../rations/diet';
import type { CattleInput } from '../screenings/screening-request.schema';
import type { ExcretionEstimate } from '../screenings/screening.schema';
import { dailyBalance } from './daily-balance';
import { finishedAnimalOf, finishedHeadRetention } from './finished-head';
import { nitrogenIntakeKg } from './nitrogen';
import { phosphorusIntakeKg } from './phosphorus';

export interface RationExcretion {
  readonly estimate: ExcretionEstimate;
  readonly nitrogenExcretedKgPerHead: BoundedQuantity;
  readonly phosphorusExcretedKgPerHead: BoundedQuantity;
  readonly assumptions: readonly string[];
}

/**
 * What cattle excrete when they eat this ration all their days on feed. [kg per finished head; g per head and day]
 *
 * Intake less what stays in the body. An estimate: manure records ask for analyses of the manure.
 */
export function rationExcretion(cattle: CattleInput, diet: Diet, tables: ReferenceTables): RationExcretion {
  const finished = finishedAnimalOf(cattle, tables);
  const { animal } = finished;
  const retention = animal ? finishedHeadRetention(animal, tables) : null;
  const dryMatter = diet.dryMatterIntakeKgPerDay;
  const days = animal?.daysOnFeed ?? 0;
  const nitrogen = intakeOver(dryMatter, diet.crudeProteinPctDm, (kg, pct) => nitrogenIntakeKg(kg * days, pct, tables));
  const phosphorus = intakeOver(dryMatter, diet.phosphorusPctDm, (kg, pct) => phosphorusIntakeKg(kg * days, pct));
  const nitrogenExcretedKgPerHead = lessRetained(nitrogen, retention?.nitrogenRetainedKg, finished.missing);
  const phosphorusExcretedKgPerHead = lessRetained(phosphorus, retention?.phosphorusRetainedKg, finished.missing);
  const daily = dailyBalance({ cattle, diet, retention, daysOnFeed: animal?.daysOnFeed ?? null, tables });
  return {
    nitrogenExcretedKgPerHead,
    phosphorusExcretedKgPerHead,
    estimate: {
      perHeadPerDay: daily.perHeadPerDay,
      perFinishedHead: retention && {
        nitrogenIntakeKg: nitrogen.value,
        nitrogenRetainedKg: retention.nitrogenRetainedKg,
        nitrogenExcretedKg: nitrogenExcretedKgPerHead.value,
        phosphorusIntakeKg: phosphorus.value,
        phosphorusRetainedKg: retention.phosphorusRetainedKg,
        phosphorusExcretedKg: phosphorusExcretedKgPerHead.value,
      },
      basis: [tables.excretion.finishedHead.constants.nitrogenGainCoefficient.sourceId],
    },
    assumptions: [...finished.assumptions, ...daily.assumptions],
  };
}

function intakeOver(
  dryMatter: BoundedQuantity,
  content: BoundedQuantity,
  intakeKg: (dryMatterKgPerDay: number, pctDm: number) => number,
): BoundedQuantity {
  if (dryMatter.value === null) return unknown(joinMissing(content.missing, dryMatter.missing));
  const [atLeast, atMost] = [content.atLeast, content.atMost].map((pct) => intakeKg(dryMatter.atLeast, pct)) as [
    number,
    number,
  ];
  return content.value === null ? between({ atLeast, atMost }, content.missing) : exactly(atLeast);
}

function lessRetained(
  intake: BoundedQuantity,
  retainedKg: number | undefined,
  missing: readonly string[],
): BoundedQuantity {
  if (retainedKg === undefined) return unknown(joinMissing(missing, intake.missing));
  if (intake.value !== null) return exactly(intake.value - retainedKg);
  return between(
    { atLeast: Math.max(0, intake.atLeast - retainedKg), atMost: intake.atMost - retainedKg },
    intake.missing,
  );
}
