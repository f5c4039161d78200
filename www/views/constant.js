/** Where K comes from: the library, a value, points, a formula in T, or the reading itself. */

import { byId } from '../dom.js';
import { unfold } from '../folds.js';
import { linesOfPoints, pointsOfLines } from '../points.js';
import { asText, fieldsOf, isRecord } from '../state.js';

/** Sources that need nothing else than their name. */
const BARE = ['library', 'species', 'book'];

/** @import { Case, ConstantKind, ConstantSource } from '../shiftgauge.js' */

/** @param {string} name */
const input = (name) => byId(`constant-${name}`, HTMLInputElement);

const from = byId('constant-from', HTMLSelectElement);
const kind = byId('constant-kind', HTMLSelectElement);
const formulaKind = byId('constant-formula-kind', HTMLSelectElement);
const unit = byId('constant-unit', HTMLSelectElement);
const points = byId('constant-points', HTMLTextAreaElement);
const formulaUnit = byId('constant-formula-unit', HTMLSelectElement);
const range = [input('range-from'), input('range-to')];
const tolerance = input('tolerance');
const value = input('value');
/** What a value may carry beside itself, by the name in the case. */
const extras = { at: input('at'), enthalpy: input('enthalpy'), heat_capacity: input('heat') };
/** What any source may carry. */
const shared = { for: input('for'), approach: input('approach') };
const { approach } = shared;
const terms = [...document.querySelectorAll('[data-term]')].filter((field) => field instanceof HTMLInputElement);
/** What the fields stand for, by source; all else in the case's constant is kept as it came. */
const OWN = ['from', 'kind', 'pressure_unit', 'value', 'points', 'terms', 'range', 'tolerance', ...Object.keys(extras), ...Object.keys(shared)];
/** @type {Record<string, unknown>} */
let others = {};

/** @param {Case} question */
export function fill(question) {
  const found = question.reactions[0]?.constant;
  /** @type {Record<string, unknown>} */
  const constant = isRecord(found) ? found : { from: 'library' };
  others = Object.fromEntries(Object.entries(constant).filter(([name]) => !OWN.includes(name)));
  choose(from, asText(constant.from), 'library');
  choose(kind, asText(constant.kind), 'K');
  choose(formulaKind, asText(constant.kind), 'log10 K');
  choose(unit, asText(constant.pressure_unit), 'bar');
  choose(formulaUnit, asText(constant.pressure_unit), '');
  const ends = Array.isArray(constant.range) ? constant.range : [];
  range.forEach((field, index) => { field.value = asText(ends[index]); });
  tolerance.value = asText(constant.tolerance);
  value.value = asText(constant.value);
  points.value = linesOfPoints(constant.points);
  for (const [name, field] of Object.entries({ ...extras, ...shared })) field.value = asText(constant[name]);
  const given = fieldsOf(constant.terms);
  for (const field of terms) field.value = asText(given[field.dataset.term ?? '']);
  unfold('constant-more', Object.values(shared).some((field) => field.value !== ''));
}

/**
 * @param {HTMLSelectElement} select
 * @param {string} wanted
 * @param {string} usual
 */
function choose(select, wanted, usual) {
  select.value = wanted;
  if (select.selectedIndex === -1) select.value = usual;
}

/**
 * @param {Case} question
 * @returns {Case}
 */
export function read(question) {
  const [first, ...further] = question.reactions;
  return { ...question, reactions: [{ equation: first?.equation ?? '', constant: readConstant() }, ...further] };
}

/** @returns {ConstantSource} */
function readConstant() {
  const source = from.value;
  /** @type {ConstantSource} */
  const constant = { ...(BARE.includes(source) ? {} : others), from: source };
  if (source === 'value' || source === 'points') {
    constant.kind = /** @type {ConstantKind} */ (kind.value);
    if (kind.value === 'Kp') constant.pressure_unit = unit.value;
  }
  if (source === 'value') {
    constant.value = value.value;
    addGiven(constant, extras);
  }
  if (source === 'points') constant.points = pointsOfLines(points.value);
  if (source === 'formula') {
    constant.kind = /** @type {ConstantKind} */ (formulaKind.value);
    constant.terms = Object.fromEntries(terms.filter((field) => field.value.trim() !== '').map((field) => [field.dataset.term ?? '', field.value]));
    if (formulaUnit.value !== '') constant.pressure_unit = formulaUnit.value;
    if (range.some((field) => field.value.trim() !== '')) constant.range = range.map((field) => field.value);
    addGiven(constant, { tolerance });
  }
  if (source === 'reading') addGiven(constant, { enthalpy: extras.enthalpy });
  addGiven(constant, BARE.includes(source) ? { approach } : shared);
  return constant;
}

/**
 * @param {ConstantSource} constant
 * @param {Record<string, HTMLInputElement>} fields
 */
function addGiven(constant, fields) {
  for (const [name, field] of Object.entries(fields)) if (field.value.trim() !== '') constant[name] = field.value;
}

export function render() {
  for (const part of document.querySelectorAll('[data-constant]')) {
    if (part instanceof HTMLElement) part.hidden = !(part.dataset.constant ?? '').split(' ').includes(from.value);
  }
  byId('constant-unit-row', HTMLElement).hidden = kind.value !== 'Kp' || !['value', 'points'].includes(from.value);
  value.placeholder = kind.value === 'gibbs' ? '-24.6 kJ/mol' : '48.2';
}
