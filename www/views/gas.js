/** The gas of the reading, with what the analyser counts in and what the sample lost. */

import { byId } from '../dom.js';
import { unfold } from '../folds.js';
import { createGasBlock } from '../gas-block.js';
import { fieldsOf, isRecord } from '../state.js';

/** @import { Case } from '../shiftgauge.js' */
/** @import { State } from '../state.js' */

const block = createGasBlock('gas', 'reading.gas');
const includesArgon = byId('gas-includes-argon', HTMLInputElement);
const lost = byId('gas-lost', HTMLInputElement);
const ARGON = { includes: 'Ar' };

/** @param {Case} question */
export function fill(question) {
  const gas = fieldsOf(question.reading.gas);
  block.fill(gas);
  includesArgon.checked = Array.isArray(gas.entries) && gas.entries.some((entry) => isRecord(entry) && entry.includes === 'Ar');
  lost.value = Array.isArray(gas.lost) ? gas.lost.filter((species) => typeof species === 'string').join(', ') : '';
  unfold('gas-more', includesArgon.checked || lost.value !== '');
}

/**
 * @param {Case} question
 * @returns {Case}
 */
export function read(question) {
  const species = lost.value.split(/[\s,;]+/).filter((name) => name !== '');
  const was = { ...fieldsOf(question.reading.gas) };
  delete was.lost;
  const gas = block.read(was, (name) => (name === 'O2' && includesArgon.checked ? ARGON : {}));
  return { ...question, reading: { ...question.reading, gas: gas === null || species.length === 0 ? gas : { ...gas, lost: species } } };
}

/** @param {State} state */
export function render(state) {
  block.render(state);
}
