import { edition202612 } from './edition-2026-12';
import type { Caution } from './caution.schema';
import type { AtomicWeightTable, EnergyTable, GrowthTable, IntakeTable, ProteinTable } from './constant-table.schema';
import type { FinishedHeadTable, NutrientLossTable, RetainedShareTable } from './excretion-table.schema';
import type { FeedingValueTable } from './feeding-value.schema';
import type { LimitTable } from './limit-table.schema';
import type { RuleId } from './rule-ids';
import type { WaterIntakeByClass, WaterIntakeEquation, WaterIntakeFactors } from './water-intake.schema';

/** Everything a screening reckons with, as it stood at one time. */
export interface ReferenceTables {
  readonly edition: string;
  readonly limits: Readonly<Record<RuleId, LimitTable>>;
  readonly waterIntake: {
    readonly 'nrc-winchester-morris-table': WaterIntakeByClass;
    readonly 'winchester-morris-factors': WaterIntakeFactors;
    readonly 'arias-mader-2011-1': WaterIntakeEquation;
    readonly 'arias-mader-2011-2': WaterIntakeEquation;
  };
  readonly excretion: {
    readonly finishedHead: FinishedHeadTable;
    readonly retainedShare: RetainedShareTable;
    readonly losses: NutrientLossTable;
  };
  readonly constants: {
    readonly atomicWeights: AtomicWeightTable;
    readonly protein: ProteinTable;
    readonly energy: EnergyTable;
    readonly growth: GrowthTable;
    readonly intake: IntakeTable;
  };
  readonly cautions: readonly Caution[];
  readonly feedingValues: FeedingValueTable;
}

/** Oldest first. A new edition is one more line here. */
const editions: ReadonlyMap<string, ReferenceTables> = new Map([[edition202612.edition, edition202612]]);

export const editionIds: readonly string[] = [...editions.keys()];

export const NEWEST_EDITION = '2026-12';

export class UnknownEdition extends Error {
  override readonly name = 'UnknownEdition';

  constructor(readonly edition: string) {
    super(`No edition "${edition}" of the reference tables; there is ${editionIds.join(', ')}`);
  }
}

export function tablesOf(edition: string): ReferenceTables {
  const tables = editions.get(edition);
  if (!tables) throw new UnknownEdition(edition);
  return tables;
}

const newestCautions = new Map(tablesOf(NEWEST_EDITION).cautions.map((caution) => [caution.id, caution]));

/** The caution as it is worded today: old screenings name ids, and a better wording helps them too. */
export function cautionOf(id: string): Caution {
  const caution = newestCautions.get(id);
  if (!caution) throw new Error(`No caution "${id}" in cautions/`);
  return caution;
}
