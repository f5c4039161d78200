// The changes that the build makes to index.html. Each takes the text and gives it back changed.

import { readFile } from 'node:fs/promises';
import { join } from 'node:path';

/** As a worker's engine Trunk builds it but puts no script into the page. */
export const ENGINE_LINK =
  '<link data-trunk rel="rust" href="../Cargo.toml" data-type="worker" data-bindgen-target="web">';
export const PAGE_STYLE = '<link rel="stylesheet" href="./style/page.css">';
export const PAGE_SCRIPT = '<script type="module" src="./main.js"></script>';

const SERVED_POLICY = [
  "default-src 'none'",
  "script-src 'self' 'wasm-unsafe-eval'",
  "style-src 'self'",
  "connect-src 'self'",
  "img-src 'self' data:",
  "manifest-src 'self'",
  "worker-src 'self'",
  "base-uri 'none'",
  "form-action 'none'",
].join('; ');

const POLICY_TAG = /[ \t]*<meta http-equiv="Content-Security-Policy"[^>]*>\n?/gi;
const PART = /^([ \t]*)<!-- part: ([a-z-]+) -->\n/gm;
const CHARSET_TAG = /<meta charset="utf-8"\s*\/?>/i;

/** @param {string} html */
export function scripts(html) {
  return html.match(/<script\b[^>]*>/gi) ?? [];
}

/**
 * Replaces a piece that must stand in the page exactly once.
 * @param {string} html
 * @param {string | RegExp} piece
 * @param {string} replacement
 */
export function replaceOnce(html, piece, replacement) {
  const parts = html.split(piece);
  if (parts.length !== 2) throw new Error(`index.html has to contain ${piece} once`);
  return parts.join(replacement);
}

/**
 * Puts each part of the page, a file of parts/, in the place of its name.
 * @param {string} html
 * @param {string} source the folder of index.html
 */
export async function withParts(html, source) {
  /** @type {Map<string, string>} */
  const parts = new Map();
  for (const [, , name = ''] of html.matchAll(PART)) parts.set(name, await readFile(join(source, 'parts', `${name}.html`), 'utf8'));
  if (parts.size === 0) throw new Error('index.html no longer names its parts');
  return html.replace(PART, (_, indent, name) => (parts.get(name) ?? '').replace(/^(?=.)/gm, indent));
}

/**
 * The page as it is served: the two bundles, and a policy that allows nothing from elsewhere.
 * @param {string} html
 */
export function servedPage(html) {
  const bundled = replaceOnce(
    replaceOnce(html, PAGE_STYLE, '<link rel="stylesheet" href="./page.css">'),
    PAGE_SCRIPT,
    '<script type="module" src="./page.js"></script>',
  );
  if (scripts(bundled).length !== 1) throw new Error('Trunk put a script into the page');
  return withPolicy(bundled, SERVED_POLICY);
}

/**
 * @param {string} html
 * @param {string} policy
 */
export function withPolicy(html, policy) {
  const tag = `<meta http-equiv="Content-Security-Policy" content="${policy}">`;
  const bare = html.replace(POLICY_TAG, '');
  const charset = bare.match(CHARSET_TAG)?.[0];
  if (!charset) throw new Error('index.html has to contain <meta charset="utf-8">');
  return replaceOnce(bare, charset, `${charset}\n  ${tag}`);
}
