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

/** Above this the start from the library does not reach: three points do not tell more. */
const HIGHEST_K = 1000;

/**
 * Starts from the library's record: its figures at 298.15 K, and C°p = a + b T + c/T² through three points.
 * @param {Sheet} sheet
 */
export function startFrom(sheet) {
  const low = Math.max(sheet.range_k[0], 298.15);
  const high = Math.max(Math.min(sheet.range_k[1], HIGHEST_K), low + 1);
  edit({
    species: sheet.species, names: sheet.names.join('; '), cas: sheet.cas,
    enthalpy: `${(sheet.enthalpy_of_formation_j_per_mol / 1000).toFixed(3)} kJ/mol`,
    entropy: `${sheet.entropy_j_per_mol_k.toFixed(3)} J/(mol K)`, gibbs: '',
    heat_capacity: [{ from: `${Math.min(low, 298.15)} K`, to: `${high} K`, terms: heatThrough(sheet, [low, (low + high) / 2, high]) }],
    source: '',
  });
}

/**
 * @param {Sheet} sheet
 * @param {[number, number, number]} kelvins
 * @returns {Record<string, string>}
 */
function heatThrough({ curve }, kelvins) {
  const [x, y, z] = kelvins;
  const [p, q, r] = /** @type {[number, number, number]} */ (kelvins.map((t) => heatAt(curve, t)));
  // The slopes of the two chords are b - c (s + t)/(s t)^2.
  const bend = (/** @type {number} */ s, /** @type {number} */ t) => (s + t) / (s * t) ** 2;
  const [first, second] = [(q - p) / (y - x), (r - q) / (z - y)];
  const c = (second - first) / (bend(x, y) - bend(y, z));
  const b = first + c * bend(x, y);
  const a = p - b * x - c / x ** 2;
  return { 1: a.toPrecision(6), T: b.toPrecision(6), '1/T^2': c.toPrecision(6) };
}

/**
 * @param {Sheet['curve']} curve
 * @param {number} kelvin
 */
function heatAt({ temperature_k: kelvins, heat_capacity_j_per_mol_k: heats }, kelvin) {
  const after = Math.min(Math.max(kelvins.findIndex((t) => t >= kelvin), 1), kelvins.length - 1);
  const [low = 0, high = 1, below = 0, above = 0] = [kelvins[after - 1], kelvins[after], heats[after - 1], heats[after]];
  return below + ((above - below) * (kelvin - low)) / (high - low || 1);
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
