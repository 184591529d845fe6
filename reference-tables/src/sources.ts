import * as v from 'valibot';
import sourceList from '../sources.json';
import { SourceList, type Source } from './source.schema';

const parsed = v.parse(SourceList, sourceList);

export const sources: Readonly<Record<string, Source>> = Object.fromEntries(
  parsed.map((source) => [source.id, source]),
);

/** The document behind a sourceId; also answers for `none`, `definition` and the like, which say what they are. */
export function findSource(id: string): Source {
  const source = sources[id];
  if (!source) throw new Error(`No source "${id}" in sources.json`);
  return source;
}
