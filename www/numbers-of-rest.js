/** Which numbers of a state of rest can be drawn or aimed at. */

import { speciesName } from './format.js';

/** @import { Report, SpeciesReport } from './shiftgauge.js' */

/**
 * The conversion of each reactant that is there, the fraction of each gas or liquid that reacts, and the
 * amount of each solute.
 * Fractions begin with the one that the way to rest changes most, for its size.
 * Conversions come first where they mean something: since a feed, or for a mixture without products.
 * @param {Report} report
 */
export function numbersOfRest({ species, conversions, balance }) {
  const since = balance === null ? 'of the' : 'since the feed of';
  const shares = conversions.filter(({ now_to_rest: now }) => now !== null)
    .map(({ species: name }) => ({ value: `conversion ${name}`, text: `conversion ${since} ${speciesName(name)}${balance === null ? ' here' : ''}` }));
  const fractions = species.filter(({ nu, rest_fraction: fraction }) => nu !== 0 && fraction !== null)
    .sort((one, other) => telling(other) - telling(one))
    .map(({ species: name }) => ({ value: `fraction ${name}`, text: `fraction of ${speciesName(name)}` }));
  const amounts = species.filter(({ nu, phase, rest_mol: rest }) => nu !== 0 && phase === 'aq' && rest !== null)
    .map(({ species: name }) => ({ value: `amount ${name}`, text: `amount of ${speciesName(name)}` }));
  const isFeed = species.some(({ nu, now_mol: now }) => nu > 0 && now === 0);
  return balance !== null || isFeed ? [...shares, ...fractions, ...amounts] : [...fractions, ...amounts, ...shares];
}

/**
 * How much of a fraction the way to rest changes.
 * @param {SpeciesReport} species
 */
function telling({ now_fraction: now, rest_fraction: rest }) {
  const larger = Math.max(now ?? 0, rest ?? 0);
  return larger === 0 ? 0 : Math.abs((rest ?? 0) - (now ?? 0)) / larger;
}
