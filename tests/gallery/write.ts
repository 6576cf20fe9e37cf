/** Every named part in both styles at print size, to be looked at: `npm run gallery`. Development only. */
import { mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import type { EngineResult } from '../../shared/engine';
import { runEngine } from '../../shared/engine-run';
import { adviseSheet } from '../../shared/drawing/check/advise-sheet';
import { templateById } from '../../templates';
import { namedParts } from '../corpus/named-parts';
import type { NamedPart } from '../corpus/named-parts';
import { exampleRequest } from './example-request';

const OUTPUT = new URL('../output/', import.meta.url);
const WEIGHTS = [400, 500, 700, 800];
const STYLES = [
  ['iso', 'mm'],
  ['asme', 'in'],
] as const;

const escape = (text: string): string =>
  text.replace(/&/g, '&amp;').replace(/</g, '&lt;').replace(/>/g, '&gt;');

function faces(): string {
  const folder = 'node_modules/@fontsource/jetbrains-mono/files';
  return WEIGHTS.map((weight) => {
    const file = readFileSync(`${folder}/jetbrains-mono-latin-${weight}-normal.woff2`).toString('base64');
    return `@font-face{font-family:"JetBrains Mono";font-weight:${weight};src:url(data:font/woff2;base64,${file})}`;
  }).join('');
}

function list(title: string, lines: readonly string[]): string {
  const items = lines.map((line) => `<li>${escape(line)}</li>`).join('');
  return `<p>${title}: ${lines.length === 0 ? 'none' : ''}</p>${items === '' ? '' : `<ul>${items}</ul>`}`;
}

function entry(name: string, result: EngineResult): { html: string; line: string } {
  if (!result.good) {
    const problems = result.problems.map((p) => `${p.path}: ${p.message}`);
    return {
      html: `<h2>${escape(name)}</h2>${list('Refused', problems)}`,
      line: `${name}: refused: ${problems.join(' ')}`,
    };
  }
  const { sheet, scheme, part, findings, svg, capacity } = result.good;
  const advice = adviseSheet(sheet, scheme, part);
  writeFileSync(new URL(`gallery/${name}.svg`, OUTPUT), svg);
  const html = [
    `<section><h2>${escape(name)}</h2><p>${escape(sheet.choice)}. Route: ${capacity.verdict}.</p>`,
    list(
      'Sheet check',
      findings.map((f) => `${f.rule}: ${f.message}`),
    ),
    list(
      'Advice',
      advice.map((f) => `${f.rule}: ${f.message}`),
    ),
    `${svg}</section>`,
  ].join('\n');
  const told = [...findings, ...advice].map((f) => `\n    ${f.rule}: ${f.message}`).join('');
  const counts = `${findings.length} findings, ${advice.length} advice`;
  return { html, line: `${name}: ${sheet.choice}; ${counts}; route ${capacity.verdict}${told}` };
}

function resultOf(named: NamedPart, style: 'iso' | 'asme', unit: 'mm' | 'in'): EngineResult {
  const family = templateById(named.template);
  if (!family) throw new Error(`No template ${named.template}`);
  return runEngine(exampleRequest(family, style, unit, named.typed, named.entryUnit ?? 'mm'));
}

mkdirSync(new URL('gallery/', OUTPUT), { recursive: true });
const entries = namedParts.flatMap((named) =>
  STYLES.map(([style, unit]) => entry(`${named.name}, ${style} ${unit}`, resultOf(named, style, unit))),
);
const page = `<!doctype html><html lang="en"><meta charset="utf-8"><title>Gallery of named parts</title><style>${faces()}
body{font:14px/1.4 "JetBrains Mono",monospace;margin:24px;font-variant-ligatures:none}h2{margin:32px 0 4px}p{margin:2px 0}
svg{display:block;margin-top:8px;outline:1px solid #b4c1b8}@media print{section{break-after:page}}</style>
<h1>Gallery of named parts</h1>${entries.map(({ html }) => html).join('\n')}</html>`;
writeFileSync(new URL('gallery.html', OUTPUT), page);
for (const { line } of entries) console.log(line);
