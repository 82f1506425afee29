import next from 'eslint-config-next';
import jsxA11y from 'eslint-plugin-jsx-a11y';
import importX from 'eslint-plugin-import-x';
import tseslint from 'typescript-eslint';

/**
 * Who may import whom: each folder names what it may import directly; what those name follows.
 * The zones below are generated from this table alone.
 */
const layers = {
  'lib/numeric': [],
  'lib/geometry': ['lib/numeric'],
  'lib/kinematics': ['lib/geometry', 'lib/numeric'],
  'lib/clock.ts': [],
  'lib/scene': ['lib/kinematics', 'lib/geometry', 'lib/quantities'],
  'lib/quantities': ['lib/numeric'],
  'lib/marking': ['lib/quantities', 'lib/numeric'],
  'lib/retention': [],
  'lib/template': ['lib/scene', 'lib/kinematics', 'lib/geometry'],
  'lib/policy': [],
  'lib/schemas': ['lib/quantities'],
  'lib/env.ts': [],
  'lib/db': ['lib/env.ts', 'migrations'],
  models: ['lib/db'],
  migrations: ['lib/db'],
  'lib/mail': ['lib/env.ts', 'lib/schemas'],
  'lib/calendar': [],
  'lib/storage': ['lib/env.ts', 'lib/schemas'],
  'lib/jobs': ['lib/env.ts', 'lib/schemas', 'lib/db'],
  'content/exercises': ['lib/marking', 'lib/quantities', 'lib/scene', 'lib/kinematics'],
  'lib/data': [
    'content/exercises',
    'lib/clock.ts',
    'lib/retention',
    'lib/policy',
    'lib/schemas',
    'lib/db',
    'lib/env.ts',
    'models',
    'lib/mail',
    'lib/calendar',
    'lib/storage',
    'lib/jobs',
    'content/lessons',
  ],
  'lib/auth': ['lib/data', 'lib/policy', 'lib/env.ts'],
  'lib/work': ['lib/data', 'lib/mail', 'lib/storage'],
  'lib/browser': ['lib/schemas', 'lib/quantities'],
  'lib/mdx': [],
  components: [
    'lib/scene',
    'lib/kinematics',
    'lib/quantities',
    'lib/schemas',
    'lib/marking',
    'lib/retention',
    'lib/policy',
    'lib/clock.ts',
    'lib/browser',
  ],
};

function reach(folder, seen = new Set()) {
  for (const next of layers[folder] ?? []) {
    if (!seen.has(next)) {
      seen.add(next);
      reach(next, seen);
    }
  }
  return seen;
}

const zones = Object.keys(layers).map((target) => ({
  target: `./${target}`,
  from: '.',
  except: [...new Set([target, ...reach(target), 'node_modules'])].map((path) => `./${path}`),
  message: `${target} may import only what the table in eslint.config.mjs names.`,
}));

const konva = ['konva', 'react-konva'].map((name) => ({
  group: [name, `${name}/*`],
  message: 'Only components/bench imports the canvas.',
}));
const modelsOnly = [
  { group: ['@/models', '@/models/*'], message: 'Only lib/data (and the seed) imports models.' },
];

const config = [
  {
    ignores: [
      '.next/**',
      '.next-test/**',
      '.hornbeam/**',
      '.hornbeam-test/**',
      'coverage/**',
      'next-env.d.ts',
      '**/*.d.mts',
      'node_modules/**',
    ],
  },
  ...next,
  { rules: jsxA11y.flatConfigs.strict.rules },
  {
    files: ['**/*.{ts,tsx,mjs}'],
    plugins: { 'import-x': importX },
    settings: { 'import-x/resolver': { typescript: true, node: true } },
    rules: {
      'import-x/no-restricted-paths': ['error', { basePath: import.meta.dirname, zones }],
      'import-x/no-cycle': ['error', { ignoreExternal: true }],
    },
  },
  {
    files: ['**/*.{ts,tsx}'],
    plugins: { '@typescript-eslint': tseslint.plugin },
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-non-null-assertion': 'error',
      '@typescript-eslint/no-unused-vars': [
        'error',
        { argsIgnorePattern: '^_', varsIgnorePattern: '^_' },
      ],
      '@typescript-eslint/consistent-type-imports': 'error',
    },
  },
  {
    files: ['app/**', 'components/**', 'lib/**', 'content/**'],
    rules: { 'no-restricted-imports': ['error', { patterns: [...konva, ...modelsOnly] }] },
  },
  {
    files: ['components/bench/**'],
    rules: { 'no-restricted-imports': ['error', { patterns: modelsOnly }] },
  },
  {
    files: ['lib/data/**'],
    rules: { 'no-restricted-imports': ['error', { patterns: konva }] },
  },
  {
    files: ['**/*.{ts,tsx}'],
    ignores: ['tests/**', '**/*.data.ts', 'app/**/opengraph-image.tsx'],
    rules: { 'max-lines': ['error', 300] },
  },
];

export default config;
