// One bundle for both pages: the page's modules with the engine's loader, and the style sheets.

import { join } from 'node:path';
import { build } from 'esbuild';

/** The oldest browsers that the page is built for: those of the end of 2022. */
const TARGET = ['chrome108', 'firefox108', 'safari16.4'];

/**
 * @param {string} source the folder of index.html
 * @param {string} folder where the engine's loader lies and the bundles go
 */
export async function bundle(source, folder) {
  await build({
    entryPoints: { page: join(source, 'main.js') },
    outdir: folder,
    plugins: [engineFrom(folder)],
    ...common,
  });
  await build({
    entryPoints: { page: join(source, 'style/page.css') },
    outdir: folder,
    loader: { '.svg': 'dataurl', '.png': 'dataurl' },
    ...common,
  });
}

/** @type {import('esbuild').BuildOptions} */
const common = {
  bundle: true,
  minify: true,
  format: 'esm',
  target: TARGET,
  charset: 'utf8',
  legalComments: 'none',
  logLevel: 'warning',
};

/**
 * In the sources the engine is './shiftgauge.js', which exists only after the build.
 * @param {string} folder
 * @returns {import('esbuild').Plugin}
 */
function engineFrom(folder) {
  return {
    name: 'engine',
    setup({ onResolve }) {
      onResolve({ filter: /^\.{1,2}\/shiftgauge\.js$/ }, () => ({ path: join(folder, 'shiftgauge.js') }));
    },
  };
}
