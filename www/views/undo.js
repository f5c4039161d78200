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
    if (!(event.ctrlKey || event.metaKey) || event.altKey) return;
    const key = event.key.toLowerCase();
    const step = key === 'y' || (key === 'z' && event.shiftKey) ? given.forward : key === 'z' ? given.back : null;
    if (step === null || hasItsOwn(event.target)) return;
    event.preventDefault();
    step();
    inHand = { ...inHand, text: textOf(inHand.field) };
  });
  render();
}

/** The field in hand, and what stood in it when it was taken in hand. */
let inHand = { field: /** @type {EventTarget | null} */ (null), text: '' };
document.addEventListener('focusin', ({ target }) => { inHand = { field: target, text: textOf(target) }; });

/** @param {EventTarget | null} target */
function textOf(target) {
  const holdsText = target instanceof HTMLTextAreaElement || (target instanceof HTMLInputElement && !['radio', 'checkbox', 'file'].includes(target.type));
  return holdsText ? target.value : '';
}

/**
 * What was typed in a field since it was taken in hand is taken back there, by the browser.
 * @param {EventTarget | null} target
 */
function hasItsOwn(target) {
  return target !== null && target === inHand.field && textOf(target) !== inHand.text;
}

/** A button in hand stays pressable by name, so that the focus is not lost at the end of the way. */
export function render() {
  undo.disabled = !(steps?.canGoBack() ?? false) && document.activeElement !== undo;
  redo.disabled = !(steps?.canGoForward() ?? false) && document.activeElement !== redo;
}
