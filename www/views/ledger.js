/** The ledger: every species now, at rest, and the change between. */

import { byId, choose, chosen, create } from '../dom.js';
import { NO_BREAK, formula, fractionPair, pair, significant } from '../format.js';

/** @import { Report, SpeciesReport } from '../shiftgauge.js' */
/** @import { State } from '../state.js' */

const body = byId('ledger-body', HTMLElement);
const caption = byId('ledger-caption', HTMLElement);

/** The report shown last, so that a change of basis needs no new answer. */
/** @type {Report | null} */
let shown = null;
/** The case's own basis is taken over when it changes, and left alone otherwise. */
let basisOfCase = '';

for (const radio of document.querySelectorAll('input[name="ledger-basis"]')) radio.addEventListener('change', draw);

/** @param {State} state */
export function render({ report, answered }) {
  const basis = answered?.reading.gas?.basis ?? 'amount';
  if (basis !== basisOfCase) choose('ledger-basis', basis);
  basisOfCase = basis;
  shown = report;
  draw();
}

function draw() {
  if (shown === null) return;
  const basis = chosen('ledger-basis');
  caption.textContent = {
    wet: 'Gases as amount fractions of the whole gas. Change is the difference of the two, in the same unit.',
    dry: 'Gases as amount fractions of the gas without its water. Change is the difference of the two, in the same unit.',
  }[basis] ?? `Amounts for ${significant(shown.basis_mol, 4)}${NO_BREAK}mol of mixture now.`;
  const dry = { now: dryTotal(shown.species, 'now_mol'), rest: dryTotal(shown.species, 'rest_mol') };
  body.replaceChildren(...shown.species.map((species) => row(species, basis, dry)));
}

/** @param {SpeciesReport} species */
const isWater = ({ species, phase }) => species === 'H2O' && phase === 'g';

/**
 * @param {readonly SpeciesReport[]} species
 * @param {'now_mol' | 'rest_mol'} which
 */
function dryTotal(species, which) {
  return species.filter((one) => one.phase === 'g' && !isWater(one)).reduce((sum, one) => sum + (one[which] ?? 0), 0);
}

/**
 * @param {SpeciesReport} species
 * @param {string} basis
 * @param {{ now: number, rest: number }} dry
 */
function row(species, basis, dry) {
  const { now, rest, change } = numbers(species, basis, dry);
  const phase = species.phase === 'g' ? '' : `(${species.phase})`;
  const asRatio = basis === 'dry' && isWater(species) ? [create('small', {}, ' per dry gas')] : [];
  const head = create('th', { scope: 'row' }, formula(species.species), phase, ...asRatio);
  const gone = species.exhausted && species.now_mol > 0 ? [' ', create('em', {}, 'used up')] : [];
  return create('tr', { 'data-species': species.species },
    head, create('td', {}, now), create('td', {}, rest, ...gone), create('td', {}, change));
}

/**
 * @param {SpeciesReport} species
 * @param {string} basis
 * @param {{ now: number, rest: number }} dry
 */
function numbers(species, basis, dry) {
  if (species.rest_mol === null) return { now: `${significant(species.now_mol, 4)}${NO_BREAK}mol`, rest: 'not found', change: '' };
  if (basis === 'dry' && species.phase === 'g' && dry.now > 0 && dry.rest > 0) {
    const show = isWater(species) ? pair : fractionPair;
    return show(species.now_mol / dry.now, species.rest_mol / dry.rest);
  }
  const fractions = basis !== 'amount' && species.phase === 'g';
  if (fractions && species.now_fraction !== null && species.rest_fraction !== null) {
    return fractionPair(species.now_fraction, species.rest_fraction);
  }
  const amounts = pair(species.now_mol, species.rest_mol);
  return { now: `${amounts.now}${NO_BREAK}mol`, rest: `${amounts.rest}${NO_BREAK}mol`, change: `${amounts.change}${NO_BREAK}mol` };
}
