import reactHooks from 'eslint-plugin-react-hooks';
import tseslint from 'typescript-eslint';
import unused from './metro/unused.js';

export default tseslint.config(
  { ignores: ['node_modules/', 'dist/', '.data/', '.expo/', 'coverage/', 'test-results/', 'playwright-report/', 'expo-env.d.ts'] },
  {
    files: ['**/*.{ts,tsx,mjs,cjs,js}'],
    plugins: { '@typescript-eslint': tseslint.plugin },
    languageOptions: { parser: tseslint.parser },
    linterOptions: { reportUnusedDisableDirectives: 'error' },
    rules: {
      'max-lines': ['error', { max: 300, skipBlankLines: false, skipComments: false }],
      'max-len': ['error', { code: 180, ignoreStrings: true, ignoreTemplateLiterals: true, ignoreUrls: true, ignoreRegExpLiterals: true }],
      'no-debugger': 'error',
      'no-var': 'error',
      'prefer-const': 'error',
      eqeqeq: ['error', 'always', { null: 'ignore' }],
      'no-restricted-syntax': ['error', { selector: 'TSEnumDeclaration', message: 'Use a union of literals.' }],
    },
  },
  {
    files: ['**/*.{ts,tsx}'],
    extends: [tseslint.configs.recommended],
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: { attributes: false, arguments: false } }],
      '@typescript-eslint/await-thenable': 'error',
      '@typescript-eslint/switch-exhaustiveness-check': 'error',
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports', disallowTypeAnnotations: false }],
      '@typescript-eslint/ban-ts-comment': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      '@typescript-eslint/no-require-imports': ['error', { allow: ['\\.(woff2|ttf|png)$'] }],
    },
  },
  {
    files: ['{app,components}/**/*.{ts,tsx}'],
    plugins: { 'react-hooks': reactHooks },
    rules: {
      ...reactHooks.configs.recommended.rules,
      'no-restricted-imports': ['error', {
        paths: unused.filter(({ names }) => names.length > 0).map(({ library, names }) => ({
          name: library, importNames: names, message: 'It is left out of the bundle: see metro/unused.js.',
        })),
      }],
    },
  },
  {
    files: ['{app,components,shared,pricing}/**/*.{ts,tsx}'],
    rules: { 'no-console': 'error' },
  },
);
