/** K in its forms, each with its unit and standard state, and where its figures come from. */

import { byId, create } from '../dom.js';
import { NO_BREAK, fixed, fromLog10, molarEnergy, significant, speciesName, unit } from '../format.js';

/** @import { Form, ReactionReport, RecordReport } from '../shiftgauge.js' */
/** @import { State } from '../state.js' */

const forms = byId('constant-forms', HTMLElement);
const source = byId('source-text', HTMLElement);
const records = byId('records', HTMLElement);
const rows = byId('record-rows', HTMLElement);
const citations = byId('citations', HTMLElement);

/** @param {State} state */
export function render({ report }) {
  const reaction = report?.reactions[0];
  if (reaction === undefined) return;
  const thermal = reaction.enthalpy_standard_j_per_mol;
  forms.replaceChildren(
    ...constants(reaction),
    figure('ΔG° of the reaction', molarEnergy(reaction.gibbs_standard_j_per_mol)),
    ...(thermal === null ? [] : [figure('ΔH° of the reaction', molarEnergy(thermal))]),
  );
  source.textContent = sourceText(reaction);
  showRecords(reaction.source.records, reaction.source.measured);
}

/** @param {ReactionReport} reaction */
function constants({ forms: all, delta_nu_gas: deltaNu, u_ln_k: u }) {
  const [first, ...others] = all;
  if (first === undefined) return [];
  const interval = u === null ? '' : `, ${halfWidth(u)}`;
  if (deltaNu === 0) return [figure(`K = Kp = Kc = Kx (p° = 1${NO_BREAK}bar)${interval}`, fromLog10(first.log10, 4))];
  return [
    figure(`K (p° = 1${NO_BREAK}bar)${interval}`, fromLog10(first.log10, 4)),
    ...others.map((form) => figure(label(form), fromLog10(form.log10, 4))),
  ];
}

/** @param {Form} form */
function label({ name, unit: text }) {
  return text === '1' ? `${name}, amount fractions` : `${name} in ${unit(text)}`;
}

/**
 * The 95 % half-width of K from the standard uncertainty of ln K: in per cent, or as a factor.
 * @param {number} u
 */
function halfWidth(u) {
  const width = 2 * u;
  return width < 0.3 ? `±${NO_BREAK}${significant(width * 100, 2)}${NO_BREAK}%` : `within a factor ${significant(Math.exp(width), 2)}`;
}

/** @param {ReactionReport} reaction */
function sourceText({ source: { text, range_k: range, extrapolated_by_k: beyond } }) {
  const covered = range === null ? '' : `, good from ${fixed(range[0], 0)} to ${fixed(range[1], 0)}${NO_BREAK}K`;
  const warned = beyond === null ? '' : ` This temperature lies ${significant(beyond, 3)}${NO_BREAK}K outside.`;
  return `${text}${covered}.${warned}`;
}

/**
 * @param {readonly RecordReport[]} given
 * @param {ReactionReport['source']['measured']} measured
 */
function showRecords(given, measured) {
  records.hidden = given.length + measured.length === 0;
  const texts = [...new Set([...measured.map(({ source: text }) => text), ...given.flatMap(({ sources }) => sources)])];
  rows.replaceChildren(...measured.map(({ equation, times, range_k: [low, high], log10_k: value, u_log10_k: u, source: text }) => create('tr', {},
    create('th', { scope: 'row', class: 'wraps' }, `${times === 1 ? '' : `${significant(times, 4)} × `}${equation}, measured: log10 K ${fixed(value, 3)} at 25 °C`),
    create('td', {}, `${fixed(low, 0)} – ${fixed(high, 0)}${NO_BREAK}K`),
    create('td', {}, `${significant(u, 2)} in log10 K`),
    create('td', {}, String(texts.indexOf(text) + 1)))), ...given.map(({ species, name, own, range_k: [low, high], u_gibbs_j_per_mol: u, sources }) => create('tr', {},
    create('th', { scope: 'row' }, `${speciesName(species)}, ${name}${own ? ' (my own)' : ''}`),
    create('td', {}, `${fixed(low, 0)} – ${fixed(high, 0)}${NO_BREAK}K`),
    create('td', {}, `${significant(u / 1000, 2)}${NO_BREAK}kJ/mol`),
    create('td', {}, sources.map((text) => String(texts.indexOf(text) + 1)).join(', ')))));
  citations.replaceChildren(...texts.map((text) => create('li', {}, text)));
}

/**
 * @param {string} name
 * @param {string} value
 */
function figure(name, value) {
  return create('div', {}, create('dt', {}, name), create('dd', {}, value));
}
