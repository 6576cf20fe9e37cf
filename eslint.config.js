import { dirname, relative, resolve } from 'node:path';
import reactHooks from 'eslint-plugin-react-hooks';
import tseslint from 'typescript-eslint';

/**
 * The house's floors. A file may import what stands on its own floor's list, and nothing else of the project. The first match counts;
 * `types` may be imported as types only. Packages: undefined means any.
 */
const GROUND = ['shared/problem', 'shared/units/', 'shared/geometry/', 'shared/standards/'];
const UP_TO_TEMPLATE = [...GROUND, 'shared/part/', 'shared/template/'];
const UP_TO_SCHEME = [...UP_TO_TEMPLATE, 'shared/scheme/'];
const ENGINE_PACKAGES = ['zod', 'mathjs', '@noble/hashes'];

const FLOORS = [
  { from: 'shared/problem', may: [] },
  { from: 'shared/units/', may: GROUND },
  { from: 'shared/geometry/', may: GROUND },
  { from: 'shared/standards/', may: GROUND },
  { from: 'shared/part/', may: [...GROUND, 'shared/part/'] },
  // A template names the kinds of size it wants shown: the names only.
  { from: 'shared/template/', may: UP_TO_TEMPLATE, types: ['shared/scheme/scheme'] },
  { from: 'shared/scheme/', may: UP_TO_SCHEME },
  { from: 'shared/drawing/', may: [...UP_TO_SCHEME, 'shared/drawing/'] },
  { from: 'shared/route/', may: [...UP_TO_SCHEME, 'shared/route/'] },
  {
    from: 'shared/simulate/',
    may: ['shared/simulate/', 'shared/part/', 'shared/route/rules'],
    types: ['shared/route/route'],
  },
  { from: 'shared/render/', may: [...UP_TO_SCHEME, 'shared/drawing/', 'shared/route/', 'shared/render/'] },
  { from: 'shared/', may: ['shared/', 'templates/'] },
  { from: 'templates/', may: ['templates/', ...UP_TO_TEMPLATE] },
  { from: 'src/components/', may: ['src/components/', 'src/lib/', 'src/engine/', 'shared/'] },
  { from: 'src/lib/', may: ['src/lib/', 'src/engine/', 'shared/', 'templates/'] },
  {
    from: /^src\/features\/[^/]+\//,
    may: ['src/components/', 'src/lib/', 'src/engine/', 'src/revision/', 'src/app/', 'shared/', 'templates/'],
    own: true,
  },
  { from: 'src/', may: ['src/', 'shared/', 'templates/'] },
  { from: 'server/', may: ['server/', 'shared/', 'templates/', 'db/'] },
  { from: 'db/', may: ['db/', 'shared/', 'templates/', 'server/'] },
];

const importDirection = {
  meta: { type: 'problem', schema: [], messages: { wrong: '{{message}}' } },
  create(context) {
    const root = context.cwd;
    const file = relative(root, context.filename).replaceAll('\\', '/');
    const floor = FLOORS.find(({ from }) =>
      from instanceof RegExp ? from.test(file) : file.startsWith(from),
    );
    if (!floor) return {};
    const own = floor.own ? [floor.from.exec(file)[0]] : [];

    function look(node, source, typesOnly) {
      if (typeof source !== 'string') return;
      const message = source.startsWith('.') ? wrongFile(source, typesOnly) : wrongPackage(source);
      if (message) context.report({ node, messageId: 'wrong', data: { message } });
    }
    function wrongFile(source, typesOnly) {
      const target = relative(root, resolve(dirname(context.filename), source)).replaceAll('\\', '/');
      const allowed = [...floor.may, ...own, ...(typesOnly ? (floor.types ?? []) : [])];
      // 'shared/part/' stands for everything in it; a name without the stroke for that file, whatever its ending.
      const held = allowed.some((entry) =>
        entry.endsWith('/') ? `${target}/`.startsWith(entry) : target.replace(/\.\w+$/, '') === entry,
      );
      return held
        ? undefined
        : `${floor.from} may not import ${target}: what is derived is never imported by what it is derived from.`;
    }
    function wrongPackage(source) {
      if (file.startsWith('shared/') || file.startsWith('templates/')) {
        const known = ENGINE_PACKAGES.some((name) => source === name || source.startsWith(`${name}/`));
        return known
          ? undefined
          : `The engine is pure and may not import ${source}; it knows only ${ENGINE_PACKAGES.join(', ')}.`;
      }
      return file.startsWith('src/') && source.startsWith('node:')
        ? `The browser has no ${source}.`
        : undefined;
    }
    return {
      ImportDeclaration: (node) => look(node, node.source.value, isTypesOnly(node)),
      ExportNamedDeclaration: (node) => look(node, node.source?.value, node.exportKind === 'type'),
      ExportAllDeclaration: (node) => look(node, node.source.value, node.exportKind === 'type'),
      ImportExpression: (node) => look(node, node.source.value, false),
      TSImportType: (node) => look(node, node.source?.value ?? node.argument?.literal?.value, true),
    };
  },
};

