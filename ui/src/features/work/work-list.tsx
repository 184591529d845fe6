import type { WorkGroup, WorkItem } from '@brimgate/rules';
import { Link } from 'react-router-dom';
import { Section } from '../../components/section';
import { statusOf, StatusMark } from '../../components/status-mark';
import { formatAge, formatNumber } from '../../lib/format';
import { brieflyFound, groupWords } from './work-words';
import styles from './work-list.module.css';

interface WorkListProps {
  groups: readonly WorkGroup[];
  /** Where one goes to do it. */
  pathOf: (item: WorkItem) => string;
}

/** What waits, the most pressing group first, each with why and since when. */
export function WorkList({ groups, pathOf }: WorkListProps) {
  return groups
    .filter((group) => group.items.length > 0)
    .map((group) => (
      <Section key={group.key} title={titleOf(group)} aside={groupWords[group.key].aside}>
        <ul className={styles.list}>
          {group.items.map((item) => (
            <li key={`${item.kind} ${item.id}`} className={styles.item}>
              <WorkItemLine item={item} group={group.key} to={pathOf(item)} />
            </li>
          ))}
        </ul>
        {group.total > group.items.length && (
          <p className={styles.more}>and {formatNumber(group.total - group.items.length, 0)} more</p>
        )}
      </Section>
    ));
}

const titleOf = (group: WorkGroup) => `${groupWords[group.key].title}, ${formatNumber(group.total, 0)}`;

/** Signed already, or nothing to sign: what is over is not coloured. */
const nobodySignsIn: ReadonlySet<WorkGroup['key']> = new Set([
  'ready-to-release',
  'recently-released',
  'lots-incomplete',
]);

const asksIn = (group: WorkGroup['key'], status: string) => status === 'over' && !nobodySignsIn.has(group);

function WorkItemLine({ item, group, to }: { item: WorkItem; group: WorkGroup['key']; to: string }) {
  const status = statusOf(item.status);
  return (
    <>
      <p className={styles.title}>
        <Link to={to}>{item.title}</Link>
        <span className={styles.quiet}>{item.yard}</span>
      </p>
      <p className={status ? styles.finding : styles.detail}>
        {status && <StatusMark status={status} asksForSignature={asksIn(group, status)} />}
        <span>{status && group !== 'sent-back' ? brieflyFound(item.detail) : item.detail}</span>
      </p>
      <p className={styles.age}>{ageWords(item, group)}</p>
    </>
  );
}

function ageWords(item: WorkItem, group: WorkGroup['key']): string {
  const age = formatAge(item.since);
  return group === 'recently-released' ? `for ${age}` : `waiting ${age}`;
}
