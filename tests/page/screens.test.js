import assert from 'node:assert/strict';
import { test } from 'node:test';
import { openPage, visit } from './browser.js';
import { answered } from './reading.js';

/** The last is what a zoom of 200 % leaves of 1280 × 800. */
const SCREENS = [
  { width: 1280, height: 800 },
  { width: 800, height: 1280 },
  { width: 390, height: 844 },
  { width: 320, height: 640 },
  { width: 640, height: 400 },
];
const SMALLEST_TARGET_PX = 44;

/** @param {import('playwright-core').Page} page */
async function unfoldAll(page) {
  await page.selectOption('#constant-from', 'formula');
  await page.evaluate(() => document.querySelectorAll('details.fold').forEach((fold) => fold.setAttribute('open', '')));
  for (const name of ['gas', 'pure', 'solution', 'feed']) await page.click(`#${name}-add`);
  await page.click('#gas-paste');
}

for (const viewport of SCREENS) {
  const size = `${viewport.width} × ${viewport.height}`;

  test(`nothing is wider than the screen, right or wrong (${size})`, async () => {
    const { page, close } = await openPage({ from: 'served', viewport });
    try {
      await answered(page);
      const overhang = () => page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);
      assert.equal(await overhang(), 0);
      await page.click('#cases-button');
      assert.equal(await overhang(), 0, 'with the cases open');
      await page.fill('#temperature', `208 ${'unknown'.repeat(12)}`);
      assert.equal(await overhang(), 0, 'with a problem');
      await unfoldAll(page);
      assert.equal(await overhang(), 0, 'with everything unfolded');
    } finally {
      await close();
    }
  });

  test(`the sentence is in view while typing, and covers no field in hand (${size})`, async () => {
    const { page, close } = await openPage({ from: 'served', viewport });
    try {
      await answered(page);
      await unfoldAll(page);
      const fields = page.locator('#inputs input[data-field]:not([type="radio"]):visible');
      for (let index = 0; index < (await fields.count()); index += 1) {
        await fields.nth(index).focus();
        await page.keyboard.press('End');
        await page.keyboard.type(' ');
        const found = await page.evaluate(() => {
          const field = document.activeElement?.getBoundingClientRect();
          const line = document.querySelector('#sentence')?.getBoundingClientRect();
          const answer = document.querySelector('#answer')?.getBoundingClientRect();
          if (!field || !line || !answer) return null;
          const overlaps = field.left < answer.right && field.right > answer.left && field.top < answer.bottom && field.bottom > answer.top;
          return { lineTop: line.top, lineBottom: line.bottom, overlaps, fieldTop: field.top, fieldBottom: field.bottom, height: window.innerHeight };
        });
        assert.ok(found, 'the page has a sentence');
        assert.ok(found.lineTop >= 0 && found.lineBottom <= found.height, `the sentence is in view: ${JSON.stringify(found)}`);
        assert.ok(!found.overlaps, `the field is not covered: ${JSON.stringify(found)}`);
      }
    } finally {
      await close();
    }
  });

  test(`what is touched is high enough, right or wrong (${size})`, () =>
    visit('served', async (page) => {
      await answered(page);
      await page.click('#cases-button');
      await page.click('#keep-case');
      await unfoldAll(page);
      const low = await page.evaluate((least) => [...document.querySelectorAll('button, select, textarea, summary, .button, .check, .segments span, input:not([type="radio"], [type="checkbox"], [type="file"])')]
        .filter((element) => element.checkVisibility() && element.getBoundingClientRect().height < least - 0.5)
        .map((element) => `${element.tagName} ${element.id} ${element.textContent ?? ''}`), SMALLEST_TARGET_PX);
      assert.deepEqual(low, []);
    }, { context: { viewport, hasTouch: true } }));
}
