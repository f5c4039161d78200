// Sets the benchmarks side by side: medians, their spread, and ratios of the fastest batches, which
// other work on the machine has disturbed least.
// usage: node table.js FILE, where FILE holds the lines that the benchmarks printed.

import assert from 'node:assert/strict';
import { readFileSync } from 'node:fs';
import { argv } from 'node:process';

/** @import { Line } from './batches.js' */

const PLACES = ['native', 'Node', 'Chromium', 'SciPy'];

/** The sums of one work may differ by the tolerance of the script's root finder. */
const SAME = 1e-9;

/** @type {Line[]} */
const lines = readFileSync(argv[2] ?? '', 'utf8')
  .split('\n')
  .filter((line) => line.startsWith('{'))
  .map((line) => JSON.parse(line));

const works = [...new Set(lines.map((line) => line.work))];
const widths = [17, 26, 26, 26, 26, 8, 9, 8];
print(['work', ...PLACES, 'Node', 'Chromium', 'SciPy']);
print(['', ...PLACES.map(() => 'median (fastest, 3rd qu.)'), '/native', '/native', '/native']);
for (const work of works) {
  const found = PLACES.map((place) => lines.filter((l) => l.work === work && l.place === place));
  checkSums(work, found.flat());
  const spreads = found.map((rounds) => spread(rounds.flatMap((line) => line.ns)));
  const native = spreads[0]?.[0];
  const ratios = spreads.slice(1).map((each) => (native && each ? ratio(each[0] / native) : ''));
  print([work, ...spreads.map((each) => (each ? shown(each) : '')), ...ratios]);
}

/**
 * @param {string} work
 * @param {Line[]} rounds
 */
function checkSums(work, rounds) {
  const sums = rounds.flatMap((line) => (line.sum === null ? [] : [line.sum]));
  for (const sum of sums) {
    const apart = Math.abs(sum - (sums[0] ?? 0));
    assert.ok(apart <= SAME * Math.abs(sum), `${work}: ${sums.join(', ')} are not one result`);
  }
}

/**
 * @param {number[]} times
 * @returns {[number, number, number] | null} the fastest, the median, the upper quartile
 */
function spread(times) {
  if (times.length === 0) return null;
  const sorted = [...times].sort((a, b) => a - b);
  const at = (/** @type {number} */ share) =>
    /** @type {number} */ (sorted[Math.round(share * (sorted.length - 1))]);
  return [at(0), at(0.5), at(0.75)];
}

/** @param {[number, number, number]} spread */
function shown([low, median, high]) {
  const digits = (/** @type {number} */ ns) => Number((ns / 1000).toPrecision(3)).toString();
  return `${digits(median)} µs (${digits(low)}, ${digits(high)})`;
}

/** @param {number} value */
function ratio(value) {
  return value < 10 ? value.toFixed(2) : value.toFixed(0);
}

/** @param {string[]} cells */
function print(cells) {
  console.log(cells.map((cell, column) => cell.padEnd(widths[column] ?? 0)).join(' ').trimEnd());
}
