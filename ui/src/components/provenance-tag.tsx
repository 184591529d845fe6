import { Popover } from '@radix-ui/themes';
import type { Source } from '@brimgate/reference-tables';
import type { FigureStatus } from '@brimgate/rules';
import styles from './provenance-tag.module.css';

export const provenanceWords: Readonly<Record<FigureStatus, string>> = {
  published: 'published',
  derived: 'derived',
  'common-practice': 'common practice',
  memory: 'from memory',
  analysis: 'own analysis',
};

const provenanceMeaning: Readonly<Record<FigureStatus, string>> = {
  published: 'The number stands in the document named here.',
  derived: 'Follows from published figures or from stoichiometry, by the steps named here.',
  'common-practice': 'What the trade does; no source was found that a reader could check.',
  memory: 'Known, but not yet found again in a document. Weigh it accordingly.',
  analysis: 'Measured for this firm; the laboratory’s result counts before any book.',
};

interface ProvenanceTagProps {
  status: FigureStatus;
  /** Where in the source: table, page, row. */
  locator: string;
  /** Null where there is none to name. */
  source: Source | null;
  /** What the number is, so that the button can be told from its neighbours: "limit of total sulfur". */
  of?: string;
}

/** How a number is known, in a word; opens its source. */
export function ProvenanceTag({ status, locator, source, of }: ProvenanceTagProps) {
  return (
    <Popover.Root>
      <Popover.Trigger>
        <button type="button" className={styles.tag}>
          {provenanceWords[status]}
          {of && <span className="visually-hidden">: where the {of} comes from</span>}
        </button>
      </Popover.Trigger>
      <Popover.Content className={styles.window} size="2" aria-label={of ? `Source of the ${of}` : 'Source'}>
        <dl className={styles.list}>
          <div>
            <dt>{provenanceWords[status]}</dt>
            <dd>{provenanceMeaning[status]}</dd>
          </div>
          <div>
            <dt>Where</dt>
            <dd>{locator}</dd>
          </div>
          {source && <SourceLines source={source} />}
        </dl>
      </Popover.Content>
    </Popover.Root>
  );
}

function SourceLines({ source }: { source: Source }) {
  return (
    <>
      <div>
        <dt>Source</dt>
        <dd>
          {source.url ? (
            <a href={source.url} rel="noreferrer" target="_blank">
              {source.title}
            </a>
          ) : (
            source.title
          )}
          , {source.publisher}
          {source.year !== null && `, ${source.year}`}
        </dd>
      </div>
      <div>
        <dt>How it was read</dt>
        <dd>{source.howRead}</dd>
      </div>
    </>
  );
}
