/** What was assumed, converted or extrapolated; cautions join the paragraph that is always there. */

import { byId, create } from '../dom.js';

/** @import { State } from '../state.js' */

const list = byId('note-list', HTMLElement);
const cautions = byId('caution-text', HTMLElement);

/** @param {State} state */
export function render({ report }) {
  const notes = report?.notes ?? [];
  const quiet = notes.filter(({ level }) => level !== 'caution');
  list.replaceChildren(...quiet.map(({ text, level }) => create('li', { 'data-level': level }, text)));
  list.closest('section')?.toggleAttribute('hidden', quiet.length === 0);
  cautions.textContent = notes.filter(({ level }) => level === 'caution').map(({ text }) => text).join(' ');
}
