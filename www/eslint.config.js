// Lints the page, its build and the tests in JavaScript; run from the project's top folder.

import js from '@eslint/js';
import globals from 'globals';

export default [
  js.configs.recommended,
  {
    rules: {
      eqeqeq: 'error',
      'no-implicit-coercion': 'error',
      'no-var': 'error',
      'prefer-const': 'error',
    },
  },
  {
    files: ['www/**/*.js'],
    languageOptions: { globals: { ...globals.browser } },
    rules: { 'max-lines': ['error', { max: 250 }] },
  },
  { files: ['www/offline/service-worker.js'], languageOptions: { globals: globals.serviceworker } },
  {
    files: ['www/build/*.mjs', 'tests/**/*.js'],
    languageOptions: { globals: { ...globals.nodeBuiltin } },
  },
  // The tests of the page hand functions to the browser, which run there.
  {
    files: ['tests/page/*.js', 'tests/bench/chromium.js', 'tests/bench/batches.js'],
    languageOptions: { globals: { ...globals.nodeBuiltin, ...globals.browser } },
  },
];
