/** The case's title and note, and what the file holds that this page does not show. */

import { byId } from '../dom.js';
import { asText } from '../state.js';

/** @import { Case } from '../shiftgauge.js' */
/** @import { State } from '../state.js' */

const title = byId('title', HTMLInputElement);
const note = byId('note', HTMLTextAreaElement);
const unseen = byId('kept-unseen', HTMLElement);

/** @param {Case} question */
export function fill(question) {
  title.value = asText(question.title);
  note.value = asText(question.note);
}

/**
 * @param {Case} question
 * @returns {Case}
 */
export function read(question) {
  return { ...question, title: title.value, note: note.value };
}

/** @param {State} state */
export function render({ question }) {
  document.title = question.title === '' ? 'Shiftgauge' : `${question.title} · Shiftgauge`;
  const parts = [
    question.reactions.length > 1 && 'further reactions',
    question.feed?.liquid && 'a liquid feed',
    question.feed?.solids && 'solids in the feed',
    question.feed?.solution && 'a dissolved feed',
    question.heat === 'adiabatic' && 'adiabatic operation',
  ].filter((part) => typeof part === 'string');
  unseen.hidden = parts.length === 0;
  unseen.textContent = `The case also holds ${parts.join(', ')}: kept in the file and given to the engine, with no fields on this page.`;
}
