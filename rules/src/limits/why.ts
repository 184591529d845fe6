import type { LimitTable } from '@brimgate/reference-tables';
import { displayNumber, readingBeside, readingNumber } from '../quantities/display-number';
import type { ScreeningRequest } from '../screenings/screening-request.schema';
import type { EffectiveLimit } from './effective-limit';
import type { Judgement } from './judgement';
import type { Measurement } from './measurement';
import { joinWords, listMissing } from './missing-words';

export interface WhyFacts {
  readonly subject: string;
  readonly table: LimitTable;
  readonly limit: EffectiveLimit;
  readonly measured: Measurement;
  readonly judgement: Judgement;
  readonly request: ScreeningRequest;
}

/** One sentence, seldom two, with the numbers in it: what was found against which limit, and what weighs most. */
export function whyInWords(facts: WhyFacts): string {
  if (facts.judgement.status === 'undetermined') return undetermined(facts);
  return `${found(facts)}${gradeWords(facts)}.${mostOfIt(facts)}`;
}

const withUnit = (number: string, unit: string): string =>
  unit.startsWith(':') ? `${number}${unit}` : `${number} ${unit}`;

const limitWords = ({ table, limit }: WhyFacts): string =>
  `${withUnit(displayNumber(limit.value), table.unit)} (${limit.label})`;

const boundWord = ({ table }: WhyFacts): string => (table.direction === 'max' ? 'limit' : 'minimum');

function found(facts: WhyFacts): string {
  const { subject, table, limit, measured, judgement } = facts;
  const isMax = table.direction === 'max';
  const show = (value: number) => withUnit(readingBeside(value, limit.value), table.unit);
  const bound = `the ${boundWord(facts)} of ${limitWords(facts)}`;
  if (measured.value === null) {
    const known = isMax ? `at least ${show(measured.atLeast)}` : `at most ${show(measured.atMost)}`;
    const missing = listMissing(measured.missing, facts.request);
    return `${subject} comes to ${known} on what is known, ${isMax ? 'above' : 'below'} ${bound}; missing: ${missing}`;
  }
  const place = {
    over: isMax ? 'above' : 'below',
    near: 'near',
    within: 'within',
    undetermined: 'beside',
  }[judgement.status];
  return `${subject} is ${show(measured.value)}, ${place} ${bound}`;
}

function gradeWords({ judgement, table }: WhyFacts): string {
  if (!judgement.grade) return '';
  return `, and ${judgement.grade.label} (${withUnit(displayNumber(judgement.grade.above), table.unit)})`;
}

function mostOfIt({ measured, judgement, table }: WhyFacts): string {
  if (judgement.status === 'within' || measured.contributors.length < 2 || table.direction === 'min') return '';
  const largest = [...measured.contributors].sort((one, other) => other.value - one.value).slice(0, 2);
  return ` Most of it: ${joinWords(largest.map((part) => `${part.name} ${readingNumber(part.value)}`))}.`;
}

function undetermined(facts: WhyFacts): string {
  const { subject, table, measured, request } = facts;
  const missing =
    measured.missing.length > 0 ? `missing: ${listMissing(measured.missing, request)}` : 'it cannot be formed';
  const floor =
    table.direction === 'max' && measured.atLeast > 0
      ? ` What is known comes to at least ${withUnit(readingNumber(measured.atLeast), table.unit)}, beside`
      : ' It is held against';
  return `${subject} is not determined; ${missing}.${floor} the ${boundWord(facts)} of ${limitWords(facts)}.`;
}
