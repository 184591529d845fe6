import { sources } from '@brimgate/reference-tables';
import type { Finding } from '@brimgate/rules';
import { provenanceWords } from '../../components/provenance-tag';
import { StatusMark } from '../../components/status-mark';
import { formatNumber } from '../../lib/format';
import styles from './finding-detail.module.css';
import { chanceInLoads, decimalsFor, findingFigures } from './finding-figures';
import { contributorTitle, ruleTitle } from './rule-words';
import { asksForSignature } from './who-signs';

const MOST_CONTRIBUTORS = 5;

/** One finding in a small window: why, what contributes, which limit, on whose word. */
export function FindingDetail({ finding, edition }: { finding: Finding; edition: string }) {
  const { value, limitInFull } = findingFigures(finding);
  const chance = chanceInLoads(finding.chanceBeyondLimit);
  return (
    <div className={styles.detail}>
      <p className={styles.title}>{ruleTitle(finding.rule, edition)}</p>
      <p>
        {finding.status && <StatusMark status={finding.status} asksForSignature={asksForSignature(finding.signOff)} />}
        {': '}
        {value}
      </p>
      <p>{finding.why}</p>
      {chance && <p>Counting the spread from load to load, {chance}.</p>}
      <Contributors finding={finding} />
      <p className={styles.quiet}>
        {limitInFull === null ? 'No limit applies' : `Limit ${limitInFull}`}
        {finding.limitStatus && `, ${provenanceWords[finding.limitStatus]}`}
        {finding.limitLocator && `: ${finding.limitLocator}`}
      </p>
      <p className={styles.quiet}>{finding.basis.map(sourceWords).join('; ')}</p>
    </div>
  );
}

function Contributors({ finding }: { finding: Finding }) {
  const greatest = finding.contributors.toSorted((a, b) => b.value - a.value).slice(0, MOST_CONTRIBUTORS);
  if (greatest.length === 0) return null;
  const decimals = decimalsFor(finding.limit ?? 1) + 1;
  return (
    <ul className={styles.contributors}>
      {greatest.map((contributor) => (
        <li key={contributor.name}>
          <span>{contributorTitle(contributor.name)}</span>
          <span>{formatNumber(contributor.value, decimals)}</span>
        </li>
      ))}
    </ul>
  );
}

/** A document by title, publisher and year; an id that is not known stands as it is. */
export function sourceWords(sourceId: string): string {
  const source = sources[sourceId];
  if (!source) return sourceId;
  return [source.title, source.publisher, source.year].filter((part) => part !== null).join(', ');
}
