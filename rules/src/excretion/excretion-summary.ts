import { NEWEST_EDITION, tablesOf } from '@brimgate/reference-tables';
import type { LotView } from '../lots/lot.schema';

export const NOT_DETERMINED = 'not determined';

export type SummaryCell = string | number;

/** One column of the nutrient-excretion summary: its heading carries the unit, its source says where it comes from. */
export interface SummaryColumn {
  readonly key: string;
  readonly title: string;
  /** ids in the reference tables' sources; empty for what the yard entered itself. */
  readonly sourceIds: readonly string[];
  readonly cell: (lot: LotView) => SummaryCell;
}

const { constants: finished } = tablesOf(NEWEST_EDITION).excretion.finishedHead;
const { constants: shares } = tablesOf(NEWEST_EDITION).excretion.retainedShare;
const equations = [finished.nitrogenGainCoefficient.sourceId];
const potassiumSources = [shares.potassiumRetainedPctOfIntake.sourceId];

const orNotDetermined = (value: SummaryCell | null): SummaryCell => value ?? NOT_DETERMINED;

const entered = (key: string, title: string, of: (lot: LotView) => SummaryCell | null): SummaryColumn => ({
  key,
  title,
  sourceIds: [],
  cell: (lot) => orNotDetermined(of(lot)),
});

type Nutrient = 'nitrogen' | 'phosphorus' | 'potassium';
type Part = 'intakeKg' | 'retainedKg' | 'excretedKg';

const parts: readonly (readonly [Part, string])[] = [
  ['intakeKg', 'intake'],
  ['retainedKg', 'retained'],
  ['excretedKg', 'excreted'],
];

const symbols: Readonly<Record<Nutrient, string>> = { nitrogen: 'N', phosphorus: 'P', potassium: 'K' };

function balanceColumns(nutrient: Nutrient, sourceIds: readonly string[]): SummaryColumn[] {
  return (['perHead', 'wholeLot'] as const).flatMap((scope) =>
    parts.map(([part, word]) => ({
      key: `${scope}.${nutrient}.${part}`,
      title: `${symbols[nutrient]} ${word}, ${scope === 'perHead' ? 'kg per head' : 'kg whole lot'}`,
      sourceIds,
      cell: (lot: LotView) => orNotDetermined(lot.excretion[scope][nutrient][part]),
    })),
  );
}

/** The columns of the ledger's export in their order. A new column is one line here. */
export const summaryColumns: readonly SummaryColumn[] = [
  entered('yard', 'Yard', (lot) => lot.yard.name),
  entered('lot', 'Lot', (lot) => lot.name),
  entered('head', 'Head', (lot) => lot.head),
  entered('startedOn', 'Started on', (lot) => lot.startedOn),
  entered('endedOn', 'Ended on', (lot) => lot.endedOn),
  entered('daysOnFeed', 'Days on feed', (lot) => lot.daysOnFeed),
  entered('entryWeightKg', 'Entry weight, kg', (lot) => lot.entryWeightKg),
  entered('exitWeightKg', 'Exit weight, kg', (lot) => lot.exitWeightKg),
  entered('weightBasis', 'Weight basis', (lot) => lot.weightBasis),
  entered('dryMatterIntakeKgPerDay', 'Dry matter intake, kg per head and day', (lot) => lot.dryMatterIntakeKgPerDay),
  entered('rationFed', 'Ration fed', (lot) => lot.release?.rationName ?? null),
  entered('rationVersion', 'Ration version', (lot) => lot.release?.versionNumber ?? null),
  ...balanceColumns('nitrogen', equations),
  ...balanceColumns('phosphorus', equations),
  ...balanceColumns('potassium', potassiumSources),
  entered('kind', 'Estimated or measured', () => 'estimated'),
  entered('reasons', 'Why not determined', (lot) => lot.excretion.reasons.join(' ')),
  entered('rulesVersion', 'Rules version', (lot) => lot.rulesVersion),
  entered('edition', 'Edition of the tables', (lot) => lot.edition),
];

export interface ExcretionSummary {
  readonly titles: readonly string[];
  readonly rows: readonly (readonly SummaryCell[])[];
  /** ids of the documents behind the columns, for the footer. */
  readonly sourceIds: readonly string[];
  /** Editions of the tables that the lots were reckoned with, for the footer. */
  readonly editions: readonly string[];
}

/** The summary as a table of stored lots: nothing is reckoned anew, and what is null reads "not determined". */
export function excretionSummary(lots: readonly LotView[]): ExcretionSummary {
  return {
    titles: summaryColumns.map((column) => column.title),
    rows: lots.map((lot) => summaryColumns.map((column) => column.cell(lot))),
    sourceIds: [...new Set(summaryColumns.flatMap((column) => column.sourceIds))],
    editions: [...new Set(lots.map((lot) => lot.edition))].sort(),
  };
}