function isTypesOnly(node) {
  if (node.importKind === 'type') return true;
  return node.specifiers.length > 0 && node.specifiers.every((each) => each.importKind === 'type');
}

/** Names that would make the engine give another answer elsewhere or tomorrow. */
const IMPURE_NAMES = [
  'window', 'document', 'navigator', 'localStorage', 'fetch', 'XMLHttpRequest', 'process', 'Buffer', 'performance', 'crypto',
  'setTimeout', 'setInterval', 'requestAnimationFrame',
]; // prettier-ignore

export default tseslint.config(
  { ignores: ['dist/', 'node_modules/', '.data/', '.cache/', 'coverage/', 'tests/output/', '**/*.d.mts'] },
  { linterOptions: { noInlineConfig: true, reportUnusedDisableDirectives: 'error' } },
  tseslint.configs.recommended,
  {
    files: ['**/*.{ts,tsx,mjs,js}'],
    plugins: { house: { rules: { 'import-direction': importDirection } } },
    rules: {
      'house/import-direction': 'error',
      eqeqeq: 'error',
      'no-var': 'error',
      'prefer-const': 'error',
      'no-console': 'off',
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/ban-ts-comment': [
        'error',
        { 'ts-expect-error': true, 'ts-ignore': true, 'ts-nocheck': true },
      ],
      '@typescript-eslint/no-unused-vars': [
        'error',
        { argsIgnorePattern: '^_', varsIgnorePattern: '^_', ignoreRestSiblings: true },
      ],
      '@typescript-eslint/consistent-type-imports': [
        'error',
        { fixStyle: 'separate-type-imports', disallowTypeAnnotations: false },
      ],
    },
  },
  {
    // Rules that need the types: a promise nobody waits for is the fault the compiler does not see.
    files: ['{db,scripts,server,shared,src,templates,tests}/**/*.{ts,tsx,mjs}', '*.ts'],
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
    rules: {
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/no-misused-promises': [
        'error',
        { checksVoidReturn: { attributes: false, arguments: false } },
      ],
      '@typescript-eslint/await-thenable': 'error',
      '@typescript-eslint/no-unnecessary-type-assertion': 'error',
      '@typescript-eslint/switch-exhaustiveness-check': [
        'error',
        { considerDefaultExhaustiveForUnions: true },
      ],
    },
  },
  {
    files: ['src/**/*.{ts,tsx}'],
    ...reactHooks.configs.flat.recommended,
  },
  {
    files: ['shared/**/*.ts', 'templates/**/*.ts'],
    rules: {
      'no-restricted-globals': ['error', ...IMPURE_NAMES],
      'no-restricted-properties': [
        'error',
        { object: 'Math', property: 'random', message: 'Same values, same sheet: no chance in the engine.' },
        { object: 'Date', property: 'now', message: 'The engine has no clock: a date is handed in.' },
      ],
      'no-restricted-syntax': [
        'error',
        {
          selector: "NewExpression[callee.name='Date'][arguments.length=0]",
          message: 'The engine has no clock: a date is handed in.',
        },
      ],
    },
  },
);
