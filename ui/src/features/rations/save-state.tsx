import { Button } from '../../components/button';
import { formatCount, formatTime } from '../../lib/format';
import type { DraftSaver, SaveState as State } from './draft-saver';
import styles from './save-state.module.css';

interface SaveStateProps {
  saver: DraftSaver;
  state: State;
  savedAt: string;
  timeZone: string;
}

/** Whether what is typed is kept: always in sight, told politely to those who listen. */
export function SaveState({ saver, state, savedAt, timeZone }: SaveStateProps) {
  return (
    <span className={styles.state}>
      <span role="status">{saveWords(state, savedAt, timeZone)}</span>
      {state.kind === 'failed' && (
        <Button size="small" onClick={() => saver.retry()}>
          Save again
        </Button>
      )}
    </span>
  );
}

export function saveWords(state: State, savedAt: string, timeZone: string): string {
  switch (state.kind) {
    case 'saved':
      return `saved ${formatTime(savedAt, timeZone)}`;
    case 'typing':
      return 'not saved yet';
    case 'saving':
      return 'saving …';
    case 'held':
      return `not saved: mend ${formatCount(state.faults.length, 'field', 'fields')} first`;
    case 'failed':
      return `not saved: ${state.problem.title.toLowerCase()}; it is still here`;
    case 'conflict':
      return 'not saved: somebody else changed this ration too';
  }
}
