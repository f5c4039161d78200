/** The unit in the text of a quantity: found, written, replaced. The number is never touched. */

/** Other ways in which a unit of the choosers is often typed. */
/** @type {Record<string, readonly string[]>} */
const SPELLINGS = {
  '°C': ['° C', 'degC', 'deg C', 'C'], K: ['kelvin'], '°F': ['° F', 'degF', 'deg F', 'F'],
  'bar(g)': ['barg', 'bar g', 'bar (g)'], 'bar(a)': ['bara', 'bar a', 'bar (a)', 'bar'],
  'kPa(g)': ['kPag', 'kPa g', 'kPa (g)'], 'kPa(a)': ['kPaa', 'kPa a', 'kPa (a)', 'kPa'], 'MPa(a)': ['MPa'],
  'psi(g)': ['psig'], 'psi(a)': ['psia', 'psi'],
  '%': ['vol %', 'mol %', 'vol-%', 'mol-%'], ppm: ['ppmv'], m3: ['m³'], 'Nm3/h': ['Nm³/h'], 'mg/Nm3': ['mg/Nm³'],
};

/** Words that stand alone, in the place of a whole quantity. */
const WORDS = ['present', 'absent', 'remainder', 'missing'];

/** @param {string} text */
const escaped = (text) => text.replace(/[.*+?^${}()|[\]\\]/g, '\\$&');

/**
 * Every place where one of the units stands, the longest spelling first.
 * @param {string} text
 * @param {readonly string[]} units
 */
function places(text, units) {
  const named = units.flatMap((unit) => [unit, ...(SPELLINGS[unit] ?? []).filter((other) => !units.includes(other))].map((spelling) => ({ unit, spelling })));
  named.sort((a, b) => b.spelling.length - a.spelling.length);
  const pattern = new RegExp(`(?<![\\p{L}/])(?<!type\\s*)(?:${named.map(({ spelling }) => escaped(spelling)).join('|')})(?![\\p{L}\\d(/])(?!\\s*rel)`, 'gu');
  return [...text.matchAll(pattern)].map((found) => ({
    unit: named.find(({ spelling }) => spelling === found[0])?.unit ?? '', start: found.index, end: found.index + found[0].length,
  }));
}

/**
 * The unit of the chooser that this text carries; empty where it carries none of them.
 * @param {string} text
 * @param {readonly string[]} units
 */
export function unitOf(text, units) {
  const word = text.trim();
  if (WORDS.includes(word)) return units.includes(word) ? word : '';
  return places(text, units.filter((unit) => !WORDS.includes(unit))).at(0)?.unit ?? '';
}

/**
 * The text with this unit in the place of its own, or behind its number and tolerance where it has
 * none. A word, such as `absent`, takes the place of the whole text.
 * @param {string} text
 * @param {string} unit
 * @param {readonly string[]} units
 */
export function withUnit(text, unit, units) {
  if (WORDS.includes(unit)) return unit;
  const bare = WORDS.includes(text.trim()) ? '' : text.trim();
  if (unit === 'pH') return `pH ${/[<\d].*?(?=\s*[^\d\s.,±+/-]|$)/.exec(bare.replace(/^pH\s*/, ''))?.[0].trim() ?? ''}`;
  const plain = bare.replace(/^pH\s*/, '');
  const found = places(plain, units.filter((one) => !WORDS.includes(one)));
  if (found.length > 0) {
    return found.reduceRight((sofar, { start, end }) => sofar.slice(0, start) + unit + sofar.slice(end), plain);
  }
  const number = /^(?:[^\p{L}%°]|%?\s*rel\b|(?<=\d)[eE](?=[-+\u2212]?\d))*/u.exec(plain)?.[0].trimEnd() ?? '';
  // What follows the number is a unit that the chooser does not know, or the class of an instrument.
  const after = /(?:\s+(?:type|class|Pt\d+).*)?$/.exec(plain.slice(number.length))?.[0] ?? '';
  return `${number} ${unit}${after}`.trimStart();
}
