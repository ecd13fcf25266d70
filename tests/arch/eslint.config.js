import js from '@eslint/js'
import pluginVue from 'eslint-plugin-vue'
import globals from 'globals'
import { fileURLToPath } from 'node:url'
import tseslint from 'typescript-eslint'
import vueParser from 'vue-eslint-parser'

const basePath = fileURLToPath(new URL('../..', import.meta.url))

/** Every rule beyond the recommended sets says why it is there. */
export default tseslint.config(
  { basePath, ignores: ['**/dist/**', 'data/**', 'node_modules/**'] },
  js.configs.recommended,
  ...tseslint.configs.recommended,
  ...pluginVue.configs['flat/recommended'],
  {
    basePath,
    files: ['**/*.vue'],
    languageOptions: { parser: vueParser, parserOptions: { parser: tseslint.parser, sourceType: 'module' } },
  },
  {
    basePath,
    files: ['**/*.{ts,vue}'],
    rules: {
      // The compiler knows every name, and knows those of the DOM and of Node.js apart.
      'no-undef': 'off',
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/ban-ts-comment': ['error', { 'ts-expect-error': 'allow-with-description' }],
      // The log is structured; a stray print is a leak.
      'no-console': 'error',
      eqeqeq: ['error', 'always', { null: 'ignore' }],
      // Taking a field out of an object names it and leaves it.
      '@typescript-eslint/no-unused-vars': ['error', { ignoreRestSiblings: true, argsIgnorePattern: '^_' }],
      // A page shows data as text, never as markup.
      'vue/no-v-html': 'error',
      // Layout is prettier's.
      'vue/max-attributes-per-line': 'off',
      'vue/singleline-html-element-content-newline': 'off',
      'vue/multiline-html-element-content-newline': 'off',
      'vue/html-self-closing': 'off',
      'vue/html-indent': 'off',
      'vue/html-closing-bracket-newline': 'off',
      'vue/first-attribute-linebreak': 'off',
      'vue/attributes-order': 'off',
      // Optional props are `undefined` when left out, and the types say so.
      'vue/require-default-prop': 'off',
    },
  },
  {
    basePath,
    files: ['server/**/*.ts', 'migrations/**/*.ts', 'seeds/**/*.ts'],
    rules: {
      // Read once, validated, passed on typed: server/config.ts.
      'no-restricted-properties': [
        'error',
        { object: 'process', property: 'env', message: 'Only server/config.ts reads the environment.' },
      ],
      // The outer connection inside a transaction waits for itself for ever.
      'no-restricted-syntax': [
        'error',
        {
          selector:
            "CallExpression[callee.name='write'] > :matches(ArrowFunctionExpression, FunctionExpression) Identifier[name='db']",
          message: 'Inside a transaction use the transaction: the outer db would wait for it for ever.',
        },
      ],
    },
  },
  { basePath, files: ['server/config.ts'], rules: { 'no-restricted-properties': 'off' } },
  { basePath, files: ['**/*.mjs', '**/*.js'], languageOptions: { globals: globals.node } },
)
