import type { FindingStatus } from '@brimgate/rules';
import type { ReactNode } from 'react';
import { StatusIcon } from './status-icon';
import styles from './status-mark.module.css';
import { VisuallyHidden } from './visually-hidden';

export const statusWords: Readonly<Record<FindingStatus, string>> = {
  within: 'within',
  near: 'near',
  over: 'over',
  undetermined: 'not determined',
};

interface StatusMarkProps {
  status: FindingStatus;
  /** What is over is coloured only when somebody must sign. */
  asksForSignature?: boolean;
}

const colour = (status: FindingStatus, asksForSignature: boolean) =>
  asksForSignature && status === 'over' ? styles.asks : undefined;

/** Shape and word of a status. */
export function StatusMark({ status, asksForSignature = false }: StatusMarkProps) {
  return (
    <span className={`${styles.mark} ${styles.nowrap}`}>
      <span className={colour(status, asksForSignature)}>
        <StatusIcon status={status} />
      </span>
      {statusWords[status]}
    </span>
  );
}

/** A text of one's own after the status's shape; the word is there for those who do not see the shape. */
export function StatusText({ status, asksForSignature = false, children }: StatusMarkProps & { children: ReactNode }) {
  return (
    <span className={styles.mark}>
      <span className={colour(status, asksForSignature)}>
        <StatusIcon status={status} />
      </span>
      <span>
        <VisuallyHidden>{statusWords[status]}: </VisuallyHidden>
        {children}
      </span>
    </span>
  );
}

/** A status from the wire, where it is a plain text; null for anything else. */
export const statusOf = (text: string | null | undefined): FindingStatus | null =>
  text !== null && text !== undefined && text in statusWords ? (text as FindingStatus) : null;
