/** The working, line by line; the numbers of the answer lead here. */

import { byId, create } from '../dom.js';

/** @import { State } from '../state.js' */

const lines = byId('working-lines', HTMLElement);

/** @param {State} state */
export function render({ report }) {
  const named = new Set();
  lines.replaceChildren(...(report?.steps ?? []).map(({ text, about }) => {
    if (!about || named.has(about)) return create('li', {}, text);
    named.add(about);
    return create('li', { id: `working-${about}`, tabindex: '-1' }, text);
  }));
}
