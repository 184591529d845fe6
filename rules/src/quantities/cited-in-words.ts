import { findSource, type Citation, type ValueStatus } from '@brimgate/reference-tables';

const STATUS_WORDS: Readonly<Record<ValueStatus, string>> = {
  published: 'published',
  derived: 'derived',
  'common-practice': 'common practice of the trade',
  memory: 'from memory, to be checked',
};

const NO_DOCUMENT = 'none';

/** How a value is known, as it stands in brackets behind it: the document's title and year, then the status. */
export function citedInWords({ sourceId, status }: Pick<Citation, 'sourceId' | 'status'>): string {
  if (sourceId === NO_DOCUMENT) return STATUS_WORDS[status];
  const { title, year } = findSource(sourceId);
  return `${year === null ? title : `${title}, ${year}`}; ${STATUS_WORDS[status]}`;
}
