import { findFeedstuff } from '@brimgate/reference-tables/feedstuffs';
import { nutrientNames, nutrientWords } from '@brimgate/rules';
import { dayInWords } from '../common/day-in-words';
import { type FieldWords, isOpen, type Vocabulary } from './changes';

const written = (label: string, open = 'none'): FieldWords => ({
  label,
  show: (value) => (isOpen(value) ? open : String(value)),
});

const day = (label: string, open = 'none'): FieldWords => ({
  label,
  show: (value) => (isOpen(value) ? open : dayInWords(String(value))),
});

const choice = (label: string, words: Readonly<Record<string, string>>): FieldWords => ({
  label,
  show: (value) => words[String(value)] ?? String(value),
});

const sentenceCase = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);

const bookName = (id: string) => findFeedstuff(id)?.name ?? id;

const analysed: Vocabulary = nutrientNames.map((name) => {
  const { label, unit } = nutrientWords[name];
  return { name, words: written(`${sentenceCase(label)}, ${unit}`, 'not analysed') };
});

/** A firm's own feedstuff; what was analysed stands beside the other fields, a nutrient each. */
export const feedstuffWords: Vocabulary = [
  { name: 'name', words: written('Name') },
  {
    name: 'bookFeedstuffId',
    words: {
      label: 'Stands in for what was not analysed',
      show: (value) => (isOpen(value) ? 'nothing' : `book values of ${bookName(String(value))}`),
    },
  },
  { name: 'analysedOn', words: day('Analysed on', 'not stated') },
  { name: 'laboratory', words: written('Laboratory', 'not stated') },
  { name: 'note', words: written('Note') },
  ...analysed,
];

export const yardWords: Vocabulary = [
  { name: 'name', words: written('Name') },
  { name: 'timeZone', words: written('Time zone') },
  { name: 'advisoryEmail', words: written('Advisories go to') },
  {
    name: 'complianceGate',
    words: choice('Compliance staff sign every version', { true: 'yes', false: 'no' }),
  },
  {
    name: 'capSignOff',
    words: choice('Above a cap', { notice: 'a notice', compliance: "compliance staff's signature" }),
  },
  { name: 'capNitrogenKgPerHead', words: written('Cap on nitrogen excreted, kg per head', 'no cap') },
  { name: 'capPhosphorusKgPerHead', words: written('Cap on phosphorus excreted, kg per head', 'no cap') },
];

/** A lot as its view has it; the yard and the ration fed by name. */
export const lotWords: Vocabulary = [
  { name: 'yard', words: written('Yard') },
  { name: 'name', words: written('Name') },
  { name: 'head', words: written('Head') },
  { name: 'startedOn', words: day('Started on') },
  { name: 'endedOn', words: day('Ended on', 'still on feed') },
  { name: 'entryWeightKg', words: written('Weight in, kg') },
  { name: 'exitWeightKg', words: written('Weight out, kg', 'not weighed') },
  { name: 'weightBasis', words: choice('Weights', { full: 'full', shrunk: 'shrunk' }) },
  { name: 'dryMatterIntakeKgPerDay', words: written('Dry matter intake, kg per head and day', 'not known') },
  { name: 'ration', words: written('Ration fed', 'not known') },
];

export const waterAnalysisWords: Vocabulary = [
  { name: 'samplingPoint', words: written('Sampled at') },
  { name: 'laboratory', words: written('Laboratory') },
  { name: 'treatment', words: written('Treatment') },
  { name: 'sulfate', words: written('Sulfate') },
  { name: 'nitrate', words: written('Nitrate') },
  { name: 'totalDissolvedSolidsMgPerL', words: written('Total dissolved solids, mg/L') },
];
