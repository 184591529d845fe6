import { displayNumber, type ScreeningRequest, type ScreeningTotals, type WaterFacts } from '@brimgate/rules';

const NOT_DETERMINED = 'not determined';

type FedLine = { feedstuff: string; sharePctDm: string; asFedKgPerHead: string };
type DrunkWater = { name: string; sharePct: string; sulfate: string };

export type FeedingFacts = {
  cattle: string;
  dryMatterIntake: string;
  drinkingWater: string;
  lines: FedLine[];
  waters: DrunkWater[];
};

const STAGE_WORDS: Readonly<Record<ScreeningRequest['cattle']['stage'], string>> = {
  receiving: 'receiving cattle',
  growing: 'growing cattle',
  finishing: 'finishing cattle',
  'cow-dry': 'dry cows',
  'cow-lactating': 'lactating cows',
};

function cattleWords({ stage, sex, bodyWeightKg, entryWeightKg, exitWeightKg }: ScreeningRequest['cattle']): string {
  const weights =
    entryWeightKg !== undefined && exitWeightKg !== undefined
      ? `, from ${displayNumber(entryWeightKg)} to ${displayNumber(exitWeightKg)} kg`
      : '';
  return `${STAGE_WORDS[stage]}${sex === undefined ? '' : ` (${sex})`}, ${displayNumber(bodyWeightKg)} kg body weight${weights}`;
}

function fedLine(line: ScreeningRequest['lines'][number], dryMatterKgPerDay: number | null): FedLine {
  const { dryMatterPctAsFed } = line.composition;
  const isKnown = dryMatterKgPerDay !== null && dryMatterPctAsFed !== undefined;
  return {
    feedstuff: line.feedstuff,
    sharePctDm: displayNumber(line.sharePctDm),
    asFedKgPerHead: isKnown ? displayNumber((dryMatterKgPerDay * line.sharePctDm) / dryMatterPctAsFed) : NOT_DETERMINED,
  };
}

const drunkWater = ({ name, sharePct, sulfate }: WaterFacts): DrunkWater => ({
  name,
  sharePct: displayNumber(sharePct),
  sulfate: sulfate === undefined ? NOT_DETERMINED : `${displayNumber(sulfate.value)} mg/L as ${sulfate.as}`,
});

/** What is fed and drunk, to which cattle. Dry matter over its share of the wet feed gives the feed as it is weighed. */
export function feedingFacts(request: ScreeningRequest, totals: ScreeningTotals): FeedingFacts {
  const { dryMatterIntakeKgPerDay, drinkingWaterLitresPerDay } = totals;
  return {
    cattle: cattleWords(request.cattle),
    dryMatterIntake:
      dryMatterIntakeKgPerDay === null ? NOT_DETERMINED : `${displayNumber(dryMatterIntakeKgPerDay)} kg a head and day`,
    drinkingWater:
      drinkingWaterLitresPerDay === null
        ? NOT_DETERMINED
        : `${displayNumber(drinkingWaterLitresPerDay)} L a head and day`,
    lines: request.lines.map((line) => fedLine(line, dryMatterIntakeKgPerDay)),
    waters: (request.waters ?? []).map(drunkWater),
  };
}
