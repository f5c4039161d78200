/** The ledger: every species now, at rest, and the change between. */

import { byId, choose, chosen, create } from '../dom.js';
import { NO_BREAK, amountChange, amountPair, bareSpecies, fractionPair, pair, significant, speciesName } from '../format.js';

/** @import { Report, SpeciesReport } from '../shiftgauge.js' */
/** @import { State } from '../state.js' */
/** @typedef {{ now: string, rest: string, change: string }} Columns */

const body = byId('ledger-body', HTMLElement);
const caption = byId('ledger-caption', HTMLElement);
const conversions = byId('conversions', HTMLElement);

/** The report shown last, so that a change of basis needs no new answer. */
/** @type {Report | null} */
let shown = null;
/** @type {Report | null} */
let pinned = null;
/** The case's own basis is taken over when it changes, and left alone otherwise. */
let basisOfCase = '';

for (const radio of document.querySelectorAll('input[name="ledger-basis"]')) radio.addEventListener('change', draw);

/** @param {State} state */
export function render({ report, answered, pinned: kept }) {
  const basis = answered?.reading.gas?.basis ?? 'amount';
  if (basis !== basisOfCase) choose('ledger-basis', basis);
  basisOfCase = basis;
  shown = report;
  pinned = kept === null || kept.report === report ? null : kept.report;
  body.closest('section')?.toggleAttribute('hidden', report?.rest === null);
  draw();
}

function draw() {
  if (shown === null) return;
  const basis = chosen('ledger-basis');
  caption.textContent = {
    wet: 'Gases as amount fractions of the whole gas. Change is the difference of the two.',
    dry: 'Gases as amount fractions of the gas without its water. Change is the difference of the two.',
  }[basis] ?? `Amounts on the basis of ${shown.basis}.`;
  conversions.textContent = conversionText(shown);
  const columns = columnsOf(shown, basis);
  const before = pinned === null ? null : columnsOf(pinned, basis);
  body.replaceChildren(...shown.species.flatMap((species) => rows(species, basis, columns(species), before, pinned)));
}

/**
 * What share of each reactant that is here now is still to react, or would be made again.
 * @param {Report} report
 */
function conversionText({ conversions: rows }) {
  const shares = rows.flatMap(({ species, now_to_rest: share }) => {
    if (share === null || share === 0) return [];
    const amount = `${significant(Math.abs(share) * 100, 3)}${NO_BREAK}%`;
    return [share > 0 ? `${amount} of the ${speciesName(species)} here is still to react` : `the ${speciesName(species)} here grows by ${amount}`];
  });
  return shares.length === 0 ? '' : `On the way to rest, ${shares.join('; ')}.`;
}

/**
 * What a report's species show in the three columns; without a state at rest it repeats the start, which is
 * not shown.
 * @param {Report} report
 * @param {string} basis
 */
function columnsOf({ species: all, rest }, basis) {
  const dry = { now: dryTotal(all, 'now_mol'), rest: dryTotal(all, 'rest_mol') };
  return (/** @type {SpeciesReport} */ species) => {
    const shownNumbers = numbers(species, basis, dry);
    return rest?.outcome === 'has no limit' ? { ...shownNumbers, rest: '–', change: '–' } : shownNumbers;
  };
}

/** @param {SpeciesReport} species */
const isWater = ({ species }) => species === 'H2O(g)';

/**
 * @param {readonly SpeciesReport[]} species
 * @param {'now_mol' | 'rest_mol'} which
 */
function dryTotal(species, which) {
  return species.filter((one) => one.phase === 'g' && !isWater(one)).reduce((sum, one) => sum + (one[which] ?? 0), 0);
}

/**
 * The row of a species, and under it what a pinned report says of it.
 * @param {SpeciesReport} species
 * @param {string} basis
 * @param {Columns} columns
 * @param {((species: SpeciesReport) => Columns) | null} before   the columns of the pinned report
 * @param {Report | null} kept
 */
function rows(species, basis, { now, rest, change }, before, kept) {
  const old = kept?.species.find((one) => one.species === species.species);
  const was = old === undefined || before === null ? null : before(old);
  const asRatio = basis === 'dry' && isWater(species) ? [create('small', {}, ' per dry gas')] : [];
  const head = create('th', { scope: 'row' }, speciesName(species.species), ...asRatio);
  const gone = species.exhausted && (species.now_mol ?? 0) > 0 ? [' ', create('em', {}, 'used up')] : [];
  const row = create('tr', { 'data-species': bareSpecies(species.species) },
    head, create('td', {}, now), create('td', {}, rest, ...gone), create('td', {}, change));
  if (was === null) return [row];
  const label = create('th', { scope: 'row' }, create('span', { class: 'visually-hidden' }, `${speciesName(species.species)}, `), 'pinned');
  return [row, create('tr', { class: 'pinned' }, label, ...[was.now, was.rest, was.change].map((text) => create('td', {}, text)))];
}

/**
 * @param {SpeciesReport} species
 * @param {string} basis
 * @param {{ now: number, rest: number }} dry
 */
function numbers(species, basis, dry) {
  if (species.now_mol === null || species.rest_mol === null) {
    return { now: 'ample', rest: 'ample', change: amountChange(species.change_mol ?? 0) };
  }
  if (basis === 'dry' && species.phase === 'g' && dry.now > 0 && dry.rest > 0) {
    const show = isWater(species) ? pair : fractionPair;
    return show(species.now_mol / dry.now, species.rest_mol / dry.rest);
  }
  const fractions = basis !== 'amount' && species.phase === 'g';
  if (fractions && species.now_fraction !== null && species.rest_fraction !== null) {
    return fractionPair(species.now_fraction, species.rest_fraction);
  }
  return amountPair(species.now_mol, species.rest_mol);
}
