/**
 * The whole case in a link: `#case=` and, in base64url, `z` with the deflated text or `j` with the
 * text as it is, where the browser cannot deflate.
 */

const MARK = '#case=';

/**
 * @param {string} text
 * @returns {Promise<string>}   the part of the link from `#` on
 */
export async function hashOf(text) {
  if (typeof CompressionStream !== 'function') return plainHashOf(text);
  return `${MARK}z${toBase64Url(await through(new TextEncoder().encode(text), new CompressionStream('deflate-raw')))}`;
}

/**
 * The same without deflating: longer, but at once.
 * @param {string} text
 */
export const plainHashOf = (text) => `${MARK}j${toBase64Url(new TextEncoder().encode(text))}`;

/**
 * @param {string} hash
 * @returns {Promise<string | null>}   null where the link holds no case
 * @throws where the link is damaged
 */
export async function textFromHash(hash) {
  if (!hash.startsWith(MARK)) return null;
  const kind = hash.charAt(MARK.length);
  const bytes = fromBase64Url(hash.slice(MARK.length + 1));
  if (kind === 'j') return new TextDecoder().decode(bytes);
  if (kind !== 'z') throw new Error('The link is of a kind that this page does not know.');
  return new TextDecoder().decode(await through(bytes, new DecompressionStream('deflate-raw')));
}

/**
 * @param {Uint8Array<ArrayBuffer>} bytes
 * @param {CompressionStream | DecompressionStream} stream
 */
async function through(bytes, stream) {
  return new Uint8Array(await new Response(new Blob([bytes]).stream().pipeThrough(stream)).arrayBuffer());
}

/** @param {Uint8Array} bytes */
function toBase64Url(bytes) {
  let text = '';
  for (const byte of bytes) text += String.fromCharCode(byte);
  return btoa(text).replace(/\+/g, '-').replace(/\//g, '_').replace(/=+$/, '');
}

/** @param {string} text */
function fromBase64Url(text) {
  return Uint8Array.from(atob(text.replace(/-/g, '+').replace(/_/g, '/')), (sign) => sign.charCodeAt(0));
}
