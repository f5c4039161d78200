/** The form for a species of one's own: filled from the library or the book, looked through by the engine. */

import { byId, copyTemplate, create, part } from '../dom.js';
import { book as lookThrough } from '../engine.js';
import { asText, fieldsOf } from '../state.js';

/** @import { OwnHeat, OwnSpecies, Sheet } from '../shiftgauge.js' */

const form = byId('own', HTMLFormElement);
const heat = byId('own-heat', HTMLElement);
const problems = byId('own-problems', HTMLElement);
const fields = [...form.querySelectorAll('[data-own]')].filter((field) => field instanceof HTMLInputElement);

/** @type {(entry: OwnSpecies) => void} */
let keep = () => {};

/** @param {{ keep: (entry: OwnSpecies) => void }} actions */
export function connect(actions) {
  ({ keep } = actions);
  byId('own-range', HTMLButtonElement).addEventListener('click', () => addRange({ from: lastEnd(), to: '', terms: {} }));
  byId('own-cancel', HTMLButtonElement).addEventListener('click', () => { form.hidden = true; });
  form.addEventListener('submit', (event) => {
    event.preventDefault();
    const entry = read();
    const answer = lookThrough({ species: [entry] });
    mark(answer.ok ? [] : answer.problems);
    if (!answer.ok) return;
    form.hidden = true;
    keep(entry);
  });
}

/** @param {OwnSpecies | null} entry */
export function edit(entry) {
  const given = fieldsOf(entry);
  for (const field of fields) field.value = asText(given[field.dataset.own ?? '']);
  heat.replaceChildren();
  const ranges = Array.isArray(given.heat_capacity) && given.heat_capacity.length > 0 ? given.heat_capacity : [{ from: '', to: '', terms: {} }];
  for (const one of ranges) addRange(one);
  mark([]);
  form.hidden = false;
  byId('own-heading', HTMLElement).focus({ preventScroll: true });
  form.scrollIntoView({ block: 'nearest' });
}

/**
 * Starts from the library's record: its figures at 298.15 K, and C°p through three points of its curve.
 * @param {Sheet} sheet
 */
export function startFrom(sheet) {
  const [low, high] = sheet.range_k;
  edit({
    species: sheet.species, names: sheet.names.join('; '), cas: sheet.cas,
    enthalpy: `${(sheet.enthalpy_of_formation_j_per_mol / 1000).toFixed(3)} kJ/mol`,
    entropy: `${sheet.entropy_j_per_mol_k.toFixed(3)} J/(mol K)`, gibbs: '',
    heat_capacity: [{ from: `${low} K`, to: `${high} K`, terms: { 1: sheet.heat_capacity_j_per_mol_k.toFixed(3) } }],
    source: '',
  });
}

/** @returns {string} */
function lastEnd() {
  const row = heat.lastElementChild;
  return row instanceof HTMLElement ? part(row, 'to', HTMLInputElement).value : '';
}

/** @param {unknown} given */
function addRange(given) {
  const { from, to, terms, transition } = fieldsOf(given);
  const row = copyTemplate('own-heat-template');
  part(row, 'from', HTMLInputElement).value = asText(from);
  part(row, 'to', HTMLInputElement).value = asText(to);
  part(row, 'transition', HTMLInputElement).value = asText(transition);
  for (const field of termsOf(row)) field.value = asText(fieldsOf(terms)[field.dataset.term ?? '']);
  part(row, 'remove', HTMLButtonElement).addEventListener('click', () => row.remove());
  heat.append(row);
}

/** @param {HTMLElement} row */
const termsOf = (row) => [...row.querySelectorAll('[data-term]')].filter((field) => field instanceof HTMLInputElement);

/** @returns {OwnSpecies} */
function read() {
  /** @type {Record<string, string>} */
  const figures = {};
  for (const field of fields) if (field.value.trim() !== '') figures[field.dataset.own ?? ''] = field.value.trim();
  const rows = [...heat.children].filter((row) => row instanceof HTMLElement);
  return { species: '', source: '', ...figures, heat_capacity: rows.map(readRange) };
}

/**
 * @param {HTMLElement} row
 * @returns {OwnHeat}
 */
function readRange(row) {
  const transition = part(row, 'transition', HTMLInputElement).value.trim();
  const terms = termsOf(row).filter((field) => field.value.trim() !== '').map((field) => [field.dataset.term ?? '', field.value.trim()]);
  return {
    from: part(row, 'from', HTMLInputElement).value, to: part(row, 'to', HTMLInputElement).value, terms: Object.fromEntries(terms),
    ...(transition === '' ? {} : { transition }),
  };
}

/** @param {readonly { field: string, message: string, hint: string }[]} found */
function mark(found) {
  for (const field of form.querySelectorAll('[aria-invalid]')) field.removeAttribute('aria-invalid');
  for (const { field: path } of found) fieldOf(path.replace('species[0].', ''))?.setAttribute('aria-invalid', 'true');
  problems.hidden = found.length === 0;
  problems.replaceChildren(...found.map(({ message, hint }) => create('li', {}, create('strong', {}, message), ` ${hint}`)));
}

/**
 * The field that a path of the engine means.
 * @param {string} path   such as `enthalpy` or `heat_capacity[1].terms.T`
 */
function fieldOf(path) {
  const [, place, rest] = /^heat_capacity(?:\[(\d+)\])?\.?(.*)$/.exec(path) ?? [];
  if (rest === undefined) return fields.find((field) => field.dataset.own === path);
  const row = heat.children[Number(place ?? 0)];
  const name = rest.replace(/^terms\.?/, '');
  return row?.querySelector(`[data-part="${name}"], [data-term="${CSS.escape(name || '1')}"]`) ?? row?.querySelector('[data-part="from"]');
}
