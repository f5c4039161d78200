/** Values of K at several temperatures, as lines of text and as the case has them. */

import { asText } from './state.js';

/** A temperature with its unit at the start of a line; a table's cells are parted by a tab anyway. */
const TEMPERATURE = /^([^\t]*?\d\s*(?:°\s?[CFR]|K|deg ?[CFR]|[CFR])(?![\p{L}]))[\s:;=,]*(.*)$/u;

/**
 * The lines as pairs of a temperature and a value, each as it was typed. Empty lines are left out.
 * @param {string} text
 * @returns {[string, string][]}
 */
export function pointsOfLines(text) {
  return text.split('\n').map((line) => line.trim()).filter((line) => line !== '').map((line) => {
    const cells = line.split(/\t+|\s*;\s*/);
    if (cells.length >= 2) return [cells[0]?.trim() ?? '', cells.slice(1).join(' ').trim()];
    const found = TEMPERATURE.exec(line);
    if (found !== null) return [found[1]?.trim() ?? '', found[2]?.trim() ?? ''];
    const [first = '', ...rest] = line.split(/\s+/);
    return [first, rest.join(' ')];
  });
}

/**
 * @param {unknown} points   as the case has them
 */
export function linesOfPoints(points) {
  if (!Array.isArray(points)) return '';
  return points.map((point) => (Array.isArray(point) ? point.map(asText).join('  ') : asText(point))).join('\n');
}
