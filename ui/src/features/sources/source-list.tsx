import { type Source, sources } from '@brimgate/reference-tables';
import styles from './source-list.module.css';

const byTitle = Object.values(sources).sort((one, other) => one.title.localeCompare(other.title));

export const sourceCount = byTitle.length;

/** Every document a number stands on, and how it was read. */
export function SourceList() {
  return (
    <ul className={styles.list}>
      {byTitle.map((source) => (
        <li key={source.id} id={`source-${source.id}`} className={styles.source}>
          <p className={styles.title}>
            <SourceTitle source={source} />
          </p>
          <p>
            {source.publisher}
            {source.year !== null && `, ${source.year}`}
          </p>
          <p className={styles.read}>{source.howRead}</p>
        </li>
      ))}
    </ul>
  );
}

function SourceTitle({ source }: { source: Source }) {
  if (!source.url) return source.title;
  return (
    <a href={source.url} rel="noreferrer" target="_blank">
      {source.title}
    </a>
  );
}
