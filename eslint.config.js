import js from '@eslint/js';
import prettier from 'eslint-config-prettier';
import reactHooks from 'eslint-plugin-react-hooks';
import globals from 'globals';
import tseslint from 'typescript-eslint';

/** Imports that a part of the tree may not make; the paths are as written in the import. */
function forbid(...groups) {
  return {
    'no-restricted-imports': [
      'error',
      { patterns: groups.map(([group, message]) => ({ group, message })) },
    ],
  };
}

const node = ['node:*', 'fs', 'path', 'crypto'];

export default tseslint.config(
  { ignores: ['dist', '.data', '.cache', 'node_modules'] },
  js.configs.recommended,
  {
    files: ['**/*.{ts,tsx}'],
    extends: [...tseslint.configs.recommendedTypeChecked],
    languageOptions: {
      parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname },
    },
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
      '@typescript-eslint/switch-exhaustiveness-check': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_' }],
      '@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true }],
      eqeqeq: ['error', 'always'],
    },
  },
  { files: ['**/*.{js,mjs}'], languageOptions: { globals: globals.node } },
  {
    files: ['public/**/*.js', 'scripts/screens.mjs'],
    languageOptions: { globals: globals.browser },
  },
  {
    files: ['shared/**/*.ts'],
    rules: forbid(
      [['**/server/**', '**/src/**'], 'shared/ knows neither the server nor the client'],
      [node, 'shared/ runs in the browser too'],
    ),
  },
  {
    files: ['server/**/*.ts'],
    rules: forbid([['**/src/**'], 'the server does not import the client']),
  },
  {
    files: ['src/**/*.{ts,tsx}'],
    plugins: { 'react-hooks': reactHooks },
    rules: {
      ...reactHooks.configs.recommended.rules,
      ...forbid(
        [['**/server/**'], 'the client does not import the server'],
        [node, 'the client runs in the browser'],
      ),
    },
  },
  {
    files: ['src/ui/**/*.{ts,tsx}', 'src/lib/**/*.{ts,tsx}'],
    rules: forbid([
      ['**/server/**', '**/features/**', '**/pages/**', '**/charts/**'],
      'ui and lib know no domain',
    ]),
  },
  {
    files: ['src/charts/**/*.{ts,tsx}'],
    rules: forbid([
      ['**/server/**', '**/features/**', '**/pages/**'],
      'charts draw what they are given',
    ]),
  },
  {
    files: ['src/features/**/*.{ts,tsx}'],
    rules: forbid(
      [['**/server/**', '**/pages/**'], 'pages compose features, not the other way round'],
      [
        ['../../features/**', '../[a-z]*/**', '!../../shared/**'],
        'features do not import each other',
      ],
    ),
  },
  prettier,
);
