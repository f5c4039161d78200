/**
 * The rows of one block of the reading: a species and its value each. Rows for the species of the
 * reaction are offered by themselves and count only once something is typed into them.
 */

import { copyTemplate, part } from './dom.js';
import { formula } from './format.js';
import { suggest } from './suggest.js';
import { withoutPhase } from './understood.js';
import { attach, nameChooser } from './units.js';

/** @import { SpeciesMatch } from './shiftgauge.js' */

/**
 * @typedef {object} Row
 * @property {HTMLElement} root
 * @property {HTMLLabelElement} name
 * @property {HTMLInputElement} species
 * @property {HTMLInputElement} value
 * @property {boolean} offered   put here by the reaction, and nothing typed yet
 */

let serial = 0;

/**
 * @param {HTMLElement} list       where the rows stand
 * @param {string} template        the id of the row's template
 * @param {(row: Row) => void} [prepare]   what else a new row needs
 * @param {(row: Row, match: SpeciesMatch) => void} [picked]   a species of the library was taken
 */
export function createEntries(list, template, prepare = () => {}, picked = () => {}) {
  /** @type {Row[]} */
  let rows = [];
  const tellForm = () => list.dispatchEvent(new Event('input', { bubbles: true }));

  /** @param {Row} row */
  function remove(row) {
    const index = rows.indexOf(row);
    rows = rows.filter((other) => other !== row);
    row.root.remove();
    (rows[index] ?? rows[index - 1])?.value.focus();
    tellForm();
  }

  /**
   * @param {string} species
   * @param {string} value
   * @param {boolean} [offered]
   * @returns {Row}
   */
  function add(species, value, offered = false) {
    const root = copyTemplate(template);
    const row = {
      root, offered,
      name: part(root, 'name', HTMLLabelElement),
      species: part(root, 'species', HTMLInputElement),
      value: part(root, 'value', HTMLInputElement),
    };
    serial += 1;
    row.value.id = `entry-${serial}`;
    row.name.htmlFor = row.value.id;
    row.species.value = species;
    row.value.value = value;
    row.value.addEventListener('input', () => { row.offered = false; });
    part(root, 'remove', HTMLButtonElement).addEventListener('click', () => remove(row));
    attach(row.value);
    suggest(row.species, (match) => picked(row, match));
    prepare(row);
    rows.push(row);
    list.append(root);
    nameRow(row, false);
    return row;
  }

  /**
   * Offers a row for every species of the reaction, takes back offers that no longer hold, and
   * shows the species of the reaction as names rather than as fields.
   * @param {readonly string[]} wanted
   */
  function offer(wanted) {
    for (const row of rows.filter((one) => one.offered && !wanted.includes(withoutPhase(one.species.value)))) {
      rows = rows.filter((one) => one !== row);
      row.root.remove();
    }
    for (const species of wanted) {
      if (!rows.some((row) => withoutPhase(row.species.value) === species)) add(species, '', true);
    }
    for (const row of rows) nameRow(row, wanted.includes(withoutPhase(row.species.value)));
  }

  return {
    add,
    offer,
    /** Takes every row away. */
    clear() {
      rows = [];
      list.replaceChildren();
    },
    /** The rows that belong to the reading: all but the offers that nobody took up, and rows still empty. */
    given: () => rows.filter(({ offered, species, value }) => !offered && (species.value + value.value).trim() !== ''),
    all: () => rows,
  };
}

/**
 * @param {Row} row
 * @param {boolean} inReaction
 */
function nameRow(row, inReaction) {
  const species = row.species.value.trim();
  const asName = inReaction && document.activeElement !== row.species;
  row.name.hidden = !asName;
  row.species.closest('.combobox')?.toggleAttribute('hidden', asName);
  row.name.textContent = formula(species);
  row.value.setAttribute('aria-label', species === '' ? 'Value' : `${formula(species)}, value`);
  nameChooser(row.value);
  part(row.root, 'remove', HTMLButtonElement).setAttribute('aria-label', species === '' ? 'Remove this row' : `Remove ${formula(species)}`);
}

/**
 * Tells the fields of a row their places in the case, so that problems find them.
 * @param {Row} row
 * @param {string} path   such as `reading.gas.entries[2]`
 */
export function placeRow(row, path) {
  row.species.dataset.field = `${path}.species`;
  row.value.dataset.field = `${path}.value`;
  row.root.dataset.field = path;
}
