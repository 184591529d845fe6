import { sources } from '@brimgate/reference-tables';
import type { Finding, Screening } from '@brimgate/rules';
import { ProvenanceTag } from '../../components/provenance-tag';
import { StatusMark } from '../../components/status-mark';
import { formatNumber } from '../../lib/format';
import { sourceWords } from './finding-detail';
import { chanceInLoads, decimalsFor, findingFigures } from './finding-figures';

import { inSentence, ruleTitle } from './rule-words';
import styles from './screenings.module.css';
import { asksForSignature, findingsByGroup, signOffSentences } from './who-signs';

/** Every finding in words: value, limit and its status, why, what is missing, whose word it stands on. */
export function FindingsList({ screening }: { screening: Screening }) {
  const { edition, findings } = screening;
  const notAsked = findings.filter((finding) => !finding.applies);
  return (
    <>
      <ul className={styles.list}>
        {findingsByGroup(findings, edition).map((finding) => (
          <FindingItem key={finding.rule} finding={finding} edition={edition} />
        ))}
      </ul>
      {notAsked.length > 0 && (
        <p className={styles.small}>
          Not asked of this ration: {notAsked.map((finding) => inSentence(ruleTitle(finding.rule, edition))).join(', ')}
          .
        </p>
      )}
    </>
  );
}

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
