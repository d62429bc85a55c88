const expo = require('eslint-config-expo/flat');
const typescript = require('typescript-eslint');

/** Rules that need types: what they catch is a fault, not a taste. */
const typed = {
  '@typescript-eslint/await-thenable': 'error',
  '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
  '@typescript-eslint/no-base-to-string': 'error',
  '@typescript-eslint/no-explicit-any': 'error',
  '@typescript-eslint/no-floating-promises': 'error',
  '@typescript-eslint/no-for-in-array': 'error',
  '@typescript-eslint/no-misused-promises': [
    'error',
    { checksVoidReturn: { attributes: false, arguments: false } },
  ],
  '@typescript-eslint/no-unnecessary-condition': 'error',
  '@typescript-eslint/no-unnecessary-type-assertion': 'error',
  '@typescript-eslint/no-unsafe-argument': 'error',
  '@typescript-eslint/no-unsafe-assignment': 'error',
  '@typescript-eslint/no-unsafe-call': 'error',
  '@typescript-eslint/no-unsafe-return': 'error',
  '@typescript-eslint/only-throw-error': 'error',
  '@typescript-eslint/return-await': ['error', 'in-try-catch'],
  '@typescript-eslint/switch-exhaustiveness-check': 'error',
};

const everywhere = {
  // Decimal and fast-check are default exports by their own documentation.
  'import/no-named-as-default': 'off',
  'import/no-named-as-default-member': 'off',
  eqeqeq: 'error',
  'no-console': 'error',
  'no-param-reassign': 'error',
  'object-shorthand': 'error',
  'prefer-const': 'error',
};

module.exports = [
  { ignores: ['dist/', '.expo/', '.local/', 'public/fonts/', 'coverage/', 'expo-env.d.ts'] },
  { linterOptions: { reportUnusedDisableDirectives: 'error', noInlineConfig: true } },
  ...expo,
  { rules: everywhere },
  {
    files: ['**/*.{ts,tsx}'],
    languageOptions: {
      parser: typescript.parser,
      parserOptions: {
        project: ['./tsconfig.json', './tests/tsconfig.json'],
        tsconfigRootDir: __dirname,
      },
    },
    plugins: { '@typescript-eslint': typescript.plugin },
    rules: typed,
  },
  {
    // supertest, pg and jest's matchers answer `any`: there the assertion is the check.
    files: ['tests/**'],
    rules: Object.fromEntries(
      ['argument', 'assignment', 'call', 'return'].map((what) => [
        `@typescript-eslint/no-unsafe-${what}`,
        'off',
      ]),
    ),
  },
  { files: ['scripts/**'], rules: { 'no-console': 'off' } },
  {
    files: ['*.js', '**/*.{cjs,mjs}', 'server/**', 'openapi/**', 'scripts/**', 'tests/**'],
    languageOptions: { globals: { __dirname: 'readonly', Buffer: 'readonly' } },
    // Metro writes variables into the bundle; Node reads them where it runs.
    rules: { 'expo/no-dynamic-env-var': 'off', 'expo/no-env-var-destructuring': 'off' },
  },
];
