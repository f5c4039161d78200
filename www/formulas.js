/** Formulas inside sentences: the engine writes them plainly, the page with their subscripts. */

import { formula } from './format.js';

/** @import { Report } from './shiftgauge.js' */

/**
 * Gives the formulas of the report's species their subscripts wherever they stand in a line.
 * @param {Report} report
 */
export function formulaWriter(report) {
  const species = [...report.species, ...report.reactions.flatMap(({ terms }) => terms)].map((one) => one.species);
  const formulas = new Set(species.map((text) => text.replace(/\((?:g|l|s|aq)(?:, .*)?\)$/, '')));
  const longestFirst = [...formulas].sort((a, b) => b.length - a.length);
  if (longestFirst.length === 0) return (/** @type {string} */ text) => text;
  const escaped = longestFirst.map((text) => text.replace(/[.*+?^${}()|[\]\\]/g, '\\$&'));
  const pattern = new RegExp(`(?<![A-Za-z0-9])(?:${escaped.join('|')})(?![A-Za-z0-9])`, 'g');
  return (/** @type {string} */ text) => text.replace(pattern, (found) => formula(found));
}
