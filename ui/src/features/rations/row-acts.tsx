import { type ReactNode } from 'react';
import styles from './row-acts.module.css';

interface RowActsProps {
  /** What the row is called when it is read out: "line 2". */
  what: string;
  index: number;
  count: number;
  onMove?: (to: number) => void;
  onRemove: () => void;
}

/** Moving and removing a row: every drag would need a click way anyway, so there is the click way only. */
export function RowActs({ what, index, count, onMove, onRemove }: RowActsProps) {
  return (
    <span className={styles.acts}>
      {onMove && (
        <>
          <Act label={`Move ${what} up`} isOff={index === 0} onClick={() => onMove(index - 1)}>
            <path d="M7 11.5V2.5M3 6.5l4-4 4 4" />
          </Act>
          <Act label={`Move ${what} down`} isOff={index === count - 1} onClick={() => onMove(index + 1)}>
            <path d="M7 2.5v9M3 7.5l4 4 4-4" />
          </Act>
        </>
      )}
      <Act label={`Remove ${what}`} isOff={false} onClick={onRemove}>
        <path d="M3 3l8 8M11 3l-8 8" />
      </Act>
    </span>
  );
}

function Act({
  label,
  isOff,
  onClick,
  children,
}: {
  label: string;
  isOff: boolean;
  onClick: () => void;
  children: ReactNode;
}) {
  return (
    <button type="button" className={styles.act} aria-label={label} title={label} disabled={isOff} onClick={onClick}>
      <svg
        width="14"
        height="14"
        viewBox="0 0 14 14"
        fill="none"
        stroke="currentColor"
        strokeWidth="1.4"
        aria-hidden="true"
      >
        {children}
      </svg>
    </button>
  );
}
