import assert from 'node:assert/strict';
import { test } from 'node:test';
import { openPage } from './browser.js';
import { answered, direction } from './reading.js';

/** @import { Page } from 'playwright-core' */

/**
 * Presses Tab until this element has the focus, and gives what was passed on the way.
 * @param {Page} page
 * @param {string} id
 */
async function tabTo(page, id) {
  /** @type {string[]} */
  const passed = [];
  for (let presses = 0; presses < 120; presses += 1) {
    await page.keyboard.press('Tab');
    const focused = await page.evaluate(() => {
      const element = document.activeElement;
      if (!(element instanceof HTMLElement)) return { id: '', seen: true };
      const outline = getComputedStyle(element).outlineStyle !== 'none';
      const around = element.closest('label');
      const stand_in = around !== null && [around, ...around.children].some((one) => getComputedStyle(one).outlineStyle !== 'none');
      return { id: element.id || element.textContent?.trim() || element.tagName, seen: outline || stand_in };
    });
    assert.ok(focused.seen, `the focus shows on ${focused.id}`);
    passed.push(focused.id);
    if (focused.id === id) return passed;
  }
  throw new Error(`Tab never reached ${id}: ${passed.join(', ')}`);
}

test('a case can be worked with the keyboard alone', async () => {
  const { page, close } = await openPage({ from: 'served', viewport: { width: 1280, height: 800 } });
  try {
    await answered(page);
    const passed = await tabTo(page, 'temperature');
    for (const id of ['To the answer', 'title', 'cases-button', 'equation', 'constant-from']) assert.ok(passed.includes(id), `${id} is on the way: ${passed.join(', ')}`);
    await page.keyboard.press('Control+A');
    await page.keyboard.type('268 °C');
    assert.equal(await direction(page), 'reverse');
    await page.keyboard.press('Enter');
    assert.equal(await direction(page), 'reverse', 'Enter sends the form nowhere');
    assert.equal(await page.inputValue('#temperature'), '268 °C');
  } finally {
    await close();
  }
});

test('the cases open, close and start an example with the keyboard alone', async () => {
  const { page, close } = await openPage({ from: 'served', viewport: { width: 1280, height: 800 } });
  try {
    await answered(page);
    await page.focus('#cases-button');
    await page.keyboard.press('Enter');
    assert.equal(await page.getAttribute('#cases-button', 'aria-expanded'), 'true');
    await tabTo(page, 'HCl oxidation');
    await page.keyboard.press('Escape');
    assert.equal(await page.isHidden('#cases'), true);
    assert.equal(await page.evaluate(() => document.activeElement?.id), 'cases-button', 'the focus goes back');
    await page.keyboard.press('Enter');
    await tabTo(page, 'HCl oxidation');
    await page.keyboard.press('Enter');
    assert.match(await page.inputValue('#title'), /HCl/);
  } finally {
    await close();
  }
});
