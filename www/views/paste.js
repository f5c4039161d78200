/** Takes an analysis from the clipboard into the reading: shown first in a line of what was understood. */

import { byId } from '../dom.js';
import { findSpecies } from '../engine.js';
import { formula } from '../format.js';
import { readPasted } from '../paste.js';
import { isRecord } from '../state.js';

/** @import { Case, GasBlock } from '../shiftgauge.js' */
/** @import { Understood } from '../paste.js' */

const panel = byId('paste', HTMLElement);
const open = byId('gas-paste', HTMLButtonElement);
const text = byId('paste-text', HTMLTextAreaElement);
const preview = byId('paste-preview', HTMLElement);
const take = byId('paste-take', HTMLButtonElement);
/** A formula of a species that the library does not have: an inert, say. */
const FORMULA = /^(?:[A-Z][a-z]?\d*|[()·.]\d*)+$/;

/**
 * @typedef {object} Actions
 * @property {() => Case} current
 * @property {(question: Case, said: string) => void} change   takes the case over, as one step that can be undone
 */

/** @param {Actions} actions */
export function connect(actions) {
  open.addEventListener('click', () => show(panel.hidden === true));
  byId('paste-leave', HTMLButtonElement).addEventListener('click', () => show(false));
  panel.addEventListener('keydown', (event) => {
    if (event.key === 'Escape') show(false);
  });
  // What is typed here is no part of the case until it is taken over.
  for (const kind of ['input', 'change']) text.addEventListener(kind, (event) => event.stopPropagation());
  text.addEventListener('input', () => showPreview());
  take.addEventListener('click', () => {
    const found = read(text.value);
    text.value = '';
    show(false);
    actions.change(withPasted(actions.current(), found), `Taken over: ${inWords(found)} Undo takes it back.`);
  });
  byId('gas-rows', HTMLElement).addEventListener('paste', (event) => {
    const pasted = event.clipboardData?.getData('text/plain') ?? '';
    if (!/[\n\t]/.test(pasted.trim())) return;
    const found = read(pasted);
    if (found.entries.length === 0) return;
    event.preventDefault();
    actions.change(withPasted(actions.current(), found), `Pasted: ${inWords(found)} Undo takes it back.`);
  });
}

/** @param {boolean} shown */
function show(shown) {
  panel.hidden = !shown;
  open.setAttribute('aria-expanded', String(shown));
  showPreview();
  (shown ? text : open).focus();
}

function showPreview() {
  const found = read(text.value);
  take.disabled = found.entries.length === 0;
  preview.textContent = text.value.trim() === '' ? 'Nothing pasted yet.' : inWords(found);
}

/** @param {string} pasted */
function read(pasted) {
  return readPasted(pasted, (name) => {
    const [match] = findExact(name);
    if (match !== undefined) return match.formula;
    return FORMULA.test(name) && !/^(?:T|P|Temp|Press)$/.test(name) ? name : null;
  });
}

/** @param {string} name */
function findExact(name) {
  const matches = findSpecies(name.replace(/\(g\)$/, ''));
  return matches.filter(({ formula: bare, names, cas, phase }) => phase === 'g'
    && (bare === name.replace(/\(g\)$/, '') || cas === name || names.some((one) => one.toLowerCase() === name.toLowerCase())));
}

/**
 * @param {Case} question
 * @param {Understood} found
 * @returns {Case}
 */
function withPasted(question, { entries, temperature, pressure }) {
  const was = isRecord(question.reading.gas) ? question.reading.gas : { basis: 'wet', water: null };
  const gas = /** @type {GasBlock} */ ({ ...was, entries });
  return { ...question, temperature: temperature ?? question.temperature, pressure: pressure ?? question.pressure, reading: { ...question.reading, gas } };
}

/** @param {Understood} found */
function inWords({ entries, temperature, pressure, left, asPercent }) {
  const parts = [
    ...(temperature === null ? [] : [`temperature ${temperature}`]),
    ...(pressure === null ? [] : [`pressure ${pressure}`]),
    ...entries.map(({ species, value }) => `${formula(species)} ${value}`),
  ];
  const understood = entries.length === 0 ? 'No species found.' : `${entries.length === 1 ? 'one gas' : `${entries.length} gases`}: ${parts.join(', ')}.`;
  const percent = asPercent ? ' The numbers without a unit add to more than 1, so they are read as %.' : '';
  return `${understood}${percent}${left.length === 0 ? '' : ` Left out: ${left.join(', ')}.`}`;
}
