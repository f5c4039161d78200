// Finishes what wasm-bindgen wrote: a smaller, faster binary, and a way to start it again.

import { execFile } from 'node:child_process';
import { readFile, rename, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { execPath } from 'node:process';
import { fileURLToPath } from 'node:url';
import { promisify } from 'node:util';

const run = promisify(execFile);
const WASM_OPT = fileURLToPath(new URL('../node_modules/binaryen/bin/wasm-opt', import.meta.url));

/** What rustc emits; wasm-bindgen drops the note of it from the binary, so it is said here. */
const FEATURES = [
  'bulk-memory',
  'multivalue',
  'mutable-globals',
  'nontrapping-float-to-int',
  'reference-types',
  'sign-ext',
].map((name) => `--enable-${name}`);

/**
 * `-Os` made nothing slower than `-O3` here. Without `-ocimfs 0` every function that is called from
 * one place is put into its caller; that makes functions of 60 kB, which pack worse (by a twentieth)
 * and which V8 compiles later and less well.
 */
const HOW = ['-Os', '-ocimfs', '0', '--strip-debug', '--strip-producers'];

/** @param {string} folder */
export async function optimise(folder) {
  const binary = join(folder, 'shiftgauge_bg.wasm');
  const smaller = `${binary}.smaller`;
  await run(execPath, [WASM_OPT, ...HOW, ...FEATURES, binary, '-o', smaller]);
  await rename(smaller, binary);
}

/**
 * After a trap the instance is dead, but the generated loader keeps it and `initSync` returns at
 * once. `reset` lets go of it, so that the next `initSync` makes a new one.
 * @param {string} folder
 */
export async function addReset(folder) {
  const loader = join(folder, 'shiftgauge.js');
  const code = await readFile(loader, 'utf8');
  if (!/^let (?:.*, )?wasm;$/m.test(code)) throw new Error('the loader no longer keeps `wasm`');
  await writeFile(loader, `${code}\nexport function reset() {\n  wasm = undefined;\n}\n`);
}
