/** What was assumed, converted or extrapolated; cautions join the paragraph that is always there. */

import { byId, create } from '../dom.js';
import { formulaWriter } from '../formulas.js';

/** @import { State } from '../state.js' */

const list = byId('note-list', HTMLElement);
const cautions = byId('caution-text', HTMLElement);

/** @param {State} state */
export function render({ report }) {
  const notes = report?.notes ?? [];
  const quiet = notes.filter(({ level }) => level !== 'caution');
  const write = report === null ? String : formulaWriter(report);
  list.replaceChildren(...quiet.map(({ text, level }) => create('li', { 'data-level': level }, write(text))));
  list.closest('section')?.toggleAttribute('hidden', quiet.length === 0);
  // The general caution stands in the page itself, so that it is there without an answer too.
  const further = notes.filter(({ level, code }) => level === 'caution' && code !== 'equilibrium-is-not-rate');
  cautions.textContent = further.map(({ text }) => text).join(' ');
}
