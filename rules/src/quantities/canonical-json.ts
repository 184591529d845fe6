/**
 * A value as canonical JSON text (RFC 8785): members sorted by name, no white space, numbers as ECMAScript prints them.
 *
 * Members without a value are left out, as JSON leaves them out. Numbers must be finite.
 */
export function canonicalJson(value: unknown): string {
  if (Array.isArray(value)) return `[${value.map(canonicalJson).join(',')}]`;
  if (typeof value === 'object' && value !== null) {
    const members = Object.entries(value)
      .filter(([, member]) => member !== undefined)
      .sort(([one], [other]) => (one < other ? -1 : 1))
      .map(([name, member]) => `${JSON.stringify(name)}:${canonicalJson(member)}`);
    return `{${members.join(',')}}`;
  }
  if (typeof value === 'number' && !Number.isFinite(value))
    throw new RangeError('Canonical JSON holds finite numbers only');
  return JSON.stringify(value);
}
