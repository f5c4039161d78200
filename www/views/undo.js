/** Undo and redo of the whole case, by two buttons and by the usual keys outside of text fields. */

import { byId } from '../dom.js';

const undo = byId('undo', HTMLButtonElement);
const redo = byId('redo', HTMLButtonElement);

/**
 * @typedef {object} Steps
 * @property {() => void} back
 * @property {() => void} forward
 * @property {() => boolean} canGoBack
 * @property {() => boolean} canGoForward
 */

/** @type {Steps | null} */
let steps = null;

/** @param {Steps} given */
export function connect(given) {
  steps = given;
  undo.addEventListener('click', given.back);
  redo.addEventListener('click', given.forward);
  document.addEventListener('keydown', (event) => {
    if (!(event.ctrlKey || event.metaKey) || event.altKey || hasItsOwnUndo(event.target)) return;
    const key = event.key.toLowerCase();
    const step = key === 'y' || (key === 'z' && event.shiftKey) ? given.forward : key === 'z' ? given.back : null;
    if (step === null) return;
    event.preventDefault();
    step();
  });
  render();
}

/** @param {EventTarget | null} target */
function hasItsOwnUndo(target) {
  return target instanceof HTMLTextAreaElement || (target instanceof HTMLInputElement && !['radio', 'checkbox', 'file'].includes(target.type));
}

/** A button in hand stays pressable by name, so that the focus is not lost at the end of the way. */
export function render() {
  undo.disabled = !(steps?.canGoBack() ?? false) && document.activeElement !== undo;
  redo.disabled = !(steps?.canGoForward() ?? false) && document.activeElement !== redo;
}
