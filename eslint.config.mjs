import js from '@eslint/js';
import tseslint from 'typescript-eslint';
import importX from 'eslint-plugin-import-x';
import jsxA11y from 'eslint-plugin-jsx-a11y';
import reactHooks from 'eslint-plugin-react-hooks';

/** A restriction's message names the alternative. */
const onlyDownwards = (patterns) => ({
  'no-restricted-imports': ['error', { patterns }],
});

const tests = ['**/*.test.ts', '**/*.test.tsx', 'backend/test/**', 'e2e/**', '**/test-support/**'];

export default tseslint.config(
  {
    ignores: [
      '**/node_modules/**',
      '**/dist/**',
      '**/generated/**',
      'data/**',
      '**/data/**',
      'e2e/report/**',
      'e2e/test-results/**',
    ],
  },
  js.configs.recommended,
  ...tseslint.configs.strictTypeChecked.map((config) => ({ ...config, files: ['**/*.ts', '**/*.tsx'] })),
  {
    files: ['**/*.ts', '**/*.tsx'],
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
    plugins: { 'import-x': importX },
    rules: {
      'max-lines': ['error', { max: 300 }],
      'import-x/no-cycle': 'error',
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/switch-exhaustiveness-check': [
        'error',
        { considerDefaultExhaustiveForUnions: true },
      ],
      '@typescript-eslint/restrict-template-expressions': [
        'error',
        { allowNumber: true, allowBoolean: true },
      ],
      '@typescript-eslint/no-extraneous-class': [
        'error',
        { allowWithDecorator: true, allowStaticOnly: false },
      ],
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_' }],
      '@typescript-eslint/no-confusing-void-expression': ['error', { ignoreArrowShorthand: true }],
      // Classes of ours that describe what goes over the wire are shapes: their values are plain objects.
      '@typescript-eslint/no-unsafe-class-instance-assignment': 'off',
      'no-console': 'error',
      eqeqeq: 'error',
    },
  },
  {
    files: ['backend/engineering/src/**/*.ts'],
    rules: onlyDownwards([
      {
        group: ['node:*', 'fs', 'path', 'crypto', '@nestjs/*', 'sequelize*', 'react*', '@resistry/*'],
        message:
          'engineering is pure: it imports nothing of ours and no framework; take the value as a parameter.',
      },
    ]),
  },
  {
    files: ['backend/src/**/*.ts', 'backend/test/**/*.ts'],
    rules: onlyDownwards([
      {
        group: ['**/frontend/**'],
        message: 'the backend never imports the frontend; share pure code through @resistry/engineering.',
      },
    ]),
  },
  {
    files: ['frontend/src/**/*.ts', 'frontend/src/**/*.tsx'],
    plugins: { 'react-hooks': reactHooks, 'jsx-a11y': jsxA11y },
    rules: {
      ...reactHooks.configs.recommended.rules,
      ...jsxA11y.flatConfigs.recommended.rules,
      // Speaks of a compiler that this build does not use.
      'react-hooks/incompatible-library': 'off',
      ...onlyDownwards([
        {
          group: ['**/backend/src/**', '@nestjs/*', 'sequelize*'],
          message:
            'the browser meets the server through src/api only; share pure code through @resistry/engineering.',
        },
      ]),
    },
  },
  {
    files: ['frontend/src/components/**', 'frontend/src/api/**', 'frontend/src/theme/**'],
    rules: onlyDownwards([
      {
        group: ['**/features/**'],
        message: 'imports flow shared → features → app; pass what differs as a property.',
      },
    ]),
  },
  {
    files: tests,
    rules: {
      'no-restricted-syntax': [
        'error',
        {
          selector: "MemberExpression[property.name='only'][object.name=/^(it|test|describe)$/]",
          message: 'Remove .only: the whole suite runs.',
        },
      ],
      '@typescript-eslint/no-non-null-assertion': 'off',
      '@typescript-eslint/unbound-method': 'off',
    },
  },
  {
    files: ['**/*.mjs', '**/*.cjs'],
    languageOptions: {
      globals: {
        console: 'readonly',
        process: 'readonly',
        module: 'writable',
        require: 'readonly',
        __dirname: 'readonly',
        setTimeout: 'readonly',
        clearTimeout: 'readonly',
        URL: 'readonly',
        fetch: 'readonly',
        Buffer: 'readonly',
        performance: 'readonly',
        AbortController: 'readonly',
      },
    },
  },
);
