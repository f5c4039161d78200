import assert from 'node:assert/strict';
import { test } from 'node:test';
import { unitOf, withUnit } from '../../www/unit-text.js';
import { visit } from './browser.js';
import { answered, AT_DESK, BY_TOUCH, gasField } from './reading.js';

const TEMPERATURE = ['°C', 'K', '°F'];
const PRESSURE = ['bar(g)', 'bar(a)', 'kPa(g)', 'kPa(a)', 'MPa(a)', 'psi(g)', 'psi(a)'];
const GAS = ['%', 'ppm', 'bar(a)', 'mol', 'mol/h', 'Nm3/h', 'mg/Nm3', 'remainder', 'missing'];
const SOLUTION = ['mg/L', 'g/L', 'mmol/L', 'mol/L', 'mol/kg', 'pH', 'missing'];

/** @type {[text: string, unit: string, units: string[], becomes: string, had: string][]} */
const CHANGES = [
  ['208 ± 2 °C', 'K', TEMPERATURE, '208 ± 2 K', '°C'],
  ['208 °C ± 2 °C', 'K', TEMPERATURE, '208 K ± 2 K', '°C'],
  ['(208 ± 2) °C', 'K', TEMPERATURE, '(208 ± 2) K', '°C'],
  ['208C', '°F', TEMPERATURE, '208°F', '°C'],
  ['450 °C ± type K class 2', '°F', TEMPERATURE, '450 °F ± type K class 2', '°C'],
  ['450 type K class 2', '°C', TEMPERATURE, '450 °C type K class 2', ''],
  ['208 ± 2 parsec', '°C', TEMPERATURE, '208 ± 2 °C', ''],
  ['4,3', 'K', TEMPERATURE, '4,3 K', ''],
  ['', 'K', TEMPERATURE, 'K', ''],
  ['1.2e-3 bar', 'kPa(a)', PRESSURE, '1.2e-3 kPa(a)', 'bar(a)'],
  ['1.2e-3', 'bar(g)', PRESSURE, '1.2e-3 bar(g)', ''],
  ['23.6 barg', 'bar(a)', PRESSURE, '23.6 bar(a)', 'bar(g)'],
  ['-3 ± 1 mbar(g)', 'bar(g)', PRESSURE, '-3 ± 1 bar(g)', ''],
  ['< 5 ppm', '%', GAS, '< 5 %', 'ppm'],
  ['12 ± 3 % rel', 'ppm', GAS, '12 ± 3 % rel ppm', ''],
  ['80 mol/h', 'mol', GAS, '80 mol', 'mol/h'],
  ['remainder', '%', GAS, '%', 'remainder'],
  ['12 %', 'remainder', GAS, 'remainder', '%'],
  ['7.2', 'pH', SOLUTION, 'pH 7.2', ''],
  ['pH 7.2', 'mol/L', SOLUTION, '7.2 mol/L', 'pH'],
];
for (const [text, unit, units, becomes, had] of CHANGES) {
  test(`“${text}” in ${unit} reads “${becomes}”`, () => {
    assert.equal(unitOf(text, units), had);
    assert.equal(withUnit(text, unit, units), becomes);
  });
}

test('the chooser changes the unit by keyboard, not the number', () =>
  visit('one file', async (page) => {
    await answered(page);
    const chooser = page.getByRole('combobox', { name: 'Unit of Temperature' });
    await chooser.focus();
    assert.equal(await chooser.inputValue(), '°C');
    await page.keyboard.press('ArrowDown');
    assert.equal(await page.inputValue('#temperature'), '208 ± 2 K');
    await page.selectOption('[aria-label="Unit of CO"]', 'remainder');
    assert.equal(await gasField(page, 'CO').inputValue(), 'remainder');
    assert.equal(await gasField(page, 'H₂').inputValue(), '', 'the remainder moves');
  }, AT_DESK));

test('by touch a unit is one press on the bar under the field, which keeps the focus', () =>
  visit('one file', async (page) => {
    await answered(page);
    await page.tap('#pressure');
    await page.locator('#keys').getByRole('button', { name: 'kPa(a)' }).tap();
    assert.equal(await page.inputValue('#pressure'), '23.6 ± 0.2 kPa(a)');
    assert.equal(await page.evaluate(() => document.activeElement?.id), 'pressure');
  }, BY_TOUCH));
