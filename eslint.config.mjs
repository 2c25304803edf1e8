import hooks from 'eslint-plugin-react-hooks';
import tseslint from 'typescript-eslint';

const purity = [
  {
    selector: "CallExpression[callee.object.name='Date'][callee.property.name='now']",
    message: 'Time comes in as an argument or a port.',
  },
  {
    selector: "CallExpression[callee.object.name='Math'][callee.property.name='random']",
    message: 'Randomness comes in as an argument or a port.',
  },
  {
    selector: "NewExpression[callee.name='Date'][arguments.length=0]",
    message: 'Time comes in as an argument or a port.',
  },
];

export default tseslint.config(
  {
    ignores: [
      '**/dist/**',
      '**/node_modules/**',
      '.data/**',
      '.cache/**',
      '**/*.cjs',
      '**/*.mjs',
      '**/*.js',
      '**/*.d.mts',
      '**/vitest.config.mts',
    ],
  },
  ...tseslint.configs.recommendedTypeChecked,
  {
    languageOptions: {
      parserOptions: {
        project: [
          './tsconfig.tests.json',
          './apps/api/tsconfig.spec.json',
          './apps/web/tsconfig.json',
          './apps/web/src/service-worker/tsconfig.json',
          './apps/e2e/tsconfig.json',
          './tools/simulate/tsconfig.json',
          './tools/bench/phone/tsconfig.json',
        ],
        tsconfigRootDir: import.meta.dirname,
      },
    },
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/ban-ts-comment': 'error',
      '@typescript-eslint/consistent-type-imports': [
        'error',
        { fixStyle: 'separate-type-imports', disallowTypeAnnotations: false },
      ],
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: { attributes: false } }],
      '@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true }],
      'max-lines': ['error', { max: 300 }],
      'no-restricted-properties': [
        'error',
        { object: 'it', property: 'skip' },
        { object: 'it', property: 'only' },
      ],
    },
  },
  {
    files: ['libs/*/src/**/*.ts'],
    ignores: ['**/*.test.ts'],
    rules: { 'no-restricted-syntax': ['error', ...purity] },
  },
  {
    files: ['apps/web/src/**/*.{ts,tsx}'],
    plugins: { 'react-hooks': hooks },
    rules: { 'react-hooks/rules-of-hooks': 'error', 'react-hooks/exhaustive-deps': 'error' },
  },
  {
    files: ['apps/api/**/*.ts'],
    // Nest reads the types of constructor parameters at run time.
    rules: { '@typescript-eslint/consistent-type-imports': 'off' },
  },
  {
    files: ['**/*.{test,spec}.{ts,tsx}', 'apps/api/test/**', 'apps/e2e/**'],
    rules: {
      '@typescript-eslint/no-unsafe-assignment': 'off',
      '@typescript-eslint/no-unsafe-member-access': 'off',
      '@typescript-eslint/unbound-method': 'off',
    },
  },
  // Word lists: one text a line, read by name and not from top to bottom.
  { files: ['**/texts.*.ts', 'libs/rules/src/texts/*.ts'], rules: { 'max-lines': 'off' } },
);
