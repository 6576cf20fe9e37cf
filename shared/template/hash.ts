import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';
import type { Template } from './template';

/** JSON with the keys of every object in code-unit order and unset ones left out: one text for one content. */
export function canonicalJson(value: unknown): string {
  if (Array.isArray(value)) return `[${value.map((item) => canonicalJson(item ?? null)).join(',')}]`;
  if (value !== null && typeof value === 'object') {
    const entries = Object.entries(value).filter(([, item]) => item !== undefined);
    entries.sort(([a], [b]) => (a < b ? -1 : a > b ? 1 : 0));
    return `{${entries.map(([key, item]) => `${JSON.stringify(key)}:${canonicalJson(item)}`).join(',')}}`;
  }
  return JSON.stringify(value);
}

/** Hex SHA-256 of a value's canonical JSON. */
export function contentHash(value: unknown): string {
  return bytesToHex(sha256(utf8ToBytes(canonicalJson(value))));
}

const hashes = new WeakMap<Template, string>();

/** Hex SHA-256 of a template's content, the same wherever it is loaded. */
export function templateHash(template: Template): string {
  const known = hashes.get(template);
  if (known) return known;
  const hash = contentHash(template);
  hashes.set(template, hash);
  return hash;
}
