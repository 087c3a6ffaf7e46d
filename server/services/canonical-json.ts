/**
 * One text for one value: keys in the order of their UTF-16 code units, no spaces, numbers as JavaScript writes
 * them (RFC 8785). What is undefined does not exist.
 * @example canonicalJson({ b: 1, a: [2] }) // → '{"a":[2],"b":1}'
 */
export function canonicalJson(value: unknown): string {
  if (Array.isArray(value)) return `[${value.map((entry) => canonicalJson(entry ?? null)).join(',')}]`;
  if (typeof value === 'object' && value !== null) {
    const members = Object.entries(value)
      .filter(([, member]) => member !== undefined)
      .toSorted(([a], [b]) => (a < b ? -1 : 1))
      .map(([key, member]) => `${JSON.stringify(key)}:${canonicalJson(member)}`);
    return `{${members.join(',')}}`;
  }
  return JSON.stringify(value);
}
