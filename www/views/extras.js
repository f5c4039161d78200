/** What a feed, a missing entry or a solution adds to the answer. */

import { byId, create } from '../dom.js';
import { NO_BREAK, fixed, formula, significant, signed, speciesName } from '../format.js';

/** @import { Report } from '../shiftgauge.js' */
/** @import { State } from '../state.js' */

const section = byId('extras', HTMLElement);
const figures = byId('extra-figures', HTMLElement);
const elements = byId('element-rows', HTMLElement);
const table = byId('elements', HTMLElement);

/** @param {State} state */
export function render({ report }) {
  const all = report === null ? [] : [...fromFeed(report), ...fromMissing(report), ...fromSolution(report)];
  section.hidden = all.length === 0;
  figures.replaceChildren(...all.map(([name, value]) => create('div', {}, create('dt', {}, name), create('dd', {}, value))));
  const rows = report?.balance?.elements ?? [];
  table.hidden = rows.length === 0;
  elements.replaceChildren(...rows.map(({ element, feed_mol: fed, reading_mol: behind }) => create('tr', {},
    create('th', { scope: 'row' }, element), create('td', {}, significant(fed, 4)), create('td', {}, significant(behind, 4)),
    create('td', {}, `${signed(fixed((behind / fed - 1) * 100, 2))}${NO_BREAK}%`))));
}

/** @param {number} share */
const perCent = (share) => `${significant(share * 100, 4)}${NO_BREAK}%`;

/**
 * @param {Report} report
 * @returns {[string, string][]}
 */
function fromFeed({ balance, conversions }) {
  if (balance === null) return [];
  return [
    ...conversions.filter(({ feed_to_now: now }) => now !== null).map(({ species, feed_to_now: now, feed_to_rest: rest }) =>
      /** @type {[string, string]} */ ([`${speciesName(species)} converted since the feed`, `${perCent(now ?? 0)} now${rest === null ? '' : `, ${perCent(rest)} at rest`}`])),
    [balance.contraction < 0 ? 'growth of the gas' : 'contraction of the gas', perCent(Math.abs(balance.contraction))],
    ...balance.restored.map(({ species, fraction }) => /** @type {[string, string]} */ ([`${speciesName(species)}, found from the feed`, perCent(fraction)])),
  ];
}

/**
 * @param {Report} report
 * @returns {[string, string][]}
 */
function fromMissing({ missing }) {
  if (missing === null) return [];
  const { species, value, is_fraction: isFraction, u_value: u } = missing;
  const factor = isFraction ? 100 : 1;
  const unit = isFraction ? '%' : 'mol';
  return [[`${speciesName(species)}, found from K`, `${significant(value * factor, 4)} ± ${significant(2 * u * factor, 2)}${NO_BREAK}${unit}`]];
}

/**
 * @param {Report} report
 * @returns {[string, string][]}
 */
function fromSolution({ saturation, ionic_strength_mol_per_kg: strength, charge_balance: charges, water_activity: water }) {
  if (strength === null) return [];
  /** @type {[string, string][]} */
  const rows = saturation.map(({ species, saturation_index: index }) => [
    `saturation index of ${formula(species)}`,
    `${signed(fixed(index, 2))}: ${index > 0 ? 'above saturation, it may settle' : index < 0 ? 'below saturation, it dissolves' : 'saturated'}`,
  ]);
  rows.push(['ionic strength', `${significant(strength, 3)}${NO_BREAK}mol/kg`]);
  if (charges !== null) rows.push(['charges, + and −', `${significant(charges.positive_eq_per_kg, 4)} and ${significant(charges.negative_eq_per_kg, 4)}${NO_BREAK}mol/kg`]);
  if (water !== null) rows.push(['activity of the water', fixed(water, 4)]);
  return rows;
}
