import assert from 'node:assert/strict';
import { test } from 'node:test';
import { visit } from './browser.js';
import { answered, AT_DESK, BY_TOUCH, direction, openCase } from './reading.js';

/** @import { Page } from 'playwright-core' */

/** Spaces that do not break as plain ones. @param {string | null} found */
const plain = (found) => (found ?? '').replace(/[\u00a0\u202f]/g, ' ');

/**
 * @param {Page} page
 * @param {string} selector
 */
const text = async (page, selector) => plain(await page.textContent(selector));

/** @param {string} co */
const shift = (co) => ({
  temperature: '215 ± 2 °C', pressure: '27.4 ± 0.2 bar(g)',
  reactions: [{ equation: 'CO + H2O = CO2 + H2', constant: { from: 'library' } }],
  reading: { gas: { basis: 'dry', water: { per_dry: '0.30 ± 0.02' }, entries: [
    { species: 'CO', value: co }, { species: 'CO2', value: '19.6 ± 0.3 %' }, { species: 'N2', value: '4.5 ± 0.2 %' }, { species: 'H2', value: 'remainder' },
  ] } },
});

test('the interval is drawn against the band, and its words say the same', () =>
  visit('one file', async (page) => {
    await answered(page);
    await openCase(page, shift('0.42 ± 0.02 %'));
    assert.equal(await page.locator('#certainty-drawing .interval').count(), 3, 'a line with two ends');
    assert.match(await text(page, '#certainty-text'), /between −\d+ K and −\d+ K.*lies outside it/);
    await openCase(page, shift('0.30 ± 0.01 %'));
    assert.equal(await direction(page), 'at rest');
    assert.match(await text(page, '#certainty-text'), /lies inside it/);
  }, AT_DESK));

test('a bound opens the interval, and a value is wanted instead', () =>
  visit('one file', async (page) => {
    await answered(page);
    await openCase(page, shift('< 1 %'));
    assert.equal(await direction(page), 'cannot tell');
    assert.equal(await page.locator('#certainty-drawing .open-end').count(), 1);
    assert.match(await text(page, '#certainty-text'), /open (up|down)wards/);
    assert.match(await text(page, '#better'), /CO in the gas: a value instead of a bound/);
  }, AT_DESK));

test('what cannot be told says what to measure better', () =>
  visit('one file', async (page) => {
    await answered(page);
    await openCase(page, shift('0.42 ± 0.30 %'));
    assert.equal(await direction(page), 'cannot tell');
    assert.match(await text(page, '#better'), /CO in the gas: to ± 0\.\d+ %/);
  }, AT_DESK));

test('a line of the budget leads to its field, by keyboard', () =>
  visit('one file', async (page) => {
    await answered(page);
    await openCase(page, shift('0.42 ± 0.02 %'));
    const line = page.locator('#budget-rows button', { hasText: 'the water' });
    await line.focus();
    await page.keyboard.press('Enter');
    const field = await page.evaluate(() => document.activeElement?.closest('[data-field]')?.getAttribute('data-field'));
    assert.match(field ?? '', /water/);
  }, AT_DESK));

test('the band on conversion has its own scale', () =>
  visit('one file', async (page) => {
    await answered(page);
    await openCase(page, { ...shift('0.42 ± 0.02 %'), band: '1 %' });
    assert.match(await text(page, '#certainty-text'), /^The missing conversion is \+0\.\d+ %/);
  }, AT_DESK));

test('nudges say which way and, when touched, why; also where the rule of thumb is wrong', () =>
  visit('one file', async (page) => {
    await answered(page);
    await openCase(page, {
      temperature: '450 °C', pressure: '150 bar',
      reactions: [{ equation: 'N2 + 3 H2 = 2 NH3', constant: { from: 'library' } }],
      reading: { gas: { basis: 'wet', entries: [
        { species: 'N2', value: '70 %' }, { species: 'H2', value: '20 %' }, { species: 'NH3', value: 'remainder' },
      ] } },
    });
    const added = page.locator('[data-nudge="add N2(g)"]');
    assert.match((await added.locator('summary').textContent()) ?? '', /back/);
    await added.locator('summary').tap();
    assert.match((await added.locator('p').textContent()) ?? '', /50 %/);
    assert.match(await text(page, '[data-nudge="inert at constant volume "] summary'), /no move/);
  }, BY_TOUCH));

test('an opened reason stays open when the answer changes', () =>
  visit('one file', async (page) => {
    await answered(page);
    await page.locator('[data-nudge="temperature "] summary').focus();
    await page.keyboard.press('Enter');
    await page.fill('#temperature', '220 ± 2 °C');
    await page.waitForFunction(() => document.querySelector('#working-lines')?.textContent?.includes('493.15'));
    assert.equal(await page.isVisible('[data-nudge="temperature "] p'), true);
  }, AT_DESK));

test('a feed gives conversion, contraction and what the cooled sample lost', () =>
  visit('one file', async (page) => {
    await answered(page);
    assert.equal(await page.isVisible('#extras'), false, 'nothing to say without a feed');
    await openCase(page, {
      temperature: '600 °C', pressure: '1.2 bar',
      reactions: [{ equation: '2 SO2 + O2 = 2 SO3', constant: { from: 'library' } }],
      reading: { gas: { basis: 'dry', lost: ['SO3'], entries: [{ species: 'SO2', value: '2.2727 %' }, { species: 'O2', value: '6.8182 %' }, { species: 'N2', value: 'remainder' }] } },
      feed: { gas: { basis: 'wet', entries: [{ species: 'SO2', value: '10 %' }, { species: 'O2', value: '10 %' }, { species: 'N2', value: '80 %' }] } },
    });
    const said = await text(page, '#extra-figures');
    // 10 SO2 + 10 O2 + 80 N2 and 4 of extent: 80 % of the SO2, 100 to 96, 8 of 96 SO3.
    assert.match(said, /SO₂ converted since the feed80\.00 % now/);
    assert.match(said, /contraction of the gas4\.00\d* %/);
    assert.match(said, /SO₃, found from the feed8\.33\d %/);
    assert.equal(await page.locator('#element-rows tr').count(), 3);
  }, AT_DESK));

test('a solution tells its saturation and its charges', () =>
  visit('one file', async (page) => {
    await answered(page);
    await page.click('#cases-button');
    await page.click('[data-example="scrubber-sump"]');
    await page.waitForSelector('#extras:not([hidden])');
    assert.match(await text(page, '#extra-figures'), /saturation index of CaSO₄·2H₂O\(s\)\+0\.\d\d: above saturation/);
  }, AT_DESK));
