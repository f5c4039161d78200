import { startEngine } from './engine.js';
import { keepOffline } from './offline/keep.js';

const engine = await startEngine();
const output = document.getElementById('version');
if (output) output.textContent = engine.version();
keepOffline(() => {});
