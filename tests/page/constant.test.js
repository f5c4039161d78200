import assert from 'node:assert/strict';
import { test } from 'node:test';
import { linesOfPoints, pointsOfLines } from '../../www/points.js';
import { visit } from './browser.js';
import { answered, AT_DESK, BY_TOUCH, caseOf, figure, number, openCase } from './reading.js';

/** @type {[line: string, temperature: string, value: string][]} */
const LINES = [
  ['400 °C  12.3', '400 °C', '12.3'],
  ['400°C 12.3 ± 0.2', '400°C', '12.3 ± 0.2'],
  ['673.15 K: 1.2e-3', '673.15 K', '1.2e-3'],
  ['400\t12.3', '400', '12.3'],
  ['400 °C;-24.6 kJ/mol', '400 °C', '-24.6 kJ/mol'],
  ['750 F = 3', '750 F', '3'],
  ['400 12.3', '400', '12.3'],
  ['400 °C', '400 °C', ''],
];
for (const [line, temperature, value] of LINES) {
  test(`the line “${line.replace('\t', ' → ')}” is ${temperature || 'nothing'} and ${value || 'nothing'}`, () => {
    assert.deepEqual(pointsOfLines(`\n${line}\r\n`), [[temperature, value]]);
  });
}

test('points go into lines and come back, and what is no list gives no lines', () => {
  const points = [['400 °C', '12.3'], ['450 °C', '5.8']];
  assert.deepEqual(pointsOfLines(linesOfPoints(points)), points);
  for (const odd of [null, 7, 'x', {}]) assert.equal(linesOfPoints(odd), '');
});

test('K is fitted through points that were typed as lines, by keyboard', () =>
  visit('one file', async (page) => {
    await answered(page);
    await page.selectOption('#constant-from', 'points');
    await page.selectOption('#constant-kind', 'ln K');
    await page.focus('#constant-points');
    await page.keyboard.type('200 °C\t5');
    await page.keyboard.press('Enter');
    await page.keyboard.type('216 °C  5');
    assert.deepEqual((await caseOf(page)).reactions[0].constant, { from: 'points', kind: 'ln K', points: [['200 °C\t5', ''], ['216 °C', '5']].map((pair, index) => (index === 0 ? ['200 °C', '5'] : pair)) });
    assert.ok(Math.abs(number(await figure(page, 'k')) - Math.E ** 5) < 0.6, 'the same at both temperatures, so the same between them');
    await page.keyboard.press('Enter');
    await page.keyboard.type('230 °C  many');
    assert.match((await page.locator('.problem', { hasText: 'Line 3' }).textContent()) ?? '', /many/);
  }, AT_DESK));

test('a formula and the reading itself stand in the case as they were entered, by touch', () =>
  visit('one file', async (page) => {
    await answered(page);
    await page.selectOption('#constant-from', 'formula');
    await page.selectOption('#constant-formula-kind', 'ln K');
    await page.getByLabel('constant', { exact: true }).fill('-4.33');
    await page.getByLabel('× 1/T', { exact: true }).fill('4577.8');
    await page.getByLabel('× ln T', { exact: true }).fill('0.1');
    await page.tap('#constant-more summary');
    await page.fill('#constant-for', '2 CO + 2 H2O = 2 CO2 + 2 H2');
    const formula = { from: 'formula', kind: 'ln K', terms: { 1: '-4.33', '1/T': '4577.8', 'ln T': '0.1' }, for: '2 CO + 2 H2O = 2 CO2 + 2 H2' };
    assert.deepEqual((await caseOf(page)).reactions[0].constant, formula);
    await page.selectOption('#constant-from', 'reading');
    assert.deepEqual((await caseOf(page)).reactions[0].constant, { from: 'reading', for: formula.for });
    assert.equal(await page.isVisible('#constant-value'), false);
  }, BY_TOUCH));

/** @type {object[]} */
const SOURCES = [
  { from: 'library' },
  { from: 'value', value: '48.2', kind: 'Kp', pressure_unit: 'atm', at: '450 °C', enthalpy: '-98.9 kJ/mol', heat_capacity: '-20 J/(mol K)', for: 'CO2 + H2 = CO + H2O' },
  { from: 'points', kind: 'log10 K', points: [['400 °C', '1.2'], ['450 °C', '0.9']], approach: '5 K' },
  { from: 'formula', kind: 'log10 K', terms: { 1: '-1.9', '1/T^2': '3', 'log10 T': '0.2', T: '1e-4', 'T^2': '1e-8' }, pressure_unit: 'atm', range: ['400 °C', '600 °C'], tolerance: '0.05' },
  { from: 'reading', enthalpy: '-41 kJ/mol' },
];
for (const constant of SOURCES) {
  test(`a constant comes out of the form as it went in: ${JSON.stringify(constant).slice(0, 40)}`, () =>
    visit('one file', async (page) => {
      await answered(page);
      await openCase(page, { temperature: '420 °C', pressure: '2 bar', reactions: [{ equation: 'CO + H2O(g) = CO2 + H2', constant }] });
      await page.fill('#temperature', '421 °C');
      assert.deepEqual((await caseOf(page)).reactions[0].constant, constant);
    }, AT_DESK));
}
