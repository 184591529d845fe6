import { sources, tablesOf, type RuleId, type ValueStatus } from '@brimgate/reference-tables';
import { displayNumber, type Finding, type FindingStatus } from '@brimgate/rules';

/** One finding in the words of the mail; every field is text, so that a template only places it. */
export type FindingFacts = {
  title: string;
  /** Told apart without colour: over ◆, near ◐, within ○, not determined ◌. */
  shape: string;
  status: string;
  value: string;
  limit: string;
  unit: string;
  limitStatus: string;
  source: string;
  why: string;
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
const shown = (value: number, finding: Finding) => `${displayNumber(value)}${isRatio(finding) ? finding.unit : ''}`;

function valueText(finding: Finding): string {
  if (finding.value !== null) return shown(finding.value, finding);
  return finding.atLeast === null ? 'not determined' : `at least ${shown(finding.atLeast, finding)}`;
}

function limitText(finding: Finding): string {
  if (finding.limit === null) return 'none';
  return `${finding.direction === 'min' ? 'at least ' : ''}${shown(finding.limit, finding)}`;
}

function sourceText({ basis, limitLocator }: Finding): string {
  const source = sources[basis[0] ?? ''];
  if (!source) return limitLocator ?? 'no document';
  return `${source.title}, ${source.publisher}${source.year === null ? '' : ` ${source.year}`}`;
}

export function findingFacts(finding: Finding, edition: string): FindingFacts {
  return {
    title: findingTitle(finding, edition),
    shape: finding.status === null ? '' : SHAPES[finding.status],
    status: statusWord(finding),
    value: valueText(finding),
    limit: limitText(finding),
    unit: isRatio(finding) ? 'as a ratio' : finding.unit,
    limitStatus: finding.limitStatus === null ? 'not stated' : LIMIT_STATUS_WORDS[finding.limitStatus],
    source: sourceText(finding),
    why: finding.why,
  };
}
