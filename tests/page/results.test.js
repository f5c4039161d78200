// The whole of the answer in its fullest state: everything open, an answer pinned, a target asked for.

import assert from 'node:assert/strict';
import { createRequire } from 'node:module';
import { test } from 'node:test';
import { visit } from './browser.js';
import { answered, AT_DESK, openExample } from './reading.js';

/** @import { Page } from 'playwright-core' */

const { AxeBuilder } = createRequire(new URL('../../www/package.json', import.meta.url))('@axe-core/playwright');
const EXAMPLES = ['low-temperature-shift', 'ammonia-converter', 'chlorine-recovery', 'lime-kiln', 'scrubber-sump'];
const SMALLEST_TARGET_PX = 44;

/**
 * @param {Page} page
 * @param {string} example
 */
async function fullest(page, example) {
  await answered(page);
  await page.evaluate(() => document.querySelectorAll('#results details').forEach((fold) => fold.setAttribute('open', '')));
  await page.click('#pin');
  await openExample(page, example);
  await page.waitForSelector('#chart-k svg .line');
  await page.fill('#target-value', '1 %');
  await page.press('#target-value', 'Enter');
}

// 640 × 400 is a window of 1280 × 800 enlarged to 200 %.
for (const viewport of [{ width: 640, height: 400 }, { width: 390, height: 844 }, { width: 320, height: 640 }]) {
  test(`the answer fits and is large enough to touch, everything open (${viewport.width} × ${viewport.height})`, () =>
    visit('one file', async (page) => {
      for (const example of EXAMPLES) {
        await fullest(page, example);
        const overhang = await page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);
        assert.equal(overhang, 0, example);
        const low = await page.evaluate((least) => [...document.querySelectorAll('#results :is(button, select, input:not([type="radio"]), summary)')]
          .filter((element) => element.checkVisibility() && element.getBoundingClientRect().height < least - 0.5)
          .map((element) => `${element.tagName} ${element.id} ${element.textContent ?? ''}`), SMALLEST_TARGET_PX);
        assert.deepEqual(low, [], example);
      }
    }, { context: { viewport, hasTouch: true } }));
}

for (const colorScheme of /** @type {const} */ (['light', 'dark'])) {
  test(`no accessibility fault with everything open (${colorScheme})`, () =>
    visit('served', async (page) => {
      for (const example of EXAMPLES) {
        await fullest(page, example);
        const { violations } = await new AxeBuilder({ page }).include('#results').include('#answer').analyze();
        const told = violations.map((/** @type {{ id: string, nodes: { html: string }[] }} */ { id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join(' ')}`);
        assert.deepEqual(told, [], example);
      }
    }, { context: { viewport: { width: 1280, height: 800 }, colorScheme } }));
}

test('where rest could lie within the tolerances is marked on the floor of the valley, and said', () =>
  visit('one file', async (page) => {
    await answered(page);
    const strip = page.locator('.valley-svg .within');
    assert.equal(await strip.count(), 1);
    assert.match((await page.textContent('#valley-text')) ?? '', /Within the tolerances rest lies between [\d.]+.mmol and [\d.]+.mmol/);
    const [from, width] = await Promise.all(['x', 'width'].map(async (name) => Number(await strip.getAttribute(name))));
    const rest = /^M([\d.]+) /.exec((await page.getAttribute('.valley-svg .rest-mark', 'd')) ?? '');
    assert.ok(Number(rest?.[1]) > Number(from) && Number(rest?.[1]) < Number(from) + Number(width), 'rest lies on the strip');
  }, AT_DESK));

test('where there is no T* the interval of the affinity is drawn instead', () =>
  visit('one file', async (page) => {
    await answered(page);
    await openExample(page, 'scrubber-sump');
    assert.match((await page.textContent('#certainty-text')) ?? '', /^There is no T\* to compare with.*the interval lies below\.$/);
    assert.equal(await page.locator('#certainty-drawing .interval').count(), 3);
    assert.equal(await page.locator('#certainty-drawing .band').count(), 0);
  }, AT_DESK));

test('the longest arrow is that of the largest change', () =>
  visit('one file', async (page) => {
    await answered(page);
    await openExample(page, 'lime-kiln');
    const lengths = await page.locator('#nudge-list .length').evaluateAll((arrows) => arrows.map((arrow) => Number(getComputedStyle(arrow).getPropertyValue('--length'))));
    assert.equal(Math.max(...lengths), 1);
    assert.equal(lengths[0], 1, 'five kelvins move a kiln most');
    assert.ok(lengths.some((length) => length === 0) && lengths.some((length) => length > 0 && length < 1));
  }, AT_DESK));
