import js from '@eslint/js'
import vitest from '@vitest/eslint-plugin'
import next from 'eslint-config-next/core-web-vitals'
import playwright from 'eslint-plugin-playwright'
import tseslint from 'typescript-eslint'

export default tseslint.config(
  {
    ignores: [
      'node_modules/',
      '.next*/',
      '.data/',
      'next-env.d.ts',
      'coverage/',
      'test-results/',
      'playwright-report/',
    ],
  },
  js.configs.recommended,
  ...next,
  ...tseslint.configs.recommended,
  {
    files: ['**/*.{ts,tsx}'],
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
      '@typescript-eslint/no-unused-vars': [
        'error',
        { argsIgnorePattern: '^_', varsIgnorePattern: '^_', ignoreRestSiblings: true },
      ],
      '@typescript-eslint/no-non-null-assertion': 'error',
      'no-console': 'error',
      eqeqeq: 'error',
      'no-restricted-properties': [
        'error',
        {
          object: 'Math',
          property: 'random',
          message: 'Randomness is passed in; jitter between retries is the one exception.',
        },
        {
          property: 'coerce',
          object: 'z',
          message: "z.coerce makes '' a zero and moves dates. Parse text in the schema.",
        },
      ],
      'max-lines': ['error', { max: 250, skipBlankLines: false, skipComments: false }],
      // The compiler is off: tables and forms keep state that it would have to understand.
      'react-hooks/incompatible-library': 'off',
    },
  },
  {
    files: ['**/*.{mjs,cjs}'],
    languageOptions: {
      globals: {
        process: 'readonly',
        console: 'readonly',
        URL: 'readonly',
        setTimeout: 'readonly',
        clearTimeout: 'readonly',
        fetch: 'readonly',
        module: 'writable',
      },
    },
  },
  { files: ['scripts/**', 'playwright.config.ts'], rules: { 'no-console': 'off' } },
  { files: ['lib/**', 'db/**', 'tests/**', 'scripts/**'], rules: { 'react-hooks/rules-of-hooks': 'off' } },
  { files: ['tests/**'], rules: { 'no-restricted-properties': 'off' } },
  { files: ['lib/domain/inTransaction.ts'], rules: { 'no-restricted-properties': 'off' } },
  { files: ['db/tables.ts', 'db/seeds/**', 'tests/**'], rules: { 'max-lines': 'off' } },
  {
    files: [
      'tests/{science,panel,domain,format,app,services,scripts,components,db,integration}/**/*.{ts,tsx}',
    ],
    plugins: { vitest },
    rules: {
      ...vitest.configs.recommended.rules,
      'vitest/valid-expect': 'error',
      'vitest/expect-expect': [
        'error',
        { assertFunctionNames: ['expect', 'expect*', 'check*', 'fc.assert', 'assert*'] },
      ],
      // Tables of cases expect one thing or another by what the row says.
      'vitest/no-conditional-expect': 'off',
      'vitest/no-focused-tests': 'error',
      'vitest/no-disabled-tests': 'error',
    },
  },
  {
    files: ['tests/e2e/**/*.ts'],
    ...playwright.configs['flat/recommended'],
    rules: {
      ...playwright.configs['flat/recommended'].rules,
      // One test walks a table of roles and pages; what it expects depends on the row.
      'playwright/no-conditional-in-test': 'off',
      'playwright/no-conditional-expect': 'off',
      'playwright/no-skipped-test': 'error',
      'playwright/no-focused-test': 'error',
      'playwright/expect-expect': ['error', { assertFunctionNames: ['expect', 'expect*', 'check*'] }],
    },
  },
)
