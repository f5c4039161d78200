// The built engine, loaded the way the page loads it.

import { readFileSync } from 'node:fs';
import * as engine from '../../dist/shiftgauge.js';

export { engine };

export const ENGINE_BYTES = readFileSync(new URL('../../dist/shiftgauge_bg.wasm', import.meta.url));

/** The engine, started once for each test file. */
export function startedEngine() {
  engine.initSync({ module: ENGINE_BYTES });
  return engine;
}
