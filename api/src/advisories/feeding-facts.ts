import {
  displayNumber,
  readingNumber,
  type ScreeningRequest,
  type ScreeningTotals,
  type WaterFacts,
} from '@brimgate/rules';

const NOT_DETERMINED = 'not determined';

type FedLine = { feedstuff: string; sharePctDm: string; asFed: string };
type DrunkWater = { name: string; sharePct: string; sulfate: string };

export type FeedingFacts = {
  cattle: string;
  /** What all lines come to, wet and dry. */
  inAll: string;
  drinkingWater: string;
  lines: FedLine[];
  waters: DrunkWater[];
};

type Cattle = ScreeningRequest['cattle'];

const SEX_WORDS: Readonly<Record<NonNullable<Cattle['sex']>, string>> = {
  steer: 'steers',
  heifer: 'heifers',
  bull: 'bulls',
  cow: 'cows',
};

function stageWords({ stage, sex }: Cattle): string {
  if (stage === 'cow-dry') return 'dry cows';
  if (stage === 'cow-lactating') return 'lactating cows';
  return `${stage} ${sex === undefined ? 'cattle' : SEX_WORDS[sex]}`;
}

function cattleWords(cattle: Cattle): string {
  const { bodyWeightKg, entryWeightKg, exitWeightKg } = cattle;
  const weights =
    entryWeightKg !== undefined && exitWeightKg !== undefined
      ? `, fed from ${displayNumber(entryWeightKg)} to ${displayNumber(exitWeightKg)} kg`
      : '';
  return `${stageWords(cattle)} of ${displayNumber(bodyWeightKg)} kg${weights}`;
}

/** As exact as a feed wagon: a tenth of a kilogram, below one kilogram a hundredth. */
const weighed = (kg: number): string => `${kg.toFixed(kg >= 1 ? 1 : 2)} kg`;

function fedLine(line: ScreeningRequest['lines'][number], dryMatterKgPerDay: number | null): FedLine {
  const { dryMatterPctAsFed } = line.composition;
  const isKnown = dryMatterKgPerDay !== null && dryMatterPctAsFed !== undefined;
  return {
    feedstuff: line.feedstuff,
    // As typed: a share is an order, not a result.
    sharePctDm: String(line.sharePctDm),
    asFed: isKnown ? weighed((dryMatterKgPerDay * line.sharePctDm) / dryMatterPctAsFed) : NOT_DETERMINED,
  };
}

function inAllWords({ dryMatterIntakeKgPerDay: dry, asFedKgPerDay: wet }: ScreeningTotals): string {
  if (dry === null) return NOT_DETERMINED;
  const asFed = wet === null ? 'as fed not determined' : `${weighed(wet)} as fed`;
  return `${asFed}, ${displayNumber(dry)} kg of dry matter`;
}

const drunkWater = ({ name, sharePct, sulfate }: WaterFacts): DrunkWater => ({
  name,
  sharePct: String(sharePct),
  sulfate: sulfate === undefined ? NOT_DETERMINED : `${displayNumber(sulfate.value)} mg/L as ${sulfate.as}`,
});

/** What is fed and drunk, to which cattle. Dry matter over its share of the wet feed gives the feed as it is weighed. */
export function feedingFacts(request: ScreeningRequest, totals: ScreeningTotals): FeedingFacts {
  const { dryMatterIntakeKgPerDay, drinkingWaterLitresPerDay } = totals;
  return {
    cattle: cattleWords(request.cattle),
    inAll: inAllWords(totals),
    drinkingWater:
      drinkingWaterLitresPerDay === null
        ? NOT_DETERMINED
        : `${readingNumber(drinkingWaterLitresPerDay)} L a head and day`,
    lines: request.lines.map((line) => fedLine(line, dryMatterIntakeKgPerDay)),
    waters: (request.waters ?? []).map(drunkWater),
  };
}
