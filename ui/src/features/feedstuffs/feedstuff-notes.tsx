import { cautionOf } from '@brimgate/reference-tables';
import type { FeedstuffView } from '@brimgate/rules';
import { Section } from '../../components/section';
import { formatDate } from '../../lib/format';
import styles from './feedstuff-notes.module.css';

/** What is worth keeping in mind before it goes into a ration. */
export function FeedstuffNotes({ feedstuff }: { feedstuff: FeedstuffView }) {
  const facts: [string, string | null][] = [
    ['Category', feedstuff.category],
    ['Roughage', feedstuff.roughageNote],
    ['Oil', feedstuff.oil],
    ['Analysed', feedstuff.analysedOn && formatDate(feedstuff.analysedOn)],
    ['Laboratory', feedstuff.laboratory],
    ['Note', feedstuff.note],
  ];
  return (
    <Section title="Keep in mind">
      <dl className={styles.facts}>
        {facts.map(
          ([term, words]) =>
            words && (
              <div key={term}>
                <dt>{term}</dt>
                <dd>{words}</dd>
              </div>
            ),
        )}
      </dl>
      {feedstuff.cautions.length > 0 && (
        <ul className={styles.cautions}>
          {feedstuff.cautions.map((caution) => (
            <li key={caution}>{cautionWords(caution)}</li>
          ))}
        </ul>
      )}
    </Section>
  );
}

/** A caution of the table in its own words; a mark of the feedstuff table as it is written there. */
function cautionWords(id: string): string {
  try {
    const { title, whatFollows, howToAvoid } = cautionOf(id);
    return `${title}: ${whatFollows} ${howToAvoid}`;
  } catch {
    const words = id.replaceAll('-', ' ');
    return words.charAt(0).toUpperCase() + words.slice(1);
  }
}
