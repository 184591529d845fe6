/** Where a number was cited: the path to it, for a message that finds it again. */
export interface FoundCitation {
  path: string;
  status: string;
  sourceId: string;
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

/** Every object below `value` that names a status and a source, with its path. */
export function everyCitation(value: unknown, path = ''): FoundCitation[] {
  if (Array.isArray(value)) return value.flatMap((item, index) => everyCitation(item, `${path}.${index}`));
  if (!isRecord(value)) return [];
  const below = Object.entries(value).flatMap(([key, item]) => everyCitation(item, path ? `${path}.${key}` : key));
  const { status, sourceId } = value;
  return typeof status === 'string' && typeof sourceId === 'string' ? [{ path, status, sourceId }, ...below] : below;
}
