/** The reading of a case as lines of a name and what was typed, for the record. */

import { asText, isRecord } from './state.js';

/** @import { Case } from './shiftgauge.js' */
/** @typedef {[name: string, value: string]} Row */

const WATER = { per_dry: 'steam to dry gas', fraction: 'water in wet gas', dew_point: 'dew point' };

/**
 * @param {Case} question
 * @returns {Row[]}
 */
export function readingRows(question) {
  const [first] = question.reactions;
  const constant = first?.constant;
  /** @type {Row[]} */
  const rows = [
    ['Reaction', asText(first?.equation)],
    ['K from', constantText(constant)],
    ['Temperature', asText(question.temperature)],
    ['Pressure', asText(question.pressure)],
    ['Volume', asText(question.volume)],
    ['Atmosphere', asText(question.atmosphere)],
    ['Held constant', asText(question.hold)],
    ['At rest within', asText(question.band)],
    ...gasRows('Gas', question.reading.gas),
    ...entryRows('', question.reading.liquid),
    ...entryRows('', question.reading.solids),
    ...solutionRows(question.reading.solution),
    ...gasRows('Feed', question.feed?.gas),
  ];
  return rows.filter(([, value]) => value !== '');
}

/** @param {unknown} constant */
function constantText(constant) {
  if (!isRecord(constant)) return '';
  const points = Array.isArray(constant.points) ? constant.points.map((pair) => (Array.isArray(pair) ? pair.map(asText).join(': ') : '')).join('; ') : '';
  const terms = isRecord(constant.terms) ? Object.entries(constant.terms).map(([term, factor]) => `${asText(factor)} × ${term}`).join(' + ') : '';
  const parts = ['for', 'approach'].filter((name) => asText(constant[name]) !== '').map((name) => `${name} ${asText(constant[name])}`);
  const stated = ['kind', 'value', 'pressure_unit', 'at', 'enthalpy', 'heat_capacity'].map((name) => asText(constant[name])).filter((text) => text !== '');
  return [asText(constant.from), ...stated, points, terms, ...parts].filter((text) => text !== '').join(', ');
}

/**
 * @param {string} name
 * @param {unknown} block
 * @returns {Row[]}
 */
function gasRows(name, block) {
  if (!isRecord(block)) return [];
  const { water } = block;
  const known = isRecord(water)
    ? Object.entries(WATER).flatMap(([way, text]) => (way in water ? [`${text} ${asText(water[way])}${asText(water.pressure) === '' ? '' : ` at ${asText(water.pressure)}`}`] : [])).join(', ')
    : water === 'from_feed' ? 'water from the feed’s balance' : '';
  const lost = Array.isArray(block.lost) ? `, lost on cooling: ${block.lost.map(asText).join(', ')}` : '';
  return [[`${name}, ${asText(block.basis)}`, `${known || 'as analysed'}${lost}`], ...entryRows(name === 'Feed' ? 'Feed ' : '', block)];
}

/**
 * @param {string} before
 * @param {unknown} block
 * @returns {Row[]}
 */
function entryRows(before, block) {
  if (!isRecord(block) || !Array.isArray(block.entries)) return [];
  return block.entries.filter(isRecord).map((entry) => [`${before}${asText(entry.species)}`, `${asText(entry.value)}${entry.includes === 'Ar' ? ', with argon' : ''}`]);
}

/**
 * @param {unknown} block
 * @returns {Row[]}
 */
function solutionRows(block) {
  if (!isRecord(block)) return [];
  const size = asText(block.volume) || (asText(block.water) === '' ? 'for 1 kg of water' : `with ${asText(block.water)} of water`);
  return [['Solution', size], ...entryRows('', block)];
}
