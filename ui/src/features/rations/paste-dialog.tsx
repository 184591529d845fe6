import type { FeedstuffListItem } from '@brimgate/rules';
import { useState } from 'react';
import { Button } from '../../components/button';
import { Dialog } from '../../components/dialog';
import { TextArea } from '../../components/text-field';
import { textFromNumber } from '../../lib/form/number-text';
import { formatCount, formatNumber } from '../../lib/format';
import { pastedBlock, type PastedRow } from './paste-block';
import styles from './paste-dialog.module.css';
import type { LineText } from './ration-values';

interface PasteDialogProps {
  initialText: string;
  feedstuffs: readonly FeedstuffListItem[];
  linesLeft: number;
  onClose: () => void;
  onAdd: (lines: LineText[]) => void;
  onReplace: (lines: LineText[]) => void;
}

/** Two columns from a spreadsheet, read back row by row before anything is taken over. */
export function PasteDialog({ initialText, feedstuffs, linesLeft, onClose, onAdd, onReplace }: PasteDialogProps) {
  const [text, setText] = useState(initialText);
  const block = pastedBlock(text, feedstuffs);
  const lines = block.rows.flatMap(({ line }) =>
    line ? [{ feedstuffId: line.feedstuffId, sharePctDm: textFromNumber(line.sharePctDm) }] : [],
  );
  const faulty = block.rows.length - lines.length;
  const nothing = lines.length === 0 ? 'No row can be taken over yet' : null;
  const take = (act: (taken: LineText[]) => void) => {
    act(lines);
    onClose();
  };
  return (
    <Dialog
      isOpen
      onClose={onClose}
      title="Paste from a spreadsheet"
      description="Two columns: the feedstuff as it is named in the list, and its share in % of dry matter. Mend a row here and it is read again."
      actions={
        <>
          <Button onClick={onClose}>Cancel</Button>
          <Button onClick={() => take(onReplace)} disabledReason={nothing}>
            Replace all lines
          </Button>
          <Button
            kind="primary"
            onClick={() => take(onAdd)}
            disabledReason={lines.length > linesLeft ? `Only ${linesLeft} more lines fit` : nothing}
          >
            {lines.length === 0 ? 'Add the lines' : `Add ${formatCount(lines.length, 'line', 'lines')}`}
          </Button>
        </>
      }
    >
      <TextArea
        label="Rows"
        name="pasted"
        rows={8}
        value={text}
        spellCheck={false}
        onChange={(event) => setText(event.target.value)}
      />
      <div role="status" className={styles.summary}>
        {block.rows.length > 0 && summary(lines.length, faulty)}
        {block.heading !== null && ` The heading “${block.heading.replaceAll('\t', ' | ')}” is left out.`}
        {block.note && <p className={styles.fault}>{block.note}</p>}
      </div>
      {block.rows.length > 0 && (
        <ol className={styles.rows} aria-label="Rows as they are read">
          {block.rows.map((row) => (
            <ReadRow key={row.rowNumber} row={row} />
          ))}
        </ol>
      )}
    </Dialog>
  );
}

const summary = (good: number, faulty: number): string =>
  faulty === 0
    ? `${formatCount(good, 'row is', 'rows are')} read.`
    : `${formatCount(good, 'row is', 'rows are')} read, ${formatCount(faulty, 'row has', 'rows have')} a fault and ${faulty === 1 ? 'is' : 'are'} left out.`;

function ReadRow({ row }: { row: PastedRow }) {
  return (
    <li className={styles.row} value={row.rowNumber}>
      {row.line ? (
        <>
          <span>{row.line.feedstuffName}</span>
          <span className={styles.share}>{formatNumber(row.line.sharePctDm, 2)} %</span>
        </>
      ) : (
        <span className={styles.fault}>
          Row {row.rowNumber}: {row.fault}
        </span>
      )}
    </li>
  );
}
