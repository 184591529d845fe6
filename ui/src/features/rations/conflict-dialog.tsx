import type { FeedstuffListItem, RationView } from '@brimgate/rules';
import { useState } from 'react';
import { Button } from '../../components/button';
import { Dialog } from '../../components/dialog';
import { formatMoment } from '../../lib/format';
import { type Conflict, type ConflictPart, withPart } from './conflict';
import styles from './conflict-dialog.module.css';
import { partLabel, partText } from './conflict-words';
import type { RationValues } from './ration-values';

interface ConflictDialogProps {
  conflicts: readonly Conflict[];
  merged: RationValues;
  current: RationView;
  feedstuffs: readonly FeedstuffListItem[];
  timeZone: string;
  onResolve: (values: RationValues) => void;
}

/** Mine beside theirs, part by part. Nothing is thrown away before somebody has looked at both. */
export function ConflictDialog({ conflicts, merged, current, feedstuffs, timeZone, onResolve }: ConflictDialogProps) {
  const [theirParts, setTheirParts] = useState<readonly ConflictPart[]>([]);
  const nameOf = (id: string) =>
    feedstuffs.find((feedstuff) => feedstuff.id === id)?.name ?? 'a feedstuff that is not in the list';
  const choose = (part: ConflictPart, isTheirs: boolean) =>
    setTheirParts((before) => (isTheirs ? [...before, part] : before.filter((chosen) => chosen !== part)));
  const handleSave = () =>
    onResolve(
      conflicts.reduce(
        (values, { part, theirs }) => (theirParts.includes(part) ? withPart(values, part, theirs) : values),
        merged,
      ),
    );
  return (
    <Dialog
      isOpen
      // It is closed by choosing: what is typed stays in the form behind it either way.
      onClose={() => undefined}
      title="Two people changed this ration"
      description={`${current.savedBy} saved it on ${formatMoment(current.savedAt, timeZone)}. Choose what stands; what only one of you changed is already put together.`}
      actions={
        <Button kind="primary" onClick={handleSave}>
          Save what I chose
        </Button>
      }
    >
      {conflicts.map(({ part, mine, theirs }) => (
        <fieldset key={part} className={styles.part}>
          <legend>{partLabel(part)}</legend>
          <Side
            id={`${part}-mine`}
            part={part}
            whose="Mine"
            text={partText(mine, part, nameOf)}
            isChosen={!theirParts.includes(part)}
            onChoose={() => choose(part, false)}
          />
          <Side
            id={`${part}-theirs`}
            part={part}
            whose={current.savedBy}
            text={partText(theirs, part, nameOf)}
            isChosen={theirParts.includes(part)}
            onChoose={() => choose(part, true)}
          />
        </fieldset>
      ))}
    </Dialog>
  );
}

interface SideProps {
  id: string;
  part: ConflictPart;
  whose: string;
  text: string;
  isChosen: boolean;
  onChoose: () => void;
}

function Side({ id, part, whose, text, isChosen, onChoose }: SideProps) {
  return (
    <div className={styles.choice}>
      <input type="radio" id={id} name={part} checked={isChosen} onChange={onChoose} />
      <label htmlFor={id}>
        <span className={styles.whose}>{whose}</span>
        <span className={styles.text}>{text}</span>
      </label>
    </div>
  );
}
