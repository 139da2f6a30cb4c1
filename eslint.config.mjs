import withNuxt from './.nuxt/eslint.config.mjs'

const inward = 'The core stays pure: shared/ imports neither app, server, Vue, h3 nor the ORM, so that browser, server and tests run the same code.'

export default withNuxt(
  {
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@stylistic/member-delimiter-style': 'off',
      '@stylistic/quote-props': 'off',
      '@stylistic/max-statements-per-line': 'off',
      '@stylistic/operator-linebreak': 'off',
      '@stylistic/multiline-ternary': 'off',
      '@stylistic/arrow-parens': 'off',
      'max-lines': ['error', { max: 400, skipBlankLines: true, skipComments: true }],
      'vue/multi-word-component-names': 'off',
      'vue/max-attributes-per-line': 'off',
      'vue/singleline-html-element-content-newline': 'off',
      'vue/html-self-closing': 'off',
    },
  },
  {
    files: ['app/**', 'server/**', 'shared/**', 'emails/**'],
    rules: { 'max-lines-per-function': ['error', { max: 60, skipBlankLines: true, skipComments: true }] },
  },
  {
    // A setup block is a list of declarations, not a function to read from top to bottom.
    files: ['**/*.vue'],
    rules: { 'max-lines-per-function': 'off' },
  },
  {
    files: ['shared/**'],
    rules: {
      'no-restricted-imports': ['error', {
        patterns: [{ group: ['vue', 'vue/*', 'h3', '@mikro-orm/*', '#server/*', '~/*', '@/*', 'node:*', '@vueuse/*'], message: inward }],
      }],
      'no-restricted-globals': ['error', { name: 'Date', message: 'No clock in shared/: pass the time in.' }, { name: 'window', message: inward }, { name: 'document', message: inward }],
      'no-restricted-properties': ['error', { object: 'Math', property: 'random', message: 'No randomness in shared/: pass ids in.' }],
    },
  },
  {
    files: ['app/**'],
    rules: {
      'no-restricted-imports': ['error', {
        patterns: [{ group: ['#server/*', '**/server/**', '@mikro-orm/*'], message: 'The browser asks the server through its routes, it never imports it.' }],
      }],
    },
  },
)
