import { createHash } from 'node:crypto';

/** JSON with sorted keys and no spaces: the same value is the same text, however it was built or stored. */
export function canonicalJson(value: unknown): string {
  return JSON.stringify(value, (_key, inner: unknown) => {
    if (typeof inner !== 'object' || inner === null || Array.isArray(inner)) return inner;
    const entries = Object.entries(inner).sort(([a], [b]) => (a < b ? -1 : a > b ? 1 : 0));
    return Object.fromEntries(entries);
  });
}

/** What a checker approves: SHA-256 over values, part, scheme and route (64 hex digits). */
export function contentHash(content: {
  values: unknown;
  part: unknown;
  scheme: unknown;
  route: unknown;
}): string {
  const { values, part, scheme, route } = content;
  return createHash('sha256').update(canonicalJson({ values, part, scheme, route })).digest('hex');
}
