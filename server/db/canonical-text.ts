import canonicalize from 'canonicalize';

/** RFC 8785 JSON of a plain value, the form in which documents are stored. */
export function canonicalText(value: object): string {
  const text = canonicalize(value);
  if (text === undefined) throw new Error('a value without JSON form cannot be stored');
  return text;
}
