import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { unpackWoff } from './woff';

export interface Faces {
  regular: Buffer;
  bold: Buffer;
}

const require = createRequire(import.meta.url);
let unpacked: Faces | undefined;

/** The lettering of every sheet, unpacked once. A WOFF 2 face would print nothing at all, without an error. */
export function faces(): Faces {
  unpacked ??= { regular: face(400), bold: face(700) };
  return unpacked;
}

function face(weight: 400 | 700): Buffer {
  const path = require.resolve(`@fontsource/jetbrains-mono/files/jetbrains-mono-latin-${weight}-normal.woff`);
  // Without its substitutions the face has no ligatures: `->` and `--` stay the characters that were typed.
  return unpackWoff(readFileSync(path), ['GSUB']);
}
