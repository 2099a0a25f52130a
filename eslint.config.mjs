import expo from 'eslint-config-expo/flat.js';
import tseslint from 'typescript-eslint';

/** What each folder must not reach for: our own folders by path, packages by name. The table stands in DEVELOPERS.md. */
export const DIRECTIONS = [
  {
    folder: 'model',
    never: ['app', 'canvas', 'server', 'db', 'tests', 'assets', 'fonts'],
    packages: ['react', 'react-native', 'express', 'drizzle-orm', 'pg', 'i18next', 'node:*', 'zustand'],
  },
  { folder: 'db', never: ['app', 'canvas', 'server', 'tests'], packages: ['react', 'react-native', 'express'] },
  { folder: 'server', never: ['app', 'canvas', 'tests'], packages: ['react', 'react-native'] },
  { folder: 'canvas', never: ['app', 'server', 'db', 'tests'], packages: ['express', 'drizzle-orm', 'pg', 'node:*'] },
  ...['store', 'tools', 'input', 'actions'].map((part) => ({
    folder: `canvas/${part}`,
    never: ['app', 'server', 'db', 'tests', 'canvas/ui', 'canvas/panels', 'canvas/figures', 'canvas/client'],
    packages: ['react', 'react-dom', 'react-native', 'react-native-*', 'express', 'drizzle-orm', 'pg', 'node:*'],
  })),
  { folder: 'app', never: ['server', 'db', 'tests'], packages: ['express', 'drizzle-orm', 'pg', 'node:*'] },
];

/** zod belongs to the schemas: elsewhere in the model a computation would start to depend on parsing. */
const zodOnly = { group: ['zod', 'zod/*'], message: 'zod stands in model/drawing and model/contracts only.' };
/** A screen never computes: routes may know the contracts' types and nothing else of the model. */
const solvers = [
  'bond',
  'coursing',
  'poles',
  'marks',
  'survey',
  'lines',
  'takeoff',
  'compare',
  'walls',
  'setOut',
].flatMap((part) => [`**/model/${part}`, `**/model/${part}/**`]);

/** @param {{folder: string, never: string[], packages: string[]}} direction */
function directionRules({ folder, never, packages }, extra = []) {
  const names = packages.flatMap((name) => (name.includes('*') ? [name] : [name, `${name}/*`]));
  const patterns = [{ group: names, message: `${folder} must not import this package.` }, ...extra];
  const zones = never.map((from) => ({
    target: `./${folder}`,
    from: `./${from}`,
    message: `${folder} must not import ${from}.`,
  }));
  return {
    'no-restricted-imports': ['error', { patterns }],
    'import/no-restricted-paths': ['error', { zones }],
  };
}

const extras = {
  model: [zodOnly],
  app: [{ group: solvers, message: 'a route composes; it does not compute.' }],
};

const directions = DIRECTIONS.map((direction) => ({
  files: [`${direction.folder}/**/*.{ts,tsx,mjs}`],
  rules: directionRules(direction, extras[direction.folder]),
}));
// The schemas are the model's too, and zod is theirs.
directions.push({ files: ['model/drawing/**/*.ts', 'model/contracts/**/*.ts'], rules: directionRules(DIRECTIONS[0]) });

export default tseslint.config(
  {
    ignores: [
      'node_modules/**',
      'dist/**',
      '.state/**',
      '.expo/**',
      'coverage/**',
      'db/migrations/**',
      'expo-env.d.ts',
    ],
  },
  expo,
  {
    files: ['**/*.{ts,tsx}'],
    rules: {
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/no-explicit-any': 'error',
      'no-restricted-syntax': [
        'error',
        { selector: 'ExportAllDeclaration', message: 'name what is exported.' },
        {
          selector: "CallExpression[callee.object.name='Alert']",
          message: 'Alert does nothing on the web: use ui/Dialog.',
        },
      ],
    },
  },
  {
    files: ['**/*.{ts,tsx}'],
    ignores: ['app/**', '**/*.config.ts', '*.d.ts'],
    rules: {
      'no-restricted-exports': ['error', { restrictDefaultExports: { direct: true, named: true, defaultFrom: true } }],
    },
  },
  { files: ['canvas/client/zodEnglish.ts', 'canvas/client/*Without.ts'], rules: { 'no-restricted-exports': 'off' } },
  {
    files: ['model/**/*.ts'],
    rules: {
      'no-restricted-globals': [
        'error',
        'window',
        'document',
        'process',
        'setTimeout',
        'fetch',
        'performance',
        'console',
      ],
      'no-restricted-properties': [
        'error',
        { object: 'Math', property: 'random' },
        { object: 'Date', property: 'now' },
      ],
    },
  },
  ...directions,
);
