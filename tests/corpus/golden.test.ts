import { createHash } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { checkSheet } from '../../shared/drawing/check/check-sheet';
import { renderSvg } from '../../shared/render/svg';
import { namedParts } from './named-parts';
import { sheetOf } from './sheet-of';

/** Goldens change by this flag only: UPDATE_GOLDEN=1. */
const updating = process.env['UPDATE_GOLDEN'] === '1';
const place = (file: string): string => new URL(`../golden/${file}`, import.meta.url).pathname;
const hashFile = place('sheets.json');
const hashes: Record<string, string> = existsSync(hashFile)
  ? (JSON.parse(readFileSync(hashFile, 'utf8')) as Record<string, string>)
  : {};

describe('named parts', () => {
  it.each(namedParts.map((part) => [part.name, part] as const))(
    '%s is clean and as it was',
    (name, named) => {
      const { part, scheme, sheet } = sheetOf(named.template, named.typed, named);
      expect(checkSheet(sheet, scheme, part)).toEqual([]);
      const hash = createHash('sha256').update(JSON.stringify(sheet)).digest('hex');
      const svg = renderSvg(sheet);
      if (updating) {
        hashes[name] = hash;
        writeFileSync(place(`${name}.svg`), svg);
        writeFileSync(hashFile, `${JSON.stringify(hashes, null, 2)}\n`);
      }
      expect(svg).toBe(readFileSync(place(`${name}.svg`), 'utf8'));
      expect(hash).toBe(hashes[name]);
    },
  );
});
