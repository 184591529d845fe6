import { sources } from '@brimgate/reference-tables';
import type { Finding, Screening } from '@brimgate/rules';
import { Disclosure } from '../../components/disclosure';
import { ProvenanceTag } from '../../components/provenance-tag';
import { StatusMark } from '../../components/status-mark';
import { formatNumber } from '../../lib/format';
import { sourceWords } from './finding-detail';
import { chanceInLoads, decimalsFor, findingFigures } from './finding-figures';
import { inSentence, ruleTitle } from './rule-words';
import styles from './screenings.module.css';
import { asksForSignature, gravestFirst, signOffSentences } from './who-signs';

/** Every finding in words: value, limit and its status, why, whose word it stands on. What is within is folded away. */
export function FindingsList({ screening }: { screening: Screening }) {
  const { edition, findings } = screening;
  const notAsked = findings.filter((finding) => !finding.applies);
  const asked = gravestFirst(findings.filter((finding) => finding.applies));
  const within = asked.filter((finding) => finding.status === 'within');
  const others = asked.filter((finding) => finding.status !== 'within');
  return (
    <>
      {others.length > 0 && <FindingItems findings={others} edition={edition} />}
      {within.length > 0 && (
        <Disclosure summary={withinTitle(within.length, others.length)}>
          <FindingItems findings={within} edition={edition} />
        </Disclosure>
      )}
      {notAsked.length > 0 && (
        <p className={styles.small}>
          Not asked of this ration: {notAsked.map((finding) => inSentence(ruleTitle(finding.rule, edition))).join(', ')}
          .
        </p>
      )}
    </>
  );
}

function withinTitle(within: number, others: number): string {
  if (others === 0)
    return within === 1 ? 'The one finding is within its limit' : `All ${within} are within their limits`;
  return within === 1 ? 'One within its limit' : `${within} within their limits`;
}

const FindingItems = ({ findings, edition }: { findings: readonly Finding[]; edition: string }) => (
  <ul className={styles.list}>
    {findings.map((finding) => (
      <FindingItem key={finding.rule} finding={finding} edition={edition} />
    ))}
  </ul>
);

function FindingItem({ finding, edition }: { finding: Finding; edition: string }) {
  const title = ruleTitle(finding.rule, edition);
  const asks = asksForSignature(finding.signOff);
  const chance = chanceInLoads(finding.chanceBeyondLimit);
  return (
    <li>
      <div className={styles.findingHead}>
        <h3 className={styles.findingTitle}>
          {finding.status && <StatusMark status={finding.status} asksForSignature={asks} />} · {title}
        </h3>
        <p className={asks && finding.status === 'over' ? styles.asks : styles.figures}>
          {findingFigures(finding).value}
        </p>
      </div>
      <p className={styles.why}>{finding.why}</p>
      {chance && <p className={styles.why}>Counting the spread from load to load, {chance}.</p>}
      <LimitLine finding={finding} title={inSentence(title)} />
      {asks && <p className={styles.small}>{signOffSentences[finding.signOff]}</p>}
    </li>
  );
}

function LimitLine({ finding, title }: { finding: Finding; title: string }) {
  const { limitInFull } = findingFigures(finding);
  return (
    <p className={styles.small}>
      {limitInFull === null ? 'No limit could be chosen. ' : `Limit ${limitInFull} `}
      {finding.limitStatus && (
        <ProvenanceTag
          status={finding.limitStatus}
          locator={finding.limitLocator ?? 'own limit'}
          source={sources[finding.basis[0] ?? ''] ?? null}
          of={`limit on ${title}`}
        />
      )}
      {finding.markers.map((marker) => (
        <span key={`${marker.value} ${marker.label}`}>
          {' · '}
          {formatNumber(marker.value, decimalsFor(marker.value))} {marker.label}{' '}
          <ProvenanceTag
            status={marker.status}
            locator={marker.label}
            source={sources[marker.basis] ?? null}
            of={`line at ${formatNumber(marker.value, decimalsFor(marker.value))}`}
          />
        </span>
      ))}
      {finding.basis.length > 0 && ` · ${finding.basis.map(sourceWords).join('; ')}`}
    </p>
  );
}
