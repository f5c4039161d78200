/** Dissolved species of a solution in water, and how much of it there is; folded away until it is wanted. */

import { byId } from '../dom.js';
import { createEntries, placeRow } from '../entries.js';
import { unfold } from '../folds.js';
import { asText, fieldsOf, isRecord } from '../state.js';
import { understoodSpecies } from '../understood.js';

/** @import { Case } from '../shiftgauge.js' */
/** @import { State } from '../state.js' */

const extent = byId('solution-extent', HTMLSelectElement);
const size = byId('solution-size', HTMLInputElement);
const sizeRow = byId('solution-size-row', HTMLElement);
const count = byId('solution-count', HTMLElement);
const entries = createEntries(byId('solution-rows', HTMLElement), 'solution-row-template');

byId('solution-add', HTMLButtonElement).addEventListener('click', () => entries.add('', '').species.focus());

/** @param {Case} question */
export function fill(question) {
  const solution = fieldsOf(question.reading.solution);
  extent.value = ['volume', 'water'].find((way) => asText(solution[way]) !== '') ?? 'none';
  size.value = asText(solution[extent.value]);
  entries.clear();
  for (const entry of Array.isArray(solution.entries) ? solution.entries : []) {
    if (isRecord(entry)) entries.add(asText(entry.species), asText(entry.value));
  }
  unfold('solution-fold', entries.given().length > 0);
}

/**
 * @param {Case} question
 * @returns {Case}
 */
export function read(question) {
  const rows = entries.given();
  rows.forEach((row, index) => placeRow(row, `reading.solution.entries[${index}]`));
  if (rows.length === 0 && extent.value === 'none') return { ...question, reading: { ...question.reading, solution: null } };
  size.dataset.field = `reading.solution.${extent.value}`;
  const solution = {
    ...fieldsOf(question.reading.solution),
    volume: extent.value === 'volume' ? size.value : null,
    water: extent.value === 'water' ? size.value : null,
    entries: rows.map((row) => ({ species: row.species.value.trim(), value: row.value.value })),
  };
  return { ...question, reading: { ...question.reading, solution } };
}

/** @param {State} state */
export function render(state) {
  sizeRow.hidden = extent.value === 'none';
  size.placeholder = extent.value === 'water' ? '1000 kg' : '1 m3';
  const dissolved = understoodSpecies(state)?.filter(({ phase }) => phase === 'aq').map(({ species }) => species);
  if (dissolved !== undefined) entries.offer(dissolved);
  if (dissolved !== undefined && dissolved.length > 0) unfold('solution-fold', true);
  for (const row of entries.all()) row.root.classList.toggle('is-offered', row.offered);
  const rows = entries.given().length;
  count.textContent = rows === 0 ? 'none' : rows === 1 ? 'one species' : `${rows} species`;
}
