/**
 * Numbers and formulas as text to read: a real minus sign, a space that does not break before the
 * unit, and enough digits to tell apart the numbers that are compared.
 */

const SUPERSCRIPTS = '⁰¹²³⁴⁵⁶⁷⁸⁹';
const SUBSCRIPTS = '₀₁₂₃₄₅₆₇₈₉';
const MOST_DECIMALS = 9;
/** More digits than these say nothing of a plant, and a table does not hold them: the change does. */
const MOST_DIGITS = 6;
export const NO_BREAK = '\u00a0';
export const MINUS = '\u2212';

/** @param {string} digits */
const superscript = (digits) =>
  digits.replace(/\d/g, (digit) => SUPERSCRIPTS[Number(digit)] ?? digit).replace(/[-\u2212]/, '⁻').replace('+', '⁺');

/** @param {string} digits */
const subscript = (digits) => digits.replace(/\d/g, (digit) => SUBSCRIPTS[Number(digit)] ?? digit);

/**
 * A formula or an equation with its subscripts and charges: `SO4^2-` becomes `SO₄²⁻`.
 * @param {string} text
 */
export function formula(text) {
  return text.split(' ').map((word) => {
    if (!/[A-Za-z]/.test(word)) return word;
    return word
      .replace(/\^(\d*[+-])|\((\d*[+-])\)|(?<=[A-Za-z0-9)\]])([+-])(?=$|\()/g,
        (_, caret, bracket, bare) => superscript(caret ?? bracket ?? bare))
      .replace(/(?<=[A-Za-z)\]])\d+(?:\.\d+)?/g, subscript);
  }).join(' ');
}

/**
 * A species as a plant writes it: a gas by its formula alone, all else with its phase.
 * @param {string} text   as the engine names it, such as `CO2(g)` or `C(s, graphite)`
 */
export const bareSpecies = (text) => text.replace(/\(g\)$/, '');

/**
 * A species by its formula with subscripts; a gas without its phase.
 * @param {string} text
 */
export const speciesName = (text) => formula(bareSpecies(text));

/**
 * A number with this many decimals, thousands apart, and U+2212 as the minus sign.
 * @param {number} value
 * @param {number} decimals
 */
export function fixed(value, decimals) {
  const text = value.toLocaleString('en-GB', { minimumFractionDigits: decimals, maximumFractionDigits: decimals });
  return /[1-9]/.test(text) ? text.replace('-', MINUS) : text.replace('-', '');
}

/**
 * A number with this many significant digits; far from 1 with a power of ten.
 * @param {number} value
 * @param {number} digits
 */
export function significant(value, digits) {
  if (value === 0) return '0';
  const [mantissa = '', power = '0'] = value.toExponential(digits - 1).split('e');
  const exponent = Number(power);
  if (exponent >= -3 && exponent < 6) return fixed(Number(value.toPrecision(digits)), Math.max(0, digits - 1 - exponent));
  return `${mantissa.replace('-', MINUS)}${NO_BREAK}×${NO_BREAK}10${superscript(String(exponent))}`;
}

/**
 * The number whose decimal logarithm is given; it may be far outside what a double can hold.
 * @param {number} log10
 * @param {number} digits
 */
export function fromLog10(log10, digits) {
  if (Math.abs(log10) < 290) return significant(10 ** log10, digits);
  const whole = Math.floor(log10);
  const mantissa = (10 ** (log10 - whole)).toFixed(digits - 1);
  const carried = Number(mantissa) >= 10;
  const shown = carried ? (1).toFixed(digits - 1) : mantissa;
  return `${shown}${NO_BREAK}×${NO_BREAK}10${superscript(String(whole + (carried ? 1 : 0)))}`;
}

/**
 * Two numbers, given by their logarithms, with the fewest digits (three or more) that tell them apart.
 * @param {number} first
 * @param {number} second
 * @returns {[string, string]}
 */
export function pairFromLog10(first, second) {
  for (let digits = 3; digits < 9; digits += 1) {
    const shown = [fromLog10(first, digits), fromLog10(second, digits)];
    if (shown[0] !== shown[1]) return /** @type {[string, string]} */ (shown);
  }
  return [fromLog10(first, 9), fromLog10(second, 9)];
}

/**
 * How many decimals show two significant digits of this difference.
 * @param {number} difference
 */
export function decimalsFor(difference) {
  if (difference === 0) return 0;
  return Math.min(MOST_DECIMALS, Math.max(0, 1 - Math.floor(Math.log10(Math.abs(difference)))));
}

/**
 * Two numbers in one unit and their difference, with decimals enough for three digits of the
 * larger, two of the difference (as far as six digits go; the difference itself keeps its two), and two of what is missing to `whole` where that is given.
 * @param {number} now
 * @param {number} rest
 * @param {number | null} [whole]
 * @returns {{ now: string, rest: string, change: string, small: boolean }}   small: the two look alike, the change is less than their last digit
 */
