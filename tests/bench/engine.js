// The work inside the engine in Node, and one `check` with the border as the page calls it.
// usage: node engine.js FOLDER, where FOLDER holds the engine built with the feature `bench`.

import { readFileSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { argv } from 'node:process';
import { pathToFileURL } from 'node:url';
import { startedEngine } from '../engine/engine.js';
import { timeBatches } from './batches.js';

const PLACE = 'Node';
/** @type {import('../../www/shiftgauge.d.ts').Options} */
const OPTIONS = { language: 'en', units: 'as typed' };
const folder = resolve(argv[2] ?? '');
const { initSync, Bench } = await import(pathToFileURL(join(folder, 'shiftgauge.js')).href);
initSync({ module: readFileSync(join(folder, 'shiftgauge_bg.wasm')) });

for (const line of timeBatches(Bench.set_up(), Bench.names(), PLACE)) {
  console.log(JSON.stringify(line));
}
console.log(JSON.stringify({ place: PLACE, work: 'check of a case', sum: null, ns: checks() }));

/** Objects cross both ways, once a check. */
function checks() {
  const engine = startedEngine();
  const question = JSON.parse(
    readFileSync(new URL('../mistakes/base.json', import.meta.url), 'utf8'),
  );
  const count = 100;
  const batch = () => {
    const start = performance.now();
    for (let turn = 0; turn < count; turn += 1) engine.check(question, OPTIONS);
    return ((performance.now() - start) * 1e6) / count;
  };
  batch();
  return Array.from({ length: 7 }, batch);
}
