import { sources, tablesOf, type RuleId, type ValueStatus } from '@brimgate/reference-tables';
import { displayNumber, readingBeside, readingNumber, type Finding, type FindingStatus } from '@brimgate/rules';

/** One finding in the words of the mail; every field is text, so that a template only places it. */
export type FindingFacts = {
  title: string;
  /** Told apart without colour: over ◆, near ◐, within ○, not determined ◌. */
  shape: string;
  status: string;
  /** With its unit, as is the limit. */
  value: string;
  limit: string;
  why: string;
  /** Status and document of the limit, as one phrase. */
  source: string;
};

const STATUS_WORDS: Readonly<Record<FindingStatus, string>> = {
  within: 'within',
  near: 'near',
  over: 'over',
  undetermined: 'not determined',
};

const SHAPES: Readonly<Record<FindingStatus, string>> = { within: '○', near: '◐', over: '◆', undetermined: '◌' };

const LIMIT_STATUS_WORDS: Readonly<Record<ValueStatus, string>> = {
  published: 'published',
  derived: 'derived',
  'common-practice': 'common practice',
  memory: 'from memory, to be checked',
};

/** A minimum that is not reached is "under", whatever the rules call it. */
export function statusWord({ status, direction }: Finding): string {
  if (status === null) return 'not asked';
  return status === 'over' && direction === 'min' ? 'under' : STATUS_WORDS[status];
}

export function findingTitle(finding: Pick<Finding, 'rule'>, edition: string): string {
  return tablesOf(edition).limits[finding.rule as RuleId]?.title ?? finding.rule;
}

/** A ratio's unit is part of its number: "3.2:1". */
const isRatio = ({ unit }: Finding) => unit.startsWith(':');
const withUnit = (shown: string, finding: Finding) => `${shown}${isRatio(finding) ? '' : ' '}${finding.unit}`;

function valueText(finding: Finding): string {
  const { value, atLeast, limit } = finding;
  const beside = (known: number) =>
    withUnit(limit === null ? readingNumber(known) : readingBeside(known, limit), finding);
  if (value !== null) return beside(value);
  return atLeast === null ? 'not determined' : `at least ${beside(atLeast)}`;
}

function limitText(finding: Finding): string {
  if (finding.limit === null) return 'none';
  const bound = withUnit(displayNumber(finding.limit), finding);
  return finding.direction === 'min' ? `at least ${bound}` : bound;
}

function sourceText({ basis, limitLocator, limitStatus }: Finding): string {
  // A bound of the firm's or the yard's own says by its locator whose it is.
  if (limitStatus === null) return limitLocator?.replace(/^own limit/, "the firm's own limit") ?? 'of no document';
  const source = sources[basis[0] ?? ''];
  const document = source
    ? [source.title, source.publisher, source.year].filter((part) => part !== null && part !== 'none').join(', ')
    : (limitLocator ?? 'no document');
  return `${LIMIT_STATUS_WORDS[limitStatus]}: ${document}`;
}

export function findingFacts(finding: Finding, edition: string): FindingFacts {
  return {
    title: findingTitle(finding, edition),
    shape: finding.status === null ? '' : SHAPES[finding.status],
    status: statusWord(finding),
    value: valueText(finding),
    limit: limitText(finding),
    why: finding.why,
    source: sourceText(finding),
  };
}
