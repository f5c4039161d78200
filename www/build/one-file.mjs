// The page in one file. A browser that opens it from disk blocks fetches, module files and service
// workers, so the bundle, the styles, the icon and the engine's bytes are all inside.

import { createHash } from 'node:crypto';
import { readFile, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { replaceOnce, withPolicy } from './html.mjs';

const STYLE = '<link rel="stylesheet" href="./page.css">';
const SCRIPT = '<script type="module" src="./page.js"></script>';
const NOT_IN_ONE_FILE = /[ \t]*<link\b[^>]*\brel="(?:manifest|apple-touch-icon|preload|modulepreload)"[^>]*>\n?/gi;
const ICON = /(<link\b[^>]*\brel="icon"[^>]*\bhref=")\.\/([^"]+\.svg)(")/i;
const OUTSIDE = /<(?:script|link|img|iframe|source)\b[^>]*\b(?:src|href)="(?!data:)[^"]*"/i;

/** @param {string} folder */
export async function writeOneFile(folder) {
  /** @param {string} name */
  const text = (name) => readFile(join(folder, name), 'utf8');
  const script = await text('page.js');
  const style = await text('page.css');
  const bytes = (await readFile(join(folder, 'shiftgauge_bg.wasm'))).toString('base64');
  if (/<\/script|<!--/i.test(script)) throw new Error('page.js would end its own script element');
  if (/<\/style/i.test(style)) throw new Error('page.css would end its own style element');

  let html = (await text('index.html')).replace(NOT_IN_ONE_FILE, '');
  const icon = html.match(ICON);
  if (icon?.[2]) {
    const data = (await readFile(join(folder, icon[2]))).toString('base64');
    html = html.replace(ICON, `$1data:image/svg+xml;base64,${data}$3`);
  }
  html = replaceOnce(html, STYLE, `<style>${style}</style>`);
  html = replaceOnce(html, SCRIPT, `<script type="module">${script}</script>`);
  const engine = `<script type="application/wasm-base64" id="engine-bytes">${bytes}</script>`;
  html = replaceOnce(html, '</body>', `${engine}\n</body>`);
  html = withPolicy(html, policy(script, style));

  const outside = html.match(OUTSIDE);
  if (outside) throw new Error(`the page in one file still refers to ${outside[0]}`);
  await writeFile(join(folder, 'shiftgauge.html'), html);
}

/**
 * @param {string} script
 * @param {string} style
 */
function policy(script, style) {
  return [
    "default-src 'none'",
    `script-src '${hash(script)}' 'wasm-unsafe-eval'`,
    `style-src '${hash(style)}'`,
    'img-src data:',
    "base-uri 'none'",
    "form-action 'none'",
  ].join('; ');
}

/** @param {string} text */
function hash(text) {
  return `sha256-${createHash('sha256').update(text).digest('base64')}`;
}
