import assert from 'node:assert/strict';
import { test } from 'node:test';
import { amountChange, formula, fractionPair, fromLog10, molarEnergy, pair, pairFromLog10, significant, temperature, temperatureUnit, unit } from '../../www/format.js';

const FORMULAS = [
  ['CO + H2O = CO2 + H2', 'CO + H₂O = CO₂ + H₂'],
  ['4 HCl(g) + O2(g) = 2 Cl2(g) + 2 H2O(g)', '4 HCl(g) + O₂(g) = 2 Cl₂(g) + 2 H₂O(g)'],
  ['SO4^2-', 'SO₄²⁻'], ['SO4(2-)', 'SO₄²⁻'], ['H+(aq)', 'H⁺(aq)'], ['Cl-', 'Cl⁻'], ['NH4+', 'NH₄⁺'],
  ['CuSO4·5H2O', 'CuSO₄·5H₂O'], ['Ca(OH)2(s)', 'Ca(OH)₂(s)'], ['0.5 O2', '0.5 O₂'], ['Fe0.95O', 'Fe₀.₉₅O'],
];
for (const [typed, shown] of FORMULAS) test(`${typed} reads ${shown}`, () => assert.equal(formula(typed), shown));

/** @param {string} text */
const plain = (text) => text.replaceAll('\u00a0', ' ').replaceAll('\u2212', '-');

const NUMBERS = [
  [significant(0, 3), '0'], [significant(156.2, 3), '156'], [significant(-0.00123, 2), '-0.0012'], [significant(12345.6, 4), '12,350'],
  [significant(1.5e-9, 2), '1.5 × 10⁻⁹'], [significant(9.996, 3), '10.0'],
  [fromLog10(-312.3, 3), '5.01 × 10⁻³¹³'], [fromLog10(400, 2), '1.0 × 10⁴⁰⁰'], [fromLog10(2, 3), '100'],
  [molarEnergy(-1234), '-1.23 kJ/mol'], [molarEnergy(0), '0 kJ/mol'],
  [temperature(488.15, '°C', 0), '215 °C'], [temperature(488.15, '°F', 0), '419 °F'], [temperature(488.15, 'K', 2), '488.15 K'],
  [unit('bar^-2'), 'bar⁻²'], [unit('bar^0.5'), 'bar⁰.⁵'], [unit('bar^1'), 'bar'],
];
for (const [found, shown] of NUMBERS) test(`a number reads ${shown}`, () => assert.equal(plain(found), shown));

test('numbers that are compared get digits enough to tell them apart', () => {
  assert.deepEqual(pairFromLog10(2, 2 + 1e-5).map(plain), ['100.000', '100.002']);
  assert.deepEqual(pair(19.6, 19.6803), { now: '19.600', rest: '19.680', change: '+0.080', small: false });
  assert.deepEqual(pair(3, 3), { now: '3.00', rest: '3.00', change: '0', small: false });
});

test('a change too small for six digits keeps its own', () => {
  const shown = pair(12.4, 12.3999959, 100);
  assert.deepEqual([shown.now, plain(shown.change)], ['12.4000', '-4.1 × 10⁻⁶']);
  assert.equal(plain(fractionPair(0.124, 0.123999959).change), '-41 ppb');
  assert.equal(plain(amountChange(-3.32e-7)), '-0.332 µmol');
  assert.equal(pair(0, 0.332).now, '0');
});

test('rounding never turns nearly all into all, nor a trace into nothing', () => {
  const nearly = fractionPair(0.999999, 0.999998);
  assert.notEqual(plain(nearly.now), '100 %');
  assert.ok(Number.parseFloat(nearly.now) < 100);
  assert.match(plain(pair(0.42, 1e-12).rest), /10⁻¹²/);
});

test('a trace is shown in ppm or ppb', () => {
  assert.match(plain(fractionPair(5e-6, 4e-6).now), /^5\.\d+ ppm$/);
  assert.match(plain(fractionPair(5e-9, 4e-9).now), /^5\.\d+ ppb$/);
  assert.match(plain(fractionPair(0, 0).now), /^0 %$/);
});

const UNITS = [['215 ± 2 °C', '°C'], ['488 K', 'K'], ['420 °F', '°F'], ['215 °C type K class 2', '°C'], ['', '°C']];
for (const [typed, shown] of UNITS) test(`“${typed}” is answered in ${shown}`, () => assert.equal(temperatureUnit(typed ?? ''), shown));
