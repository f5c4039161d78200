import assert from 'node:assert/strict';
import { test } from 'node:test';
import { readPasted } from '../../www/paste.js';
import { visit } from './browser.js';
import { answered, AT_DESK, BY_TOUCH, caseOf, gasField } from './reading.js';

/** @type {Record<string, string>} */
const KNOWN = { CO: 'CO', CO2: 'CO2', H2: 'H2', N2: 'N2', 'carbon monoxide': 'CO', Hydrogen: 'H2', O2: 'O2' };

/** @type {[title: string, text: string, entries: [string, string][], rest?: object][]} */
const PASTED = [
  ['a value a line', 'CO 0.42 %\nCO2 19.6 ± 0.3 %\nN2 < 5 ppm', [['CO', '0.42 %'], ['CO2', '19.6 ± 0.3 %'], ['N2', '< 5 ppm']]],
  ['lines with signs between', 'CO: 0,42 %\nCO2 = 19.6%\nH2; balance', [['CO', '0,42 %'], ['CO2', '19.6%'], ['H2', 'remainder']]],
  ['two columns', 'CO\t0.42 %\r\ncarbon monoxide\t1 %\r\n', [['CO', '0.42 %'], ['CO', '1 %']]],
  ['three columns', 'CO\t0.42\t%\nN2\t40\tppm', [['CO', '0.42 %'], ['N2', '40 ppm']]],
  ['a heading over values', 'CO\tCO2\tHydrogen\n0.42 %\t19.6 %\trest', [['CO', '0.42 %'], ['CO2', '19.6 %'], ['H2', 'remainder']]],
  ['units in the heading', 'CO [%]\tCO2 (vol %)\tN2 ppm\n0.42\t19.6\t40', [['CO', '0.42 %'], ['CO2', '19.6 vol %'], ['N2', '40 ppm']]],
  ['two columns under a heading', 'Component\tvol %\nCO\t0.42\nCO2\t19.6 %', [['CO', '0.42 vol %'], ['CO2', '19.6 %']]],
  ['a heading and values with semicolons', 'CO;CO2;H2\n0,42 %;19,6 %;rest', [['CO', '0,42 %'], ['CO2', '19,6 %'], ['H2', 'remainder']]],
  ['a table with more than one row of values', 'Time\tCO\tCO2\n08:00\t0.42 %\t19 %\n09:00\t0.43 %\t20 %', [['CO', '0.42 %'], ['CO2', '19 %']], { left: ['Time', 'the further rows'] }],
  ['a row of units', 'CO\tCO2\n%\tppm\n0.42\t400', [['CO', '0.42 %'], ['CO2', '400 ppm']]],
  ['conditions with it', 'T [°C]\tP\tCO\n215\t27.4 bar(g)\t0.42 %', [['CO', '0.42 %']], { temperature: '215 °C', pressure: '27.4 bar(g)' }],
  ['bare numbers that are per cents', 'CO 0.42\nCO2 19.6\nH2 79.98', [['CO', '0.42 %'], ['CO2', '19.6 %'], ['H2', '79.98 %']], { asPercent: true }],
  ['bare numbers that are fractions', 'CO 0.2\nCO2 0.8', [['CO', '0.2'], ['CO2', '0.8']], { asPercent: false }],
  ['what is not understood', 'Monday shift\nCO 0.42 %\nvalve 3', [['CO', '0.42 %']], { left: ['Monday shift', 'valve 3'] }],
  ['nothing', '\n \n', []],
];
for (const [title, text, entries, rest = {}] of PASTED) {
  test(`pasted: ${title}`, () => {
    const found = readPasted(text, (name) => KNOWN[name] ?? null);
    assert.deepEqual(found.entries.map(({ species, value }) => [species, value]), entries);
    for (const [name, value] of Object.entries(rest)) assert.deepEqual(Reflect.get(found, name), value, name);
  });
}

test('a pasted analysis is shown before it is taken over, and undone in one step, by keyboard', () =>
  visit('one file', async (page) => {
    await answered(page);
    const before = (await caseOf(page)).reading.gas.entries;
    await page.focus('#gas-paste');
    await page.keyboard.press('Enter');
    assert.equal(await page.evaluate(() => document.activeElement?.id), 'paste-text');
    await page.keyboard.insertText('carbon monoxide\t0.31 %\nCO2 18.8 %\nN2 3.6 %\nH2 balance\nsample port 4 b');
    const preview = (await page.textContent('#paste-preview')) ?? '';
    assert.match(preview, /4 gases: CO 0\.31 %, CO₂ 18\.8 %, N₂ 3\.6 %, H₂ remainder\. Left out: sample port 4 b\./);
    assert.deepEqual((await caseOf(page)).reading.gas.entries, before, 'nothing is taken over yet');
    await page.keyboard.press('Tab');
    await page.keyboard.press('Enter');
    assert.equal(await gasField(page, 'CO').inputValue(), '0.31 %');
    assert.match((await page.textContent('#notice')) ?? '', /Taken over: 4 gases/);
    assert.equal((await caseOf(page)).reading.gas.water.dew_point, '166 ± 1 °C', 'the water stays');
    await page.keyboard.press('Control+z');
    assert.deepEqual((await caseOf(page)).reading.gas.entries, before);
  }, AT_DESK));

test('a table pasted into a row is spread over the rows', () =>
  visit('one file', async (page) => {
    await answered(page);
    await gasField(page, 'CO').focus();
    await page.evaluate(() => {
      const clipboardData = new DataTransfer();
      clipboardData.setData('text/plain', 'CO\tCO2\tH2\n0.5 %\t20 %\tremainder\n');
      document.activeElement?.dispatchEvent(new ClipboardEvent('paste', { clipboardData, bubbles: true, cancelable: true }));
    });
    assert.deepEqual((await caseOf(page)).reading.gas.entries, [{ species: 'CO', value: '0.5 %' }, { species: 'CO2', value: '20 %' }, { species: 'H2', value: 'remainder' }]);
  }, AT_DESK));

test('by touch the same', () =>
  visit('one file', async (page) => {
    await answered(page);
    await page.tap('#gas-paste');
    await page.fill('#paste-text', 'CO 0.31\nCO2 18.8\nH2 80.89');
    assert.match((await page.textContent('#paste-preview')) ?? '', /read as %/);
    await page.tap('#paste-take');
    assert.equal(await gasField(page, 'CO₂').inputValue(), '18.8 %');
    await page.tap('#undo');
    assert.equal(await gasField(page, 'CO₂').inputValue(), '17.2 ± 0.2 %');
  }, BY_TOUCH));
