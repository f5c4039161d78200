import assert from 'node:assert/strict';
import { test } from 'node:test';
import { visit } from './browser.js';
import { answered, AT_DESK, BY_TOUCH, caseOf, openCase, openExample } from './reading.js';

/** @import { Page } from 'playwright-core' */

const FOLDS = ['constant-more', 'band-fold', 'gas-more', 'solution-fold', 'feed-fold'];

/** @param {Page} page */
const open = (page) => page.evaluate((ids) => ids.filter((id) => document.getElementById(id)?.hasAttribute('open')), FOLDS);

const gas = { basis: 'wet', water: null, entries: [{ species: 'CO', value: '10 %' }, { species: 'N2', value: 'remainder' }] };
const reactions = [{ equation: 'CO + H2O(g) = CO2 + H2', constant: { from: 'library' } }];
const base = { temperature: '400 °C', pressure: '10 bar', reactions, reading: { gas } };

test('a simple case shows no optional part, and says the defaults of those that are folded', () =>
  visit('one file', async (page) => {
    await answered(page);
    assert.deepEqual(await open(page), []);
    assert.match((await page.textContent('#band-fold summary')) ?? '', /within 10 K/);
    assert.match((await page.textContent('#solution-fold summary')) ?? '', /none/);
    assert.match((await page.textContent('#feed-fold summary')) ?? '', /not given/);
  }, AT_DESK));

/** @type {[fold: string, part: object][]} */
const USES = [
  ['constant-more', { reactions: [{ equation: reactions[0]?.equation, constant: { from: 'library', approach: '15 K' } }] }],
  ['band-fold', { band: '1 %' }],
  ['gas-more', { reading: { gas: { ...gas, lost: ['SO3'] } } }],
  ['solution-fold', { reading: { gas, solution: { volume: '1 m3', water: null, entries: [{ species: 'Ca^2+', value: '700 mg/L' }] } } }],
  ['feed-fold', { feed: { gas } }],
];
for (const [fold, part] of USES) {
  test(`a case that uses it unfolds ${fold}, comes out of the form as it went in, and folds it away again`, () =>
    visit('one file', async (page) => {
      await answered(page);
      const question = { ...base, ...part };
      await openCase(page, question);
      assert.deepEqual(await open(page), [fold]);
      const read = await caseOf(page);
      for (const [name, value] of Object.entries(part)) {
        const found = name === 'reading' ? { gas: read.reading.gas, ...('solution' in value ? { solution: read.reading.solution } : {}) } : read[name];
        assert.deepEqual(found, value, name);
      }
      await openExample(page, 'low-temperature-shift');
      assert.deepEqual(await open(page), []);
    }, AT_DESK));
}

test('a feed, what the analyser counts in and what the sample lost are entered by keyboard', () =>
  visit('one file', async (page) => {
    await answered(page);
    await openCase(page, { ...base, reading: { gas: { ...gas, entries: [{ species: 'O2', value: '2 %' }, { species: 'N2', value: 'remainder' }] } } });
    await page.locator('#gas-more summary').press('Enter');
    await page.locator('#gas-includes-argon').press('Space');
    await page.fill('#gas-lost', 'SO3, H2O');
    await page.locator('#feed-fold summary').press('Enter');
    await page.locator('#feed-rows').getByRole('textbox', { name: 'CO, value', exact: true }).fill('12 %');
    await page.locator('input[name="feed-basis"][value="wet"]').press('Space');
    const { reading, feed } = await caseOf(page);
    assert.deepEqual(reading.gas.entries[0], { species: 'O2', value: '2 %', includes: 'Ar' });
    assert.deepEqual(reading.gas.lost, ['SO3', 'H2O']);
    assert.deepEqual(feed.gas, { basis: 'wet', water: null, entries: [{ species: 'CO', value: '12 %' }] });
    await page.getByRole('button', { name: 'Remove CO', exact: true }).last().press('Enter');
    assert.equal((await caseOf(page)).feed, null, 'an empty table is no feed');
  }, AT_DESK));

test('a solution and a liquid mixture are entered by touch', () =>
  visit('one file', async (page) => {
    await answered(page);
    await page.tap('#solution-fold summary');
    await page.selectOption('#solution-extent', 'water');
    await page.fill('#solution-size', '1000 kg');
    await page.tap('#solution-add');
    await page.keyboard.type('Ca^2+');
    await page.locator('#solution-rows .value').fill('700');
    await page.locator('#keys').getByRole('button', { name: 'mg/L' }).tap();
    for (const [species, value] of [['CH3OH', '40 mol %'], ['H2O', 'remainder']]) {
      await page.tap('#pure-add');
      await page.keyboard.type(species ?? '');
      await page.keyboard.press('Escape');
      const row = page.locator('#pure-rows .entry').last();
      await row.locator('select.phase').selectOption('l');
      await row.locator('input.value').fill(value ?? '');
    }
    const { reading } = await caseOf(page);
    assert.deepEqual(reading.solution, { volume: null, water: '1000 kg', entries: [{ species: 'Ca^2+', value: '700 mg/L' }] });
    assert.deepEqual(reading.liquid.entries, [{ species: 'CH3OH', value: '40 mol %' }, { species: 'H2O', value: 'remainder' }]);
    assert.equal(await page.isVisible('#mixture-hint'), true);
  }, BY_TOUCH));

test('odd things in the optional parts of a file do no harm', () =>
  visit('one file', async (page) => {
    await answered(page);
    await openCase(page, {
      ...base, band: { a: 1 }, feed: { gas: [7], liquid: 7 },
      reactions: [{ equation: 'CO + H2O(g) = CO2 + H2', constant: { from: 'points', points: [7, null, ['400 °C']], terms: [], for: 3 } }],
      reading: { gas: { ...gas, lost: 'SO3', entries: [{ species: 'O2', value: 7, includes: 4 }] }, solution: { volume: 7, entries: 'none' } },
    });
    assert.equal(await page.isVisible('#out-of-date'), true);
    await page.reload();
    await page.waitForSelector('#out-of-date:visible');
    await openExample(page, 'low-temperature-shift');
    assert.equal(await page.isHidden('#out-of-date'), true);
  }, AT_DESK));

test('a problem in a folded part unfolds it and stands at its field', () =>
  visit('one file', async (page) => {
    await answered(page);
    await openCase(page, { ...base, reactions: [{ equation: reactions[0]?.equation, constant: { from: 'library', approach: 'a bit' } }] });
    assert.equal(await page.getAttribute('#constant-approach', 'aria-invalid'), 'true');
    await page.evaluate(() => document.querySelector('#constant-more')?.removeAttribute('open'));
    await page.locator('#problem-list button').first().click();
    assert.equal(await page.evaluate(() => document.activeElement?.id), 'constant-approach');
  }, AT_DESK));
