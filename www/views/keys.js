/** Signs and units that a screen's keyboard hides, offered under the field in hand. */

import { byId, create } from '../dom.js';
import { withUnit } from '../unit-text.js';

const bar = byId('keys', HTMLElement);
/** Only where fingers type; a keyboard on the desk has what it needs, and `+/-` reads as ±. */
const byFinger = window.matchMedia('(pointer: coarse)');

/** What was pressed elsewhere must not move away under the finger: the bar leaves after it is pressed. */
const LEAVE_MS = 350;
let leaving = 0;

document.addEventListener('focusin', ({ target }) => {
  window.clearTimeout(leaving);
  const keys = target instanceof HTMLInputElement && byFinger.matches ? keysOf(target) : [];
  if (!(target instanceof HTMLInputElement) || keys.length === 0) {
    if (!(target instanceof Node && bar.contains(target))) leaving = window.setTimeout(() => { bar.hidden = true; }, LEAVE_MS);
    return;
  }
  bar.replaceChildren(...keys);
  (target.closest('.row, .entry') ?? target).after(bar);
  bar.hidden = false;
});

/** @param {HTMLInputElement} field */
function keysOf(field) {
  const units = field.dataset.units?.split('|') ?? [];
  const signs = units.length > 0 || field.dataset.keys === '±' ? ['±'] : [];
  return [
    ...signs.map((sign) => key(sign, () => insert(field, sign))),
    ...units.map((unit) => key(unit, () => {
      field.value = withUnit(field.value, unit, units);
      field.dispatchEvent(new Event('input', { bubbles: true }));
    })),
  ];
}

/**
 * @param {string} label
 * @param {() => void} pressed
 */
function key(label, pressed) {
  const button = create('button', { type: 'button', tabindex: '-1' }, label);
  // The field keeps the focus, so the keyboard on the screen stays.
  button.addEventListener('pointerdown', (event) => event.preventDefault());
  button.addEventListener('click', pressed);
  return button;
}

/**
 * @param {HTMLInputElement} field
 * @param {string} sign
 */
function insert(field, sign) {
  const [start, end] = [field.selectionStart ?? field.value.length, field.selectionEnd ?? field.value.length];
  const before = field.value.slice(0, start);
  field.setRangeText(`${before === '' || before.endsWith(' ') ? '' : ' '}${sign} `, start, end, 'end');
  field.dispatchEvent(new Event('input', { bubbles: true }));
}

export function render() {
  // What is offered hangs on the field in hand alone, not on the state.
}
