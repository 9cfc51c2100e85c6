import js from '@eslint/js';
import { createTypeScriptImportResolver } from 'eslint-import-resolver-typescript';
import importX from 'eslint-plugin-import-x';
import reactHooks from 'eslint-plugin-react-hooks';
import tseslint from 'typescript-eslint';

/** Who may import whom; everything not named here is refused between these folders. */
const sharedArrows = {
  panel: ['panel'],
  electrical: ['electrical'],
  rules: ['rules', 'electrical', 'panel'],
  isolation: ['isolation', 'panel', 'rules'],
  checklist: ['checklist', 'rules', 'isolation', 'panel', 'electrical'],
  job: ['job', 'checklist', 'panel', 'rules', 'isolation', 'electrical'],
  diagram: ['diagram', 'panel', 'electrical', 'isolation'],
  wording: ['wording', 'panel', 'api'],
  api: ['api', 'panel', 'rules', 'isolation', 'checklist', 'job'],
};
const sharedZones = Object.entries(sharedArrows).map(([target, allowed]) => ({
  target: `./shared/${target}`,
  from: './shared',
  except: allowed.map((folder) => `./${folder}`),
  message: `shared/${target} may import only ${allowed.join(', ')}.`,
}));

const features = [
  'device',
  'fieldwork',
  'inspections',
  'jobs',
  'locks',
  'panels',
  'people',
  'records',
  'session',
  'sites',
];
const featureZones = features.map((feature) => ({
  target: `./src/features/${feature}`,
  from: './src/features',
  except: [`./${feature}`],
  message: 'A feature never imports a feature.',
}));

const serverFeatures = [
  'audit',
  'devices',
  'entries',
  'health',
  'jobs',
  'mail',
  'panels',
  'people',
  'records',
  'sessions',
  'sites',
];
const entityZones = serverFeatures.map((feature) => ({
  target: `./server/features/${feature}`,
  from: serverFeatures
    .filter((other) => other !== feature)
    .map((other) => `./server/features/${other}/entity.ts`),
  message: 'An entity never leaves its feature: call its service.',
}));

const zones = [
  { target: './shared', from: ['./src', './server', './tests'], message: 'shared is pure and stands alone.' },
  { target: './src', from: ['./server', './tests'], message: 'The client knows only src and shared.' },
  { target: './server', from: ['./src', './tests'], message: 'The server knows only server and shared.' },
  {
    target: ['./src/components', './src/diagrams', './src/offline', './src/api'],
    from: ['./src/features'],
    message: 'Controls, diagrams, device store and API know no feature.',
  },
  {
    target: ['./src/features', './src/components', './src/diagrams', './src/offline', './src/api'],
    from: './src/app',
    except: ['./paths.ts'],
    message: 'The shell imports features, never the reverse (URLs excepted).',
  },
  { target: './src/components', from: ['./src/offline'], message: 'Controls know no domain.' },
  ...sharedZones,
  ...featureZones,
  ...entityZones,
];

const refuse = (names, message) => ({ patterns: [{ group: names, message }] });

export default tseslint.config(
  { ignores: ['dist*/', 'node_modules/', '.local/', 'coverage/'] },
  js.configs.recommended,
  {
    files: ['**/*.{ts,tsx}'],
    extends: [...tseslint.configs.strictTypeChecked],
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
    plugins: { 'import-x': importX, 'react-hooks': reactHooks },
    settings: {
      'import-x/resolver-next': [createTypeScriptImportResolver({ project: './tsconfig.json' })],
      'import-x/parsers': { '@typescript-eslint/parser': ['.ts', '.tsx'] },
    },
    linterOptions: { reportUnusedDisableDirectives: 'error', noInlineConfig: true },
    rules: {
      ...reactHooks.configs['recommended-latest'].rules,
      'import-x/no-restricted-paths': ['error', { zones }],
      'import-x/no-cycle': ['error', { ignoreExternal: true }],
      'max-lines': ['error', 400],
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/no-import-type-side-effects': 'error',
      '@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true }],
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      // Both read clearly here, and the strict form costs more than it finds.
      '@typescript-eslint/no-confusing-void-expression': 'off',
      // An event handler may be asynchronous.
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: { attributes: false } }],
      '@typescript-eslint/no-non-null-assertion': 'error',
    },
  },
  {
    files: ['shared/**/*.ts'],
    rules: {
      'no-restricted-imports': [
        'error',
        refuse(
          ['node:*', 'react*', 'express*', 'typeorm', 'pg', 'idb'],
          'shared has no framework and no I/O.',
        ),
      ],
      'no-restricted-globals': [
        'error',
        'window',
        'document',
        'fetch',
        'process',
        'performance',
        'crypto',
        'setTimeout',
      ],
      'no-restricted-properties': [
        'error',
        { object: 'Date', property: 'now', message: 'shared has no clock: take the time as a parameter.' },
        { object: 'Math', property: 'random', message: 'shared has no randomness.' },
      ],
    },
  },
  {
    files: ['server/features/**/routes.ts'],
    rules: { 'no-restricted-imports': ['error', refuse(['typeorm', '**/entity'], 'Routes ask services.')] },
  },
  {
    files: ['server/features/**/service.ts'],
    rules: { 'no-restricted-imports': ['error', refuse(['express'], 'Services know no HTTP framework.')] },
  },
  {
    files: ['src/**/*.{ts,tsx}'],
    ignores: ['src/offline/**'],
    rules: {
      'no-restricted-globals': ['error', { name: 'indexedDB', message: 'Only src/offline names it.' }],
    },
  },
  {
    // What a server answers is untyped until a schema reads it; these tests look at single members of it.
    files: ['tests/server/**/*.ts'],
    rules: {
      '@typescript-eslint/no-unsafe-argument': 'off',
      '@typescript-eslint/no-unsafe-assignment': 'off',
      '@typescript-eslint/no-unsafe-call': 'off',
      '@typescript-eslint/no-unsafe-member-access': 'off',
      '@typescript-eslint/no-unsafe-return': 'off',
    },
  },
  { files: ['**/*.{js,mjs}'], languageOptions: { globals: { process: 'readonly', console: 'readonly' } } },
);