export function pair(now, rest, whole = null) {
  const larger = Math.max(Math.abs(now), Math.abs(rest));
  if (larger === 0) return { now: '0', rest: '0', change: '0', small: false };
  const power = Math.floor(Math.log10(larger));
  let decimals = Math.min(MOST_DECIMALS, Math.max(0, 2 - power));
  decimals = Math.max(decimals, Math.min(decimalsFor(rest - now), MOST_DIGITS - 1 - power));
  if (whole !== null) decimals = Math.max(decimals, ...[now, rest].map((value) => decimalsFor(whole - value)));
  /** @param {number} value */
  const show = (value) => {
    if (value === 0) return '0';
    return Math.abs(value) < 0.5 * 10 ** -decimals ? significant(value, 2) : fixed(value, decimals);
  };
  const change = rest - now;
  const small = decimalsFor(change) > decimals;
  return { now: show(now), rest: show(rest), change: change === 0 ? '0' : signed(small ? significant(change, 2) : show(change)), small };
}

/**
 * A number's text with its sign always written.
 * @param {string} text
 */
export function signed(text) {
  return text.startsWith(MINUS) || text === '0' ? text : `+${text}`;
}

const AMOUNT_UNITS = [
  { least: 0.1, factor: 1, unit: 'mol' },
  { least: 1e-4, factor: 1e3, unit: 'mmol' },
  { least: 1e-7, factor: 1e6, unit: 'µmol' },
  { least: 1e-10, factor: 1e9, unit: 'nmol' },
];

/**
 * The unit in which an amount reads well, and the factor from mol.
 * @param {number} mol
 */
export function amountUnit(mol) {
  return AMOUNT_UNITS.find(({ least }) => Math.abs(mol) >= least) ?? { factor: 1, unit: 'mol' };
}

const FRACTION_UNITS = [
  { least: 1e-4, factor: 1e2, unit: '%', whole: 100 },
  { least: 1e-7, factor: 1e6, unit: 'ppm', whole: null },
  { least: 0, factor: 1e9, unit: 'ppb', whole: null },
];

/**
 * Two amount fractions in the unit that suits the larger of them.
 * @param {number} now
 * @param {number} rest
 */
export function fractionPair(now, rest) {
  const larger = Math.max(now, rest) || 1;
  const { factor, unit, whole } = FRACTION_UNITS.find(({ least }) => larger >= least) ?? { factor: 1e2, unit: '%', whole: 100 };
  const shown = pair(now * factor, rest * factor, whole);
  const smaller = FRACTION_UNITS.find(({ least }) => Math.abs(rest - now) >= least);
  return {
    now: `${shown.now}${NO_BREAK}${unit}`,
    rest: `${shown.rest}${NO_BREAK}${unit}`,
    change: shown.small && smaller !== undefined
      ? `${signed(significant((rest - now) * smaller.factor, 2))}${NO_BREAK}${smaller.unit}`
      : `${shown.change}${NO_BREAK}${unit}`,
  };
}

/**
 * Two amounts in mol; their difference in the unit that suits it.
 * @param {number} now
 * @param {number} rest
 */
export function amountPair(now, rest) {
  const shown = pair(now, rest);
  return { now: `${shown.now}${NO_BREAK}mol`, rest: `${shown.rest}${NO_BREAK}mol`, change: amountChange(rest - now) };
}

/**
 * A change of an amount, with its sign.
 * @param {number} mol
 */
export function amountChange(mol) {
  const { factor, unit } = amountUnit(mol);
  return `${signed(significant(mol * factor, 3))}${NO_BREAK}${unit}`;
}

/**
 * A unit with its powers raised: `bar^-2` becomes `bar⁻²`.
 * @param {string} text
 */
export function unit(text) {
  return text.replace(/\^\(?([+\-\u2212]?\d+(?:\.\d+)?)\)?/g, (_, power) => (power === '1' ? '' : superscript(power)));
}

/** @typedef {'°C' | 'K' | '°F'} TemperatureUnit */

/**
 * The temperature unit that was typed; °C where none can be seen.
 * @param {string} text
 * @returns {TemperatureUnit}
 */
export function temperatureUnit(text) {
  if (/°?\s*F\b/.test(text)) return '°F';
  return /\d\s*K\b/.test(text) ? 'K' : '°C';
}

/** A temperature as a bare number of a unit. */
export const temperatureIn = (/** @type {number} */ kelvin, /** @type {TemperatureUnit} */ unit) => (unit === 'K' ? kelvin : unit === '°C' ? kelvin - 273.15 : kelvin * 1.8 - 459.67);

/**
 * A temperature in the unit that was typed.
 * @param {number} kelvin
 * @param {TemperatureUnit} unit
 * @param {number} decimals
 */
export const temperature = (kelvin, unit, decimals) => `${fixed(temperatureIn(kelvin, unit), decimals)}${NO_BREAK}${unit}`;

/**
 * A temperature difference: in K, or in °F where the case is written so.
 * @param {number} kelvin
 * @param {TemperatureUnit} unit
 */
export function temperatureDifference(kelvin, unit) {
  const value = unit === '°F' ? kelvin * 1.8 : kelvin;
  return `${fixed(value, decimalsFor(value))}${NO_BREAK}${unit === '°F' ? '°F' : 'K'}`;
}

/**
 * A molar energy in kJ/mol.
 * @param {number} joulePerMol
 */
export function molarEnergy(joulePerMol) {
  const value = joulePerMol / 1000;
  const decimals = Math.max(0, Math.min(6, 2 - Math.floor(Math.log10(Math.abs(value) || 1))));
  return `${value === 0 ? '0' : fixed(value, decimals)}${NO_BREAK}kJ/mol`;
}
