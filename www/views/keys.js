/** Signs and units that a screen's keyboard hides, offered under the field in hand. */

import { byId, create } from '../dom.js';

const bar = byId('keys', HTMLElement);
/** Only where fingers type; a keyboard on the desk has what it needs, and `+/-` reads as ±. */
const byFinger = window.matchMedia('(pointer: coarse)');

document.addEventListener('focusin', ({ target }) => {
  if (!(target instanceof HTMLInputElement) || target.dataset.keys === undefined || !byFinger.matches) {
    if (!(target instanceof Node && bar.contains(target))) bar.hidden = true;
    return;
  }
  const keys = target.dataset.keys.split(' ').map((sign) => {
    const key = create('button', { type: 'button', tabindex: '-1' }, sign);
    // The field keeps the focus, so the keyboard on the screen stays.
    key.addEventListener('pointerdown', (event) => event.preventDefault());
    key.addEventListener('click', () => insert(target, sign));
    return key;
  });
  bar.replaceChildren(...keys);
  (target.closest('.row, .entry') ?? target).after(bar);
  bar.hidden = false;
});

/**
 * @param {HTMLInputElement} field
 * @param {string} sign
 */
function insert(field, sign) {
  const [start, end] = [field.selectionStart ?? field.value.length, field.selectionEnd ?? field.value.length];
  const before = field.value.slice(0, start);
  const gap = before === '' || before.endsWith(' ') ? '' : ' ';
  const wholeWord = sign === 'present' || sign === 'absent';
  if (wholeWord) field.value = sign;
  else field.setRangeText(gap + sign + (sign === '±' ? ' ' : ''), start, end, 'end');
  field.dispatchEvent(new Event('input', { bubbles: true }));
}

export function render() {
  // What is offered hangs on the field in hand alone, not on the state.
}
