import { cautionOf, sources, type Caution } from '@brimgate/reference-tables';
import type { Screening } from '@brimgate/rules';
import { ProvenanceTag } from '../../components/provenance-tag';
import styles from './screenings.module.css';

const severityWords = { danger: 'Danger', warning: 'Warning', caution: 'Caution', notice: 'Note' } as const;
const severityOrder = ['danger', 'warning', 'caution', 'notice'] as const;

/** An old screening may name a caution that is worded no more: the others still stand. */
function knownCaution(id: string): Caution[] {
  try {
    return [cautionOf(id)];
  } catch {
    return [];
  }
}

/** The cautions of the findings that are not plainly within their limit, each once, the gravest first. */
export function cautionsOf(screening: Screening): Caution[] {
  const concerning = screening.findings.filter((finding) => finding.applies && finding.status !== 'within');
  const ids = new Set(concerning.flatMap((finding) => finding.cautions));
  return [...ids]
    .flatMap(knownCaution)
    .toSorted((a, b) => severityOrder.indexOf(a.severity) - severityOrder.indexOf(b.severity));
}

/** Severity, what is wrong, what follows, how to avoid it: always in this order. */
export function CautionsList({ screening }: { screening: Screening }) {
  const cautions = cautionsOf(screening);
  if (cautions.length === 0)
    return <p className={styles.quiet}>Every finding is within its limit: none of them carries a caution.</p>;
  return (
    <ul className={styles.list}>
      {cautions.map((caution) => (
        <li key={caution.id}>
          <h3 className={styles.findingTitle}>
            {severityWords[caution.severity]}: {caution.title}
          </h3>
          <p className={styles.why}>
            {caution.whatIsWrong} {caution.whatFollows} {caution.howToAvoid}
          </p>
          <ProvenanceTag
            status={caution.status}
            locator={
              caution.sourceIds
                .slice(1)
                .map((id) => sources[id]?.title ?? id)
                .join('; ') || caution.title
            }
            source={sources[caution.sourceIds[0] ?? ''] ?? null}
            of={`caution ${caution.title}`}
          />
        </li>
      ))}
    </ul>
  );
}
