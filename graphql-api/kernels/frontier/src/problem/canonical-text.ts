/**
 * A document as JSON with sorted keys and no white space: the text a fingerprint is taken of. The same document
 * gives the same text, however its keys were ordered. Hashing is the host's part.
 */
export function canonicalText(value: unknown): string {
  if (Array.isArray(value)) return `[${value.map((element) => canonicalText(element ?? null)).join(',')}]`;
  if (typeof value !== 'object' || value === null) return JSON.stringify(value);
  const entries = Object.entries(value).filter(([, element]) => element !== undefined);
  entries.sort(([one], [other]) => (one < other ? -1 : 1));
  return `{${entries.map(([key, element]) => `${JSON.stringify(key)}:${canonicalText(element)}`).join(',')}}`;
}
