import tseslint from 'typescript-eslint';
import importX, { createNodeResolver } from 'eslint-plugin-import-x';
import reactHooks from 'eslint-plugin-react-hooks';

/** Forbids imports of the named packages or folders, with the reason in the message. */
const noImports = (message, ...group) => ({
  'no-restricted-imports': ['error', { patterns: [{ group, message }] }],
});

/** Features of the api in the order in which they may depend on each other: later on earlier. */
const features = [
  'workshop',
  'accounts',
  'riders',
  'bikes',
  'chains',
  'rides',
  'readings',
  'treatments',
  'estimates',
  'plans',
  'calendar',
  'reminders',
  'workload',
  'accuracy',
];

const oneWay = features.slice(0, -1).map((feature, i) => ({
  files: [`apps/api/src/${feature}/**/*.ts`],
  ignores: ['**/*.spec.ts'],
  rules: noImports(
    `${feature} may only use features before it: ${features.join(' <- ')}`,
    ...features.slice(i + 1).map((later) => `**/${later}/*`),
  ),
}));

export default tseslint.config(
  { ignores: ['dist', '.data', '.test', 'coverage', 'apps/web/e2e/results'] },
  ...tseslint.configs.recommended,
  {
    plugins: { 'import-x': importX },
    rules: {
      'import-x/no-cycle': 'error',
      'import-x/no-duplicates': 'error',
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', ignoreRestSiblings: true }],
      '@typescript-eslint/consistent-type-imports': 'off',
      eqeqeq: 'error',
      'max-lines': ['error', { max: 300 }],
    },
    settings: {
      'import-x/resolver-next': [createNodeResolver({ extensions: ['.ts', '.tsx', '.mjs', '.js'] })],
    },
  },
  {
    files: ['**/*.tsx', 'apps/web/**/*.ts'],
    plugins: { 'react-hooks': reactHooks },
    rules: reactHooks.configs.recommended.rules,
  },
  {
    files: ['libs/estimation/**/*.ts', 'libs/contracts/**/*.ts', 'libs/ride-files/**/*.ts'],
    rules: noImports(
      'libraries know nobody: no Nest, TypeORM, React or other libs',
      '@nestjs/*',
      'typeorm',
      'react',
      '@halfpitch/*',
      '**/apps/**',
    ),
  },
  {
    files: ['apps/web/**/*.{ts,tsx}'],
    rules: noImports('web never imports api', '**/api/src/**', '@nestjs/*', 'typeorm'),
  },
  ...oneWay,
  { files: ['jest.config.js'], rules: { '@typescript-eslint/no-require-imports': 'off' } },
);
