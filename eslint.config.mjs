import boundaries from 'eslint-plugin-boundaries'
import vue from 'eslint-plugin-vue'
import tseslint from 'typescript-eslint'
import { layers, pureLayers } from './tests/checks/layers.mjs'

const named = (message, ...names) => names.map((name) => ({ name, message }))

export default tseslint.config(
  { ignores: ['node_modules', 'out', 'dist', 'coverage'] },
  ...tseslint.configs.recommended,
  ...vue.configs['flat/recommended'],
  {
    files: ['**/*.vue'],
    languageOptions: { parserOptions: { parser: tseslint.parser } },
    rules: {
      // Line breaks are prettier's.
      'vue/max-attributes-per-line': 'off',
      'vue/singleline-html-element-content-newline': 'off',
      'vue/html-self-closing': 'off',
      'vue/html-closing-bracket-newline': 'off',
      'vue/html-indent': 'off',
      'vue/no-v-html': 'error',
    },
  },
  {
    rules: {
      'no-undef': 'off',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_' }],
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
      eqeqeq: 'error',
      'no-eval': 'error',
      'no-implied-eval': 'error',
      'no-new-func': 'error',
    },
  },
  {
    files: ['src-main/**/*.ts', 'src-renderer/**/*.{ts,vue}'],
    plugins: { boundaries },
    settings: {
      'import/resolver': { node: { extensions: ['.ts', '.vue', '.json', '.js'] } },
      'boundaries/elements': [...layers]
        .sort((one, other) => other.folder.length - one.folder.length)
        .map(({ name, folder }) => ({ type: name, pattern: folder })),
    },
    rules: {
      'boundaries/no-unknown-files': 'error',
      'boundaries/dependencies': [
        'error',
        {
          default: 'disallow',
          policies: [
            ...layers.map(({ name, may }) => ({
              from: { element: { type: name } },
              allow: { to: { element: { type: [name, ...may] } } },
            })),
          ],
        },
      ],
    },
  },
  {
    files: pureLayers.map(({ folder }) => `${folder}/**/*.ts`),
    rules: {
      'no-restricted-globals': [
        'error',
        ...named(
          'The engine knows no clock.',
          'Date',
          'performance',
          'setTimeout',
          'setInterval',
          'setImmediate',
        ),
        ...named('The engine knows no Node.', 'process', 'Buffer', 'require', 'global'),
        ...named(
          'The engine knows no page.',
          'window',
          'document',
          'navigator',
          'fetch',
          'self',
          'globalThis',
        ),
        ...named('The engine prints nothing; it returns faults and cautions.', 'console'),
        ...named('The engine knows no locale.', 'Intl'),
      ],
      'no-restricted-properties': [
        'error',
        { object: 'Math', property: 'random', message: 'The engine knows no chance.' },
        ...['toLocaleString', 'toLocaleLowerCase', 'toLocaleUpperCase', 'localeCompare'].map((property) => ({
          property,
          message: 'The engine knows no locale.',
        })),
      ],
      'no-restricted-imports': [
        'error',
        {
          patterns: [
            {
              group: ['node:*', 'fs', 'path', 'os', 'crypto', 'worker_threads'],
              message: 'The engine knows no Node.',
            },
            {
              group: ['electron', 'electron/*', 'vue', 'chart.js'],
              message: 'The engine knows no page and no host.',
            },
          ],
        },
      ],
    },
  },
)
