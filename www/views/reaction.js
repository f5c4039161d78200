/** The reaction's equation, and how it was understood. */

import { byId } from '../dom.js';
import { formula } from '../format.js';
import { asText } from '../state.js';
import { suggest } from '../suggest.js';

/** @import { Case } from '../shiftgauge.js' */
/** @import { State } from '../state.js' */

const equation = byId('equation', HTMLInputElement);
const understood = byId('understood', HTMLElement);

suggest(equation);

/** @param {Case} question */
export function fill(question) {
  equation.value = asText(question.reactions[0]?.equation);
}

/**
 * @param {Case} question
 * @returns {Case}
 */
export function read(question) {
  const [first, ...others] = question.reactions;
  return { ...question, reactions: [{ equation: equation.value, constant: first?.constant ?? { from: 'library' } }, ...others] };
}

/** @param {State} state */
export function render({ balance, current, report }) {
  if (balance?.ok !== true) {
    understood.textContent = 'Write both sides, with = between them.';
    return;
  }
  const verb = balance.already_balanced ? 'Read as' : 'Balanced to';
  const equationRead = current && report !== null ? report.reactions[0]?.equation : undefined;
  understood.textContent = `${verb} ${formula(equationRead ?? balance.equation)}`;
}
