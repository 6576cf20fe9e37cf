import { fileURLToPath } from 'node:url';
import { Linter } from 'eslint';
import type { ESLint } from 'eslint';
import tseslint from 'typescript-eslint';
import { describe, expect, it } from 'vitest';
import config from '../../../eslint.config.js';

const project = fileURLToPath(new URL('../../..', import.meta.url));
const house = (config as { plugins?: Record<string, ESLint.Plugin> }[]).find(
  (entry) => entry.plugins?.['house'],
)?.plugins?.['house'];

/** What the house says to that line in that file; empty when it may stand there. */
function said(file: string, line: string): string[] {
  if (!house) throw new Error('The lint settings hold no rules of the house.');
  const linter = new Linter({ configType: 'flat', cwd: project });
  const messages = linter.verify(
    line,
    [
      {
        files: ['**/*.{ts,tsx}'],
        plugins: { house },
        languageOptions: { parser: tseslint.parser },
        rules: { 'house/import-direction': 'error' },
      },
    ],
    { filename: `${project}${file}` },
  );
  return messages.map((message) => message.message);
}

describe('what may import what', () => {
  it.each([
    ['shared/part/body.ts', `import { hexagon } from '../standards/hexagons';`],
    ['shared/scheme/build.ts', `import { radiusAt } from '../part/section';`],
    ['shared/drawing/passes/place.ts', `import { box } from '../geometry/box';`],
    ['shared/drawing/draw.ts', `import type { Scheme } from '../scheme/scheme';`],
    ['shared/simulate/simulate.ts', `import type { Route } from '../route/route';`],
    ['shared/simulate/simulate.ts', `import { ROUTE_RULES } from '../route/rules';`],
    ['shared/template/template.ts', `import { z } from 'zod';`],
    ['shared/engine-run.ts', `import { templateById } from '../templates';`],
    ['src/features/route/route-page.tsx', `import { card } from './card';`],
    ['src/app/router.tsx', `const page = import('../features/route/route-page');`],
    ['server/app.ts', `import { problem } from '../shared/problem';`],
  ])('lets %s say %s', (file, line) => {
    expect(said(file, line)).toEqual([]);
  });

  it.each([
    ['shared/drawing/draw.ts', `import type { Route } from '../route/route';`],
    ['shared/route/plan.ts', `import { drawSheet } from '../drawing/draw';`],
    ['shared/route/plan.ts', `import { simulate } from '../simulate/simulate';`],
    ['shared/part/body.ts', `import type { Scheme } from '../scheme/scheme';`],
    ['shared/standards/tapers.ts', `export { radiusAt } from '../part/section';`],
    ['shared/scheme/build.ts', `export * from '../drawing/sheet';`],
    ['shared/simulate/simulate.ts', `import { planRoute } from '../route/plan';`],
    ['shared/simulate/simulate.ts', `import { formatLength } from '../units/format';`],
    ['shared/simulate/simulate.ts', `import { type Route, emptyRoute } from '../route/route';`],
    ['shared/template/evaluate.ts', `import { SIZE_KINDS } from '../scheme/scheme';`],
    ['shared/render/svg.ts', `import { contract } from '../api/contract';`],
    ['shared/part/volume.ts', `import { readFileSync } from 'node:fs';`],
    ['shared/engine-run.ts', `import { approve } from '../server/services/approve';`],
    ['templates/tapered-handle.ts', `import { planRoute } from '../shared/route/plan';`],
    ['src/features/route/route-page.tsx', `import { list } from '../drawings/list';`],
    ['src/features/route/route-page.tsx', `const list = import('../drawings/list');`],
    ['src/components/stamp.tsx', `import { decide } from '../features/sign-off/decide';`],
    ['src/lib/api/client.ts', `import { buildApp } from '../../../server/app';`],
    ['src/main.tsx', `import { join } from 'node:path';`],
    ['server/app.ts', `import { router } from '../src/app/router';`],
  ])('forbids %s to say %s', (file, line) => {
    expect(said(file, line)).toHaveLength(1);
  });
});
