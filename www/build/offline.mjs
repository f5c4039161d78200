// What the served page keeps for use without a network: the list of files and their version.

import { createHash } from 'node:crypto';
import { cp, readdir, readFile, stat } from 'node:fs/promises';
import { extname, join } from 'node:path';
import { build } from 'esbuild';

/** The rest of the folder is code. */
const COPIED = new Set(['.png', '.svg', '.webmanifest']);

/**
 * Copies the manifest and the icons.
 * @param {string} source the folder of index.html
 * @param {string} folder where the page is built
 */
export async function copyOffline(source, folder) {
  await cp(join(source, 'offline'), join(folder, 'offline'), {
    recursive: true,
    filter: async (path) => (await stat(path)).isDirectory() || COPIED.has(extname(path)),
  });
}

/**
 * Writes the service worker, once everything that it lists is there.
 * @param {string} source the folder of index.html
 * @param {string} folder where the page was built
 */
export async function writeServiceWorker(source, folder) {
  const names = ['index.html', 'page.js', 'page.css', 'shiftgauge_bg.wasm'];
  for (const name of await readdir(join(folder, 'offline'))) names.push(`offline/${name}`);
  await build({
    entryPoints: [join(source, 'offline/service-worker.js')],
    outfile: join(folder, 'service-worker.js'),
    define: {
      OFFLINE_FILES: JSON.stringify(names.sort()),
      OFFLINE_VERSION: JSON.stringify(await version(folder, names)),
    },
    bundle: true,
    format: 'iife',
    logLevel: 'warning',
  });
}

/**
 * A version that changes when, and only when, a listed file does.
 * @param {string} folder
 * @param {string[]} names
 */
async function version(folder, names) {
  const hash = createHash('sha256');
  for (const name of names) {
    const content = await readFile(join(folder, name));
    hash.update(`${name}\n${content.length}\n`).update(content);
  }
  return hash.digest('hex').slice(0, 16);
}
