import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { charactersOf } from './character-map';
import { unpackWoff } from './woff';

/** The files the face comes in, each with a part of its characters; the first that has one is used for it. */
export const subsets = ['latin', 'latin-ext', 'greek', 'cyrillic', 'vietnamese', 'cyrillic-ext'] as const;
export type Subset = (typeof subsets)[number];
export type Weight = 400 | 700;

const require = createRequire(import.meta.url);
const unpacked = new Map<string, Buffer>();
const mapped = new Map<Subset, ReadonlySet<number>>();

/** One file of the lettering as sfnt, unpacked once. A WOFF 2 face would print nothing at all, without an error. */
export function face(subset: Subset, weight: Weight): Buffer {
  const name = `jetbrains-mono-${subset}-${weight}-normal.woff`;
  // Without its substitutions the face has no ligatures: `->` and `--` stay the characters that were typed.
  const sfnt =
    unpacked.get(name) ??
    unpackWoff(readFileSync(require.resolve(`@fontsource/jetbrains-mono/files/${name}`)), ['GSUB']);
  unpacked.set(name, sfnt);
  return sfnt;
}

/** What nearly every sheet is lettered with, made ready before the first is asked for. */
export function prepareFaces(): void {
  face('latin', 400);
  face('latin', 700);
  subsetOf('A');
}

/** The file that has a glyph for the character; none has when it is undefined. Both weights have the same. */
export function subsetOf(character: string): Subset | undefined {
  const code = character.codePointAt(0) ?? 0;
  return subsets.find((subset) => charactersIn(subset).has(code));
}

function charactersIn(subset: Subset): ReadonlySet<number> {
  const characters = mapped.get(subset) ?? charactersOf(face(subset, 400));
  mapped.set(subset, characters);
  return characters;
}
