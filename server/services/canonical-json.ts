import { createHash } from 'node:crypto';

/**
 * One text for one value, whatever the order its keys were made in: keys sorted by UTF-16 code units, no blanks, numbers
 * as ECMAScript writes them. @see RFC 8785, 3.2
 *
 * @throws TypeError for what JSON cannot say: NaN, infinities, functions
 */
export function canonicalJson(value: unknown): string {
  if (value === null || typeof value === 'boolean' || typeof value === 'string') return JSON.stringify(value);
  if (typeof value === 'number') {
    if (!Number.isFinite(value)) throw new TypeError(`JSON has no ${value}`);
    return JSON.stringify(value);
  }
  // As JSON.stringify does: a hole in a list is null, a member that is undefined is left out.
  if (Array.isArray(value)) return `[${value.map((item) => canonicalJson(item ?? null)).join(',')}]`;
  if (typeof value !== 'object') throw new TypeError(`JSON has no ${typeof value}`);
  const members = Object.entries(value)
    .filter(([, member]) => member !== undefined)
    .sort(([a], [b]) => (a < b ? -1 : 1))
    .map(([name, member]) => `${JSON.stringify(name)}:${canonicalJson(member)}`);
  return `{${members.join(',')}}`;
}

/** SHA-256 of the canonical JSON. */
export function sha256Of(value: unknown): Buffer {
  return createHash('sha256').update(canonicalJson(value), 'utf8').digest();
}
