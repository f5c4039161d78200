/** The reaction's equation, how it was understood, and where K comes from. */

import { byId } from '../dom.js';
import { formula } from '../format.js';
import { asText } from '../state.js';

/** @import { Case, ConstantKind, ConstantSource } from '../shiftgauge.js' */
/** @import { State } from '../state.js' */

const equation = byId('equation', HTMLInputElement);
const understood = byId('understood', HTMLElement);
const from = byId('constant-from', HTMLSelectElement);
const kind = byId('constant-kind', HTMLSelectElement);
const unit = byId('constant-unit', HTMLSelectElement);
const value = byId('constant-value', HTMLInputElement);
const at = byId('constant-at', HTMLInputElement);
const enthalpy = byId('constant-enthalpy', HTMLInputElement);
const heat = byId('constant-heat', HTMLInputElement);
const belongsTo = byId('constant-for', HTMLInputElement);

/** A source of K that this page has no fields for (points, a formula): kept as it came. */
/** @type {ConstantSource | null} */
let kept = null;

/** @param {Case} question */
export function fill(question) {
  const first = question.reactions[0];
  const constant = first?.constant ?? { from: 'library' };
  equation.value = asText(first?.equation);
  kept = ['library', 'value'].includes(constant.from) ? null : constant;
  offerKept(kept);
  from.value = constant.from;
  kind.value = constant.kind ?? 'K';
  unit.value = constant.pressure_unit ?? 'bar';
  value.value = asText(constant.value);
  at.value = asText(constant.at);
  enthalpy.value = asText(constant.enthalpy);
  heat.value = asText(constant.heat_capacity);
  belongsTo.value = asText(constant.for);
}

/** @param {ConstantSource | null} source */
function offerKept(source) {
  from.querySelector('option[data-kept]')?.remove();
  if (source === null) return;
  const option = new Option(`the file (${source.from})`, source.from);
  option.dataset.kept = '';
  from.append(option);
}

/**
 * @param {Case} question
 * @returns {Case}
 */
export function read(question) {
  return { ...question, reactions: [{ equation: equation.value, constant: readConstant() }, ...question.reactions.slice(1)] };
}

/** @returns {ConstantSource} */
function readConstant() {
  if (kept !== null && from.value === kept.from) return kept;
  if (from.value === 'library') return { from: 'library' };
  /** @type {ConstantSource} */
  const constant = { from: 'value', value: value.value, kind: /** @type {ConstantKind} */ (kind.value) };
  if (kind.value === 'Kp') constant.pressure_unit = unit.value;
  if (at.value.trim() !== '') constant.at = at.value;
  if (enthalpy.value.trim() !== '') constant.enthalpy = enthalpy.value;
  if (heat.value.trim() !== '') constant.heat_capacity = heat.value;
  if (belongsTo.value.trim() !== '') constant.for = belongsTo.value;
  return constant;
}

/** @param {State} state */
export function render(state) {
  byId('constant-value-rows', HTMLElement).hidden = from.value !== 'value';
  byId('constant-unit-row', HTMLElement).hidden = kind.value !== 'Kp';
  value.placeholder = kind.value === 'gibbs' ? '-24.6 kJ/mol' : '48.2';
  const { balance } = state;
  if (balance?.ok !== true) {
    understood.textContent = 'Write both sides, with = between them.';
    return;
  }
  const verb = balance.already_balanced ? 'Read as' : 'Balanced to';
  const equationRead = state.current && state.report !== null ? state.report.reactions[0]?.equation : undefined;
  understood.textContent = `${verb} ${formula(equationRead ?? balance.equation)}`;
}
