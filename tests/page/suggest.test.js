import assert from 'node:assert/strict';
import { test } from 'node:test';
import { visit } from './browser.js';
import { answered, AT_DESK, BY_TOUCH, caseOf, gasField } from './reading.js';

/** @import { Page } from 'playwright-core' */

/** @param {Page} page */
const offered = (page) => page.locator('[role="option"]:visible').allTextContents();

test('a species is found by name, formula and CAS number, with its phase, by keyboard', () =>
  visit('one file', async (page) => {
    await answered(page);
    for (const [typed, becomes] of [['ammonia', 'NH₃'], ['74-82-8', 'CH₄']]) {
      await page.focus('#gas-add');
      await page.keyboard.press('Enter');
      await page.keyboard.type(typed ?? '');
      const field = page.locator('#gas-rows input.species:focus');
      assert.equal(await field.getAttribute('aria-expanded'), 'true');
      assert.match((await offered(page)).join(), /gas/);
      await page.keyboard.press('ArrowDown');
      const active = await field.getAttribute('aria-activedescendant');
      assert.equal(await page.locator(`[id="${active}"]`).getAttribute('aria-selected'), 'true');
      await page.keyboard.press('Enter');
      assert.equal(await field.getAttribute('aria-expanded'), 'false');
      await page.keyboard.press('Tab');
      await page.keyboard.type('1 %');
      assert.equal(await gasField(page, becomes ?? '').inputValue(), '1 %');
    }
    assert.deepEqual((await caseOf(page)).reading.gas.entries.slice(-2), [{ species: 'NH3', value: '1 %' }, { species: 'CH4', value: '1 %' }]);
  }, AT_DESK));

test('Escape closes the list and keeps what was typed; a name left standing becomes its formula', () =>
  visit('one file', async (page) => {
    await answered(page);
    await page.click('#gas-add');
    await page.keyboard.type('argon');
    await page.keyboard.press('Escape');
    assert.equal((await offered(page)).length, 0);
    assert.equal(await page.locator('#gas-rows input.species:focus').inputValue(), 'argon');
    await page.keyboard.press('Tab');
    assert.equal(await gasField(page, 'Ar').count(), 1);
  }, AT_DESK));

test('a species taken by touch stands in the equation with the phase that was chosen', () =>
  visit('one file', async (page) => {
    await answered(page);
    await page.tap('#equation');
    await page.fill('#equation', 'CaO + H2O');
    const options = page.locator('[role="option"]:visible');
    await page.keyboard.type(' ');
    assert.equal(await options.count(), 0, 'a word that is ended asks for nothing');
    await page.keyboard.press('Backspace');
    assert.ok(await options.count() >= 2, 'water as a gas and as a liquid, and what begins alike');
    assert.ok(((await options.first().boundingBox())?.height ?? 0) >= 44);
    await options.filter({ hasText: 'liquid' }).first().tap();
    assert.equal(await page.inputValue('#equation'), 'CaO + H2O(l)');
    await page.keyboard.type(' = Ca(OH)2');
    assert.match((await page.textContent('#understood')) ?? '', /CaO.* \+ H₂O\(l\) = Ca\(OH\)₂/);
  }, BY_TOUCH));

test('a solid brings its phase and the name of its form', () =>
  visit('one file', async (page) => {
    await answered(page);
    await page.click('#pure-add');
    await page.keyboard.type('graphite');
    await page.keyboard.press('ArrowDown');
    await page.keyboard.press('Enter');
    await page.locator('#pure-rows input.value').fill('present');
    const [entry] = (await caseOf(page)).reading.solids.entries;
    assert.equal(entry.species, 'C(s, graphite)');
  }, AT_DESK));
