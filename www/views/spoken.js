/** Tells screen readers the answer, once typing has paused. */

import { byId } from '../dom.js';

/** @import { State } from '../state.js' */

const PAUSE_MS = 900;
const spoken = byId('spoken', HTMLElement);
let timer = 0;

/** @param {State} state */
export function render({ problems, current }) {
  window.clearTimeout(timer);
  timer = window.setTimeout(() => {
    const line = byId('sentence', HTMLElement).textContent?.replace(/^[→←⇌?]/, '') ?? '';
    spoken.textContent = current ? line : `Out of date. ${problems.map(({ message }) => message).join(' ')}`;
  }, PAUSE_MS);
}
