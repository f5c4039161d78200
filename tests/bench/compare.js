// Runs the same work natively, in WebAssembly and as a Python script, in turn, and prints the ratios.
// node compare.js NATIVE_PROGRAM ENGINE_FOLDER [PYTHON]

import { execFileSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { argv } from 'node:process';
import { fileURLToPath, pathToFileURL } from 'node:url';

const ROUNDS = 3;
const [native, folder, python] = argv.slice(2);
if (!native || !folder) throw new Error('usage: node compare.js NATIVE_PROGRAM ENGINE_FOLDER [PYTHON]');

const engine = await import(pathToFileURL(join(folder, 'shiftgauge.js')).href);
engine.initSync({ module: readFileSync(join(folder, 'shiftgauge_bg.wasm')) });
const example = new URL('../../www/examples/low-temperature-shift.json', import.meta.url);
const question = JSON.parse(readFileSync(example, 'utf8'));

/** @param {number[]} numbers */
const median = (numbers) => [...numbers].sort((a, b) => a - b)[Math.floor(numbers.length / 2)] ?? Number.NaN;

/**
 * The nanoseconds of one turn, the median of nine.
 * @param {number} count
 * @param {(count: number) => unknown} work
 */
function time(count, work) {
  work(count);
  return median(Array.from({ length: 9 }, () => {
    const start = performance.now();
    if (work(count) === undefined) throw new Error('the work gave no number');
    return ((performance.now() - start) * 1e6) / count;
  }));
}

/** @param {string} program @param {string[]} words */
function lines(program, words) {
  const text = execFileSync(program, words, { encoding: 'utf8' });
  return new Map(text.trim().split('\n').map((line) => {
    const [name = '', value = ''] = line.split('\t');
    return /** @type {[string, number]} */ ([name, Number(value)]);
  }));
}

const WORKS = ['K, Q and rest', 'rest', 'K', 'Q'];
/** @type {Record<'native' | 'wasm' | 'script', Map<string, number[]>>} */
const found = { native: new Map(), wasm: new Map(), script: new Map() };
/** @param {Map<string, number[]>} into @param {string} name @param {number} value */
const put = (into, name, value) => into.set(name, [...(into.get(name) ?? []), value]);

for (let round = 0; round < ROUNDS; round += 1) {
  for (const [name, value] of lines(native, [])) put(found.native, name, value);
  for (const name of WORKS) put(found.wasm, name, time(50_000, (count) => engine.batch(name, count)));
  put(found.wasm, 'check', time(200, (count) => engine.batch_check(question, count)));
  put(found.wasm, 'check with the border', time(200, (count) => {
    for (let i = 0; i < count; i += 1) engine.check(question, {});
    return count;
  }));
  if (!python) continue;
  const script = fileURLToPath(new URL('brentq.py', import.meta.url));
  for (const [name, value] of lines(python, [script])) put(found.script, name, value);
}

/** @param {number[] | undefined} values */
function shown(values) {
  if (values === undefined) return '–';
  return median(values) >= 10_000 ? `${(median(values) / 1000).toFixed(0)} µs` : `${median(values).toFixed(0)} ns`;
}

/** @param {number[] | undefined} above @param {number[] | undefined} below */
function ratio(above, below) {
  return above === undefined || below === undefined ? '–' : (median(above) / median(below)).toFixed(2);
}

console.log(['work', 'native', 'WebAssembly', 'script', 'WebAssembly/native', 'script/WebAssembly'].join('\t'));
for (const name of [...WORKS, 'check', 'check with the border']) {
  const [a, b, c] = [found.native.get(name), found.wasm.get(name), found.script.get(name)];
  console.log([name, shown(a), shown(b), shown(c), ratio(b, a), ratio(c, b)].join('\t'));
}
if (!python) console.log('The Python script was not run: ./Trunkfile test reference sets its packages up.');
