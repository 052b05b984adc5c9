import js from '@eslint/js'
import reactHooks from 'eslint-plugin-react-hooks'
import tseslint from 'typescript-eslint'

export default tseslint.config(
  { ignores: ['dist/', '.data/', 'coverage/', 'test-results/', 'server/db/migrations/'] },
  { linterOptions: { reportUnusedDisableDirectives: 'error' } },
  js.configs.recommended,
  tseslint.configs.recommendedTypeChecked,
  {
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
    rules: {
      eqeqeq: 'error',
      'no-console': 'error',
      'no-undef': 'off',
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-non-null-assertion': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { ignoreRestSiblings: true, argsIgnorePattern: '^_' }],
      '@typescript-eslint/switch-exhaustiveness-check': ['error', { considerDefaultExhaustiveForUnions: true }],
      '@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true }],
      // Handlers of DOM events and of Express may be async: both forward what is thrown.
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: false }],
    },
  },
  {
    files: ['src/**/*.{ts,tsx}', 'tests/client/**/*.{ts,tsx}'],
    extends: [reactHooks.configs.flat.recommended],
  },
  {
    files: ['shared/{engine,units,kinds,unlikely}/**/*.ts'],
    rules: {
      'no-restricted-globals': [
        'error',
        'Date',
        'performance',
        'process',
        'fetch',
        'console',
        'setTimeout',
        'crypto',
        'Intl',
      ],
      'no-restricted-properties': [
        'error',
        { object: 'Math', property: 'random', message: 'The same setup must give the same answer.' },
      ],
    },
  },
  {
    // Loops over typed arrays and their indexes: the index comes from the array itself, and a check would cost the sweep.
    files: ['shared/engine/{classes,list-answers,ranking,scales,settle-quantity,sweep,table}.ts'],
    rules: { '@typescript-eslint/no-non-null-assertion': 'off' },
  },
  {
    files: ['server/**/*.ts', 'src/**/*.{ts,tsx}', 'shared/{engine,schemas}/**/*.ts', 'scripts/**/*.mjs'],
    rules: { 'max-lines': ['error', { max: 300, skipComments: true, skipBlankLines: true }] },
  },
  {
    files: ['**/*.mjs'],
    rules: {
      // JSDoc cannot say what these ask for without more words than the code has.
      '@typescript-eslint/no-unsafe-assignment': 'off',
      '@typescript-eslint/no-unsafe-call': 'off',
      '@typescript-eslint/no-unsafe-member-access': 'off',
      '@typescript-eslint/no-unsafe-return': 'off',
      '@typescript-eslint/no-unsafe-argument': 'off',
    },
  },
  {
    files: ['tests/**/*.{ts,tsx}'],
    rules: {
      // Bodies of HTTP answers arrive as any; what a test expects of them is the check.
      '@typescript-eslint/no-unsafe-assignment': 'off',
      '@typescript-eslint/no-unsafe-member-access': 'off',
      '@typescript-eslint/no-unsafe-call': 'off',
      '@typescript-eslint/no-unsafe-argument': 'off',
      '@typescript-eslint/no-unsafe-return': 'off',
      '@typescript-eslint/no-non-null-assertion': 'off',
    },
  },
)
