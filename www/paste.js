/** An analysis pasted from elsewhere: lines of names and values, or a table's heading and its values. */

/** @typedef {{ species: string, value: string }} Pasted */
/**
 * @typedef {object} Understood
 * @property {Pasted[]} entries
 * @property {string | null} temperature
 * @property {string | null} pressure
 * @property {string[]} left       what was not understood, as it stood there
 * @property {boolean} asPercent   bare numbers, which add to far more than 1, were given the sign %
 */

const REMAINDER = /^(?:remainder|rest|balance|bal\.?)$/i;
const TEMPERATURE = /^(?:t|temp\.?|temperature)$/i;
const PRESSURE = /^(?:p|press\.?|pressure)$/i;
const HAS_NUMBER = /^[<~]?\s*[-+\u2212]?[.,]?\d/;
const BARE_NUMBER = /^[<]?\s*[.,]?\d[\d.,\s]*(?:e[-+]?\d+)?(?:\s*(?:±|\+\/-)\s*[\d.,]+)?$/i;
/** A unit that stands in a heading with its name: `CO [%]`, `CO (vol %)`, `CO, ppm`, `CO %`. */
const HEADING = /^(.*?)\s*(?:\[\s*([^\]]*)\]|\(\s*((?:(?:vol|mol)[ .-]*)?(?:%|ppm\w?)|[^()]*\/[^()]*|bar|kPa)\s*\)|[,;]\s*(\S.*)|\s(%|ppm\w?|vol\s?%|mol\s?%|°C|K|bar\([ga]\)|bar|kPa))$/i;
/** A heading that is a unit and nothing else. */
const UNIT = /^(?:(?:vol|mol)[ .-]?)?%$|^ppm\w?$|^bar(?:\([ga]\))?$|^kPa$/i;
const FURTHER = 'the further rows';
/** Above this, bare numbers cannot be fractions of one gas. */
const MOST_OF_FRACTIONS = 1.05;

/**
 * Reads a pasted text. What a name stands for is asked of whoever knows the species.
 * @param {string} text
 * @param {(name: string) => string | null} formulaOf
 * @returns {Understood}
 */
export function readPasted(text, formulaOf) {
  const given = text.replace(/\r\n?/g, '\n').split('\n').filter((line) => line.trim() !== '');
  const lines = given.some((line) => line.includes('\t')) ? given : given.map((line) => line.replace(/\s*;\s*/g, '\t'));
  /** @type {Understood} */
  const found = { entries: [], temperature: null, pressure: null, left: [], asPercent: false };
  const names = (/** @type {readonly string[]} */ some) => some.filter((cell) => formulaOf(splitHeading(cell).name) !== null).length;
  const isAcross = isTable(lines) && names(cells(lines[0] ?? '')) >= names(lines.map((line) => cells(line)[0] ?? ''));
  for (const { name, value, raw } of isAcross ? pairsOfTable(lines) : pairsOfColumn(lines)) {
    const species = formulaOf(name);
    if (value === '' || raw === FURTHER) found.left.push(raw);
    else if (species !== null) found.entries.push({ species, value: REMAINDER.test(value) ? 'remainder' : value });
    else if (TEMPERATURE.test(name)) found.temperature = value;
    else if (PRESSURE.test(name)) found.pressure = value;
    else found.left.push(raw);
  }
  const bare = found.entries.filter(({ value }) => BARE_NUMBER.test(value));
  const sum = bare.reduce((total, { value }) => total + (Number.parseFloat(value.replace(/^</, '').replace(',', '.')) || 0), 0);
  found.asPercent = sum > MOST_OF_FRACTIONS;
  if (found.asPercent) for (const entry of bare) entry.value += ' %';
  return found;
}

/** @param {string} line */
const cells = (line) => line.split('\t').map((cell) => cell.trim());

/**
 * A heading over values: at least two columns, and no number in the first row.
 * @param {readonly string[]} lines
 */
function isTable(lines) {
  const [heading, ...rows] = lines.map(cells);
  return heading !== undefined && rows.length > 0 && heading.length >= 2 && rows.every((row) => row.length > 1)
    && !heading.some((cell) => HAS_NUMBER.test(cell)) && !heading.slice(1).some((cell) => REMAINDER.test(cell));
}

/** @typedef {{ name: string, value: string, raw: string }} Pair */

/**
 * The columns of the first row of values; a row of units may stand between it and the heading.
 * @param {readonly string[]} lines
 * @returns {Pair[]}
 */
function pairsOfTable(lines) {
  const [heading = [], ...rows] = lines.map(cells);
  const values = rows.find((row) => row.some((cell) => HAS_NUMBER.test(cell))) ?? [];
  const units = rows[0] === values ? [] : rows[0] ?? [];
  const pairs = heading.flatMap((cell, index) => {
    const { name, unit } = splitHeading(cell);
    const value = values[index] ?? '';
    if (cell === '' && value === '') return [];
    return [{ name, value: withUnit(value, units[index] ?? unit), raw: cell === '' ? value : cell }];
  });
  return rows.indexOf(values) < rows.length - 1 ? [...pairs, { name: '', value: '', raw: FURTHER }] : pairs;
}

/**
 * A name and its value on each line; the unit may stand in a heading over the values.
 * @param {readonly string[]} lines
 * @returns {Pair[]}
 */
function pairsOfColumn(lines) {
  const [heading = '', ...rows] = lines;
  const over = cells(heading);
  if (rows.length === 0 || over.length < 2 || over.some((cell) => HAS_NUMBER.test(cell) || REMAINDER.test(cell))) return lines.map(pairOfLine);
  const unit = over.slice(1).map((cell) => (UNIT.test(cell) ? cell : splitHeading(cell).unit)).find((text) => text !== '') ?? '';
  return rows.map(pairOfLine).map((pair) => ({ ...pair, value: withUnit(pair.value, unit) }));
}

/**
 * @param {string} line
 * @returns {Pair}
 */
function pairOfLine(line) {
  const raw = line.trim();
  const byTab = cells(line).filter((cell) => cell !== '');
  if (byTab.length >= 2) {
    const { name, unit } = splitHeading(byTab[0] ?? '');
    return { name, value: withUnit(byTab.slice(1).join(' '), unit), raw };
  }
  // The name ends before the first number that stands free, or before a word for the remainder.
  const [, name = '', value = ''] = /^(.*?[^\s:=;,])[\s:=;,]+((?:[<~]?\s*[-+\u2212]?[.,]?\d|remainder|rest|balance|bal\b).*)$/i.exec(raw) ?? [];
  return { name, value: value.trim(), raw };
}

/** @param {string} cell */
function splitHeading(cell) {
  const [, name = cell, ...units] = HEADING.exec(cell) ?? [];
  return { name: name.trim(), unit: units.find((unit) => unit !== undefined)?.trim() ?? '' };
}

/**
 * @param {string} value
 * @param {string} unit
 */
const withUnit = (value, unit) => (unit !== '' && BARE_NUMBER.test(value) ? `${value} ${unit}` : value);
