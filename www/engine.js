// Starts the engine: from the bytes inside the page in one file, else from the file beside it.

import init, * as engine from './shiftgauge.js';

export async function startEngine() {
  const embedded = document.getElementById('engine-bytes');
  if (embedded) engine.initSync({ module: new WebAssembly.Module(bytesOf(embedded.textContent ?? '')) });
  else await init({ module_or_path: new URL('./shiftgauge_bg.wasm', document.baseURI) });
  return engine;
}

/** @param {string} base64 */
function bytesOf(base64) {
  if (Uint8Array.fromBase64) return Uint8Array.fromBase64(base64);
  return Uint8Array.from(atob(base64), (character) => character.charCodeAt(0));
}
