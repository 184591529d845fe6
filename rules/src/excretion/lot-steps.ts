import type { Citation, Constant, ReferenceTables } from '@brimgate/reference-tables';
import type { ExcretionStep, NutrientBalances } from './lot-excretion.schema';
import type { LotFacts } from './lot-facts';
import { sizeAndGainTerm, type FinishedAnimal } from './retention';

interface StepFacts {
  readonly lot: LotFacts;
  readonly animal: FinishedAnimal | null;
  readonly dryMatterKg: number | null;
  readonly perHead: NutrientBalances;
  readonly tables: ReferenceTables;
}

const nutrients = ['nitrogen', 'phosphorus', 'potassium'] as const;
type Nutrient = (typeof nutrients)[number];

type Step = Omit<ExcretionStep, keyof Citation>;
const massBalance: Citation = { status: 'derived', sourceId: 'none', locator: 'a mass balance' };

const cite = ({ status, sourceId, locator }: Citation): Citation => ({ status, sourceId, locator });
const step = (fields: Step, citation: Citation): ExcretionStep => ({ ...fields, ...cite(citation) });

/** The chain of the calculation, each step with its formula, value and source; steps without a value are left out. */
export function lotSteps(facts: StepFacts): ExcretionStep[] {
  const { animal } = facts;
  return [
    ...(animal && facts.lot.weightBasis === 'shrunk' ? liveWeights(animal, facts.tables) : []),
    ...(animal ? gainAndTerm(animal, facts.tables) : []),
    ...dryMatter(facts),
    ...nutrients.flatMap((nutrient) => nutrientSteps(nutrient, facts)),
  ];
}

function liveWeights(animal: FinishedAnimal, tables: ReferenceTables): ExcretionStep[] {
  const shrink = tables.excretion.finishedHead.constants.shrunkPerLiveWeight;
  const live = (id: string, when: string, value: number) =>
    step(
      { id, title: `Live ${when} weight`, formula: `shrunk ${when} weight ÷ ${shrink.value}`, value, unit: 'kg' },
      shrink,
    );
  return [
    live('live-entry-weight', 'entry', animal.entryWeightKg),
    live('live-exit-weight', 'exit', animal.exitWeightKg),
  ];
}

function gainAndTerm(animal: FinishedAnimal, tables: ReferenceTables): ExcretionStep[] {
  const table = tables.excretion.finishedHead;
  const { metabolicWeightExponent: m, dailyGainExponent: g, shrunkPerLiveWeight: s } = table.constants;
  const gain = animal.exitWeightKg - animal.entryWeightKg;
  const formula =
    `days × (mean weight)^${m.value} × (${animal.standardReferenceWeightKg} ÷ (${s.value} × exit weight))^${m.value} ` +
    `× (daily gain)^${g.value}`;
  return [
    step(
      {
        id: 'gain',
        title: 'Live weight gained',
        formula: 'exit weight − entry weight',
        value: gain,
        unit: 'kg per head',
      },
      massBalance,
    ),
    step({ id: 'x', title: 'Size and gain term X', formula, value: sizeAndGainTerm(animal, table), unit: '1' }, g),
  ];
}

function dryMatter({ dryMatterKg }: StepFacts): ExcretionStep[] {
  if (dryMatterKg === null) return [];
  const fields = { id: 'dry-matter', title: 'Dry matter eaten', formula: 'dry matter intake × days on feed' };
  return [step({ ...fields, value: dryMatterKg, unit: 'kg per head' }, massBalance)];
}

function nutrientSteps(nutrient: Nutrient, { perHead, tables }: StepFacts): ExcretionStep[] {
  const { intakeKg, retainedKg, excretedKg } = perHead[nutrient];
  const kg = (part: string, formula: string, value: number | null, citation: Citation): ExcretionStep[] => {
    const title = `${nutrient.charAt(0).toUpperCase()}${nutrient.slice(1)} ${part}`;
    return value === null
      ? []
      : [step({ id: `${nutrient}-${part}`, title, formula, value, unit: 'kg per head' }, citation)];
  };
  const intake = intakeWords(nutrient, tables);
  const retention = retentionWords(nutrient, tables);
  return [
    ...kg('eaten', intake.formula, intakeKg, intake.citation),
    ...kg('retained', retention.formula, retainedKg, retention.citation),
    ...kg('excreted', `${nutrient} eaten − ${nutrient} retained`, excretedKg, massBalance),
  ];
}

interface Words {
  readonly formula: string;
  readonly citation: Citation;
}

function intakeWords(nutrient: Nutrient, tables: ReferenceTables): Words {
  if (nutrient !== 'nitrogen') return { formula: `dry matter × ${nutrient} content`, citation: massBalance };
  const factor = tables.constants.protein.constants.crudeProteinPerNitrogen;
  return { formula: `dry matter × crude protein ÷ ${factor.value}`, citation: factor };
}

function retentionWords(nutrient: Nutrient, tables: ReferenceTables): Words {
  const c = tables.excretion.finishedHead.constants;
  const equation = (gain: Constant, energy: Constant): Words => ({
    formula: `(${gain.value} × gain − ${energy.value} × X) ÷ 1000`,
    citation: gain,
  });
  if (nutrient === 'nitrogen') return equation(c.nitrogenGainCoefficient, c.nitrogenEnergyCoefficient);
  if (nutrient === 'phosphorus') return equation(c.phosphorusGainCoefficient, c.phosphorusEnergyCoefficient);
  const share = tables.excretion.retainedShare.constants.potassiumRetainedPctOfIntake;
  return { formula: `${share.value} % of potassium eaten`, citation: share };
}
