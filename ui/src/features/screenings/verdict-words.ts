import {
  joinWords,
  listMissing,
  type Finding,
  type FindingStatus,
  type Screening,
  type ScreeningRequest,
} from '@brimgate/rules';
import { formatNumber } from '../../lib/format';
import { decimalsFor, findingFigures } from './finding-figures';
import { inSentence, limitTableOf, ruleTitle } from './rule-words';
import { asksForSignature, gravestFirst, signOffSentences, whoseMatter } from './who-signs';

export interface VerdictWords {
  status: FindingStatus;
  /** Over, and somebody must sign. */
  isLoud: boolean;
  /** The verdict with its numbers. */
  verdict: string;
  /** Who signs. */
  whoSigns: string;
  /** What the verdict leaves out, in small print; '' when nothing. */
  besides: string;
}

/** The verdict of a screening in one sentence, who signs in a second, and what both leave out. Never "safe", never "clear". */
export function verdictWords(screening: Screening, request: ScreeningRequest): VerdictWords {
  const { edition, verdict, signOff } = screening;
  const asked = screening.findings.filter((finding) => finding.applies);
  const deciding = asked.filter((finding) => asksForSignature(whoseMatter(finding, edition)));
  const title = (finding: Finding) => inSentence(ruleTitle(finding.rule, edition));
  const withStatus = (status: FindingStatus) => deciding.filter((finding) => finding.status === status);
  return {
    status: verdict,
    isLoud: verdict === 'over' && asksForSignature(signOff),
    verdict: verdictSentence(verdict, gravestFirst(withStatus(verdict)), title),
    whoSigns: whoSigns(screening, deciding),
    besides: besides(verdict, asked, deciding, title, request),
  };
}

function verdictSentence(
  verdict: FindingStatus,
  findings: readonly Finding[],
  title: (finding: Finding) => string,
): string {
  if (verdict === 'within' || findings.length === 0) return 'Within every limit that somebody would have to sign for.';
  if (verdict === 'undetermined') return `Not determined: ${joinWords(findings.map(title))}.`;
  const opening = verdict === 'over' ? 'Over on' : 'Within the limits, but near on';
  const [first, ...others] = findings;
  if (first && others.length === 0) {
    const { value, limit } = findingFigures(first);
    return `${opening} ${title(first)}: ${[value, limit].filter(Boolean).join(', ')}.`;
  }
  return `${opening} ${joinWords(findings.map((finding) => `${title(finding)} (${findingFigures(finding).pair})`))}.`;
}

/** Above a grade the grade is named: it is why somebody else signs than the limit alone would ask. */
function whoSigns(screening: Screening, deciding: readonly Finding[]): string {
  const { signOff, edition } = screening;
  if (signOff !== 'veterinarian') return signOffSentences[signOff];
  for (const finding of gravestFirst(deciding).filter((candidate) => candidate.signOff === 'veterinarian')) {
    const value = finding.value ?? finding.atLeast;
    if (finding.status !== 'over' || value === null) continue;
    const grades = limitTableOf(finding.rule, edition)?.grades ?? [];
    const reached = grades.filter((grade) => grade.signOff === 'veterinarian' && value > grade.above).at(-1);
    if (!reached) continue;
    const line = formatNumber(reached.above, decimalsFor(reached.above));
    const everyTime = reached.standingAllowed ? '' : ', every time';
    const isOnlyOne = deciding.filter((other) => other.status === 'over').length === 1;
    const subject = isOnlyOne ? 'Above' : `${ruleTitle(finding.rule, edition)} above`;
    return `${subject} ${line}${isOnlyOne ? '' : ':'} the veterinarian signs${everyTime}.`;
  }
  return signOffSentences.veterinarian;
}

function besides(
  verdict: FindingStatus,
  asked: readonly Finding[],
  deciding: readonly Finding[],
  title: (finding: Finding) => string,
  request: ScreeningRequest,
): string {
  const undetermined = asked.filter((finding) => finding.status === 'undetermined');
  const noticed = asked.filter((finding) => finding.status === 'over' && !deciding.includes(finding));
  const near = deciding.filter((finding) => finding.status === 'near');
  const withReason = (finding: Finding) =>
    finding.missing.length > 0
      ? `${title(finding)} (missing: ${listMissing(finding.missing, request)})`
      : title(finding);
  return [
    undetermined.length > 0 && `Not determined: ${undetermined.map(withReason).join('; ')}.`,
    noticed.length > 0 &&
      `Over, as a notice only: ${joinWords(noticed.map((finding) => `${title(finding)} (${findingFigures(finding).pair})`))}.`,
    near.length > 0 && verdict !== 'near' && `Near its limit: ${joinWords(near.map(title))}.`,
    asked.some((finding) => finding.status === 'within') && verdict !== 'within' && 'The rest is within its limit.',
  ]
    .filter((part) => part !== false)
    .join(' ');
}
