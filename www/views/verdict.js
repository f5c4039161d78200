/** The answer: its sentence, then its numbers, always with the case that they belong to. */

import { byId, create } from '../dom.js';
import { NO_BREAK, decimalsFor, fromLog10, molarEnergy, pairFromLog10, signed, temperature, temperatureDifference, temperatureUnit } from '../format.js';
import { sentence } from '../sentence.js';

/** @import { Report } from '../shiftgauge.js' */
/** @import { State } from '../state.js' */
/** @import { TemperatureUnit } from '../format.js' */

const answer = byId('answer', HTMLElement);
const line = byId('sentence', HTMLElement);
const more = byId('sentence-more', HTMLElement);
const numbers = byId('numbers', HTMLElement);

/** @param {State} state */
export function render({ report, answered, current, pinned }) {
  answer.classList.toggle('is-old', !current && report !== null);
  if (report === null || answered === null) {
    answer.dataset.tone = 'unclear';
    line.textContent = 'No answer yet.';
    more.textContent = '';
    numbers.replaceChildren();
    return;
  }
  const unit = temperatureUnit(answered.temperature);
  const said = sentence(report, unit);
  answer.dataset.tone = said.tone;
  line.replaceChildren(
    create('span', { class: 'arrow', 'aria-hidden': 'true' }, said.arrow),
    said.lead, create('strong', { class: 'direction', id: 'direction' }, said.word), said.tail,
  );
  // What can outweigh the interval stands beside the verdict.
  const ideal = report.notes.find(({ code }) => code === 'ideal-gas');
  more.textContent = [said.more, ideal === undefined ? '' : 'The gas is taken as ideal; at this pressure that can shift T* by more than the interval shows.'].filter(Boolean).join(' ');
  const before = pinned === null || pinned.report === report ? [] : figures(pinned.report, unit);
  numbers.replaceChildren(...figures(report, unit).map((figure) => item(report, figure, before.find(({ about }) => about === figure.about))));
}

/**
 * @typedef {object} Figure
 * @property {string} about   the name that the line of working carries
 * @property {string} label
 * @property {string} value
 */

/**
 * @param {Report} report
 * @param {TemperatureUnit} unit
 * @returns {Figure[]}
 */
function figures(report, unit) {
  const reaction = report.reactions[0];
  if (reaction === undefined) return [];
  const log10K = reaction.ln_k / Math.LN10;
  const [q, k] = reaction.ln_q === null
    ? [{ finite: '', zero: 'zero', infinite: 'infinite', undetermined: 'no value' }[reaction.q], fromLog10(log10K, 3)]
    : pairFromLog10(reaction.ln_q / Math.LN10, log10K);
  const constant = { about: 'k', label: kLabel(report, unit), value: k };
  if (report.rest === null) return [constant];
  const difference = reaction.approach_k;
  const decimals = difference === null ? 0 : decimalsFor(difference);
  return [
    { about: 'q', label: 'Q', value: q },
    constant,
    { about: 'gibbs', label: 'ΔG of the reaction', value: reaction.gibbs_j_per_mol === null ? 'open-ended' : molarEnergy(reaction.gibbs_j_per_mol) },
    { about: 't_star', label: 'T*: equilibrium at this analysis', value: reaction.t_star_k === null ? 'none' : temperature(reaction.t_star_k, unit, decimals) },
    ...(difference === null ? [] : [{ about: 'approach', label: `T${NO_BREAK}−${NO_BREAK}T*`, value: signed(temperatureDifference(difference, unit)) }]),
  ];
}

/**
 * @param {Report} report
 * @param {TemperatureUnit} unit
 */
function kLabel({ temperature_k: kelvin }, unit) {
  return `K at ${temperature(kelvin, unit, plainDecimals(kelvin, unit))}, p°${NO_BREAK}=${NO_BREAK}1${NO_BREAK}bar`;
}

/**
 * No decimals for a whole number of degrees, one otherwise.
 * @param {number} kelvin
 * @param {TemperatureUnit} unit
 */
function plainDecimals(kelvin, unit) {
  return /[.,]0\D*$/.test(temperature(kelvin, unit, 1)) ? 0 : 1;
}

/**
 * A number with its label; the label leads to the line of working where there is one.
 * @param {Report} report
 * @param {Figure} figure
 * @param {Figure} [pinned]   the same number of a pinned answer
 */
function item(report, { about, label, value }, pinned) {
  const worked = report.steps.some((step) => step.about === about);
  const name = worked ? create('a', { href: `#working-${about}`, title: 'How this came about' }, label) : label;
  return create('div', { 'data-figure': about }, create('dt', {}, name), create('dd', {}, value),
    ...(pinned === undefined ? [] : [create('dd', { class: 'pinned' }, `pinned ${pinned.value}`)]));
}
