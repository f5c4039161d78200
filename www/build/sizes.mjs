// Prints how large each built file is, raw and as it travels.

import { readdir, readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';

/** @param {Uint8Array} bytes */
export function gzippedLength(bytes) {
  return gzipSync(bytes, { level: 9 }).length;
}

/** @param {string} folder */
export async function printSizes(folder) {
  console.log(row('file', 'bytes', 'gzipped'));
  for (const entry of await readdir(folder, { withFileTypes: true })) {
    if (!entry.isFile()) continue;
    const bytes = await readFile(join(folder, entry.name));
    console.log(row(entry.name, bytes.length, gzippedLength(bytes)));
  }
}

/**
 * @param {string} name
 * @param {string | number} raw
 * @param {string | number} gzipped
 */
function row(name, raw, gzipped) {
  return `   ${name.padEnd(22)}${String(raw).padStart(10)}${String(gzipped).padStart(10)}`;
}
