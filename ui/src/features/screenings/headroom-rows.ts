import type { Finding, FindingStatus, Screening } from '@brimgate/rules';
import type { HeadroomRow } from '../../components/charts/headroom/layout';
import { formatCount } from '../../lib/format';
import { findingFigures } from './finding-figures';
import { inSentence, ruleTitle, shortRuleTitle } from './rule-words';
import { asksForSignature, findingsByGroup, groupTitles, whoseMatter } from './who-signs';

/** As the contract caps it: an amount of nothing against a minimum has no per cent. */
const MOST_PERCENT = 999;

/** A value as per cent of the limit; for a minimum, the limit as per cent of the value. */
function percentOf(value: number, finding: Pick<Finding, 'limit' | 'direction'>): number | null {
  if (finding.limit === null || finding.limit === 0) return null;
  if (finding.direction === 'max') return (100 * value) / finding.limit;
  return value > 0 ? Math.min(MOST_PERCENT, (100 * finding.limit) / value) : MOST_PERCENT;
}

function toRow(finding: Finding, status: FindingStatus, edition: string): HeadroomRow {
  const floor = finding.atLeast === null ? null : percentOf(finding.atLeast, finding);
  // Over, though the value is not known: by the known part, or else somewhere beyond the brim.
  const overBy = status === 'over' ? (floor ?? 100) : null;
  const ends = finding.interval90?.map((end) => percentOf(end, finding)) ?? [];
  const [from, to] = ends.filter((end) => end !== null).toSorted((a, b) => a - b);
  return {
    key: finding.rule,
    label: shortRuleTitle(finding.rule, edition),
    group: groupTitles[whoseMatter(finding, edition)],
    status,
    asksForSignature: asksForSignature(finding.signOff),
    percentOfLimit: status === 'undetermined' ? null : (finding.percentOfLimit ?? overBy),
    floorPercentOfLimit: finding.direction === 'max' ? floor : null,
    intervalPercentOfLimit: from !== undefined && to !== undefined ? [from, to] : null,
    valueText: findingFigures(finding).pair,
  };
}

/** The findings that were asked as rows of the headroom chart, grouped by who signs. */
export const headroomRows = (screening: Screening): HeadroomRow[] =>
  findingsByGroup(screening.findings, screening.edition).flatMap((finding) =>
    finding.status === null ? [] : [toRow(finding, finding.status, screening.edition)],
  );

/** The headroom chart in one sentence. */
export function headroomSentence(screening: Screening): string {
  const asked = screening.findings.filter((finding) => finding.applies);
  const count = (status: FindingStatus) => asked.filter((finding) => finding.status === status);
  const over = count('over');
  const names = over.map((finding) => inSentence(ruleTitle(finding.rule, screening.edition))).join(', ');
  const parts = [
    over.length === 0 ? 'none is over' : `${over.length} over (${names})`,
    `${count('near').length} near`,
    `${count('within').length} within`,
    `${count('undetermined').length} not determined`,
  ];
  return `Of ${formatCount(asked.length, 'limit', 'limits')}: ${parts.join(', ')}.`;
}
