/** Solids and liquids: each row its own phase in the case, by amount or as present or absent. */

import { byId, part } from '../dom.js';
import { createEntries, placeRow } from '../entries.js';
import { asText, isRecord } from '../state.js';
import { understoodSpecies } from '../understood.js';

/** @import { Block, Case } from '../shiftgauge.js' */
/** @import { Row } from '../entries.js' */
/** @import { State } from '../state.js' */

/** @typedef {'solids' | 'liquid'} BlockName */
/** @type {readonly { block: BlockName, phase: string }[]} */
const BLOCKS = [{ block: 'solids', phase: 's' }, { block: 'liquid', phase: 'l' }];
const entries = createEntries(byId('pure-rows', HTMLElement), 'pure-row-template', () => {}, (row, { phase }) => {
  phaseOf(row).value = phase;
});

byId('pure-add', HTMLButtonElement).addEventListener('click', () => entries.add('', '').species.focus());

/** @param {Row} row */
const phaseOf = (row) => part(row.root, 'phase', HTMLSelectElement);

/** @param {Case} question */
export function fill(question) {
  entries.clear();
  for (const { block, phase } of BLOCKS) {
    const found = question.reading[block];
    for (const entry of isRecord(found) && Array.isArray(found.entries) ? found.entries : []) {
      if (isRecord(entry)) phaseOf(entries.add(asText(entry.species), asText(entry.value))).value = phase;
    }
  }
}

/**
 * @param {Case} question
 * @returns {Case}
 */
export function read(question) {
  const reading = { ...question.reading };
  for (const { block, phase } of BLOCKS) {
    const rows = entries.given().filter((row) => phaseOf(row).value === phase);
    rows.forEach((row, index) => placeRow(row, `reading.${block}.entries[${index}]`));
    const was = isRecord(reading[block]) ? reading[block] : {};
    reading[block] = rows.length === 0 ? null : /** @type {Block} */ ({
      ...was,
      entries: rows.map((row) => ({ species: row.species.value.trim(), value: row.value.value })),
    });
  }
  return { ...question, reading };
}

/** @param {State} state */
export function render(state) {
  const pure = understoodSpecies(state)?.filter(({ phase }) => phase === 's' || phase === 'l');
  if (pure !== undefined) {
    entries.offer(pure.map(({ species }) => species));
    for (const row of entries.all().filter((one) => one.offered)) {
      phaseOf(row).value = pure.find(({ species }) => species === row.species.value)?.phase ?? 's';
    }
  }
  for (const row of entries.all()) row.root.classList.toggle('is-offered', row.offered);
  byId('pure-hint', HTMLElement).hidden = entries.all().length > 0;
  byId('mixture-hint', HTMLElement).hidden = entries.given().filter((row) => phaseOf(row).value === 'l').length < 2;
}
