const expo = require('eslint-config-expo/flat');
const globals = require('globals');
const typescript = require('typescript-eslint');

/** Import rules live in test/architecture.test.ts, which can say how to mend them. */
module.exports = [
  { ignores: ['node_modules/**', 'dist/**', '.data/**', '.expo/**', 'test-results/**', 'drizzle/**'] },
  ...expo,
  {
    files: ['**/*.{ts,tsx,mts}'],
    plugins: { '@typescript-eslint': typescript.plugin },
    languageOptions: {
      parser: typescript.parser,
      parserOptions: { projectService: true, tsconfigRootDir: __dirname },
    },
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/ban-ts-comment': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: { attributes: false } }],
      '@typescript-eslint/switch-exhaustiveness-check': [
        'error',
        { considerDefaultExhaustiveForUnions: true },
      ],
      // TypeScript resolves imports itself, and knows the packages that carry only types.
      'import/no-unresolved': 'off',
      'import/namespace': 'off',
      'import/no-cycle': ['error', { maxDepth: 6, ignoreExternal: true }],
    },
  },
  {
    files: ['**/*.mjs', '*.js'],
    languageOptions: { globals: globals.node },
    rules: { 'import/no-unresolved': 'off', 'no-undef': 'error' },
  },
  {
    files: ['**/*.{ts,tsx,js,mjs}'],
    rules: {
      eqeqeq: ['error', 'always'],
      'no-console': 'error',
      'max-params': ['error', 3],
      'prefer-const': 'error',
      'object-shorthand': 'error',
    },
  },
  {
    files: ['shared/engine/**/*.ts'],
    ignores: ['**/*.test.ts'],
    rules: {
      'no-restricted-properties': [
        'error',
        {
          object: 'Math',
          property: 'random',
          message: 'Randomness is an argument: take a seeded generator.',
        },
        { object: 'Date', property: 'now', message: 'Time is an argument of the engine.' },
      ],
    },
  },
  {
    files: ['**/*.test.{ts,tsx}', 'test/**/*.ts'],
    rules: {
      'no-restricted-syntax': [
        'error',
        {
          selector: "MemberExpression[property.name='only'][object.name=/^(it|test|describe)$/]",
          message: 'Remove .only: it hides every other test.',
        },
      ],
      'max-params': 'off',
    },
  },
];
