import assert from 'node:assert/strict';
import { test } from 'node:test';
import { visit } from './browser.js';
import { answered, AT_DESK } from './reading.js';

/** @param {string | null} found */
const plain = (found) => (found ?? '').replace(/[\u00a0\u202f]/g, ' ');

test('a pinned answer stands in the verdict and in the ledger beside the one now, by keyboard', () =>
  visit('one file', async (page) => {
    await answered(page);
    const before = plain(await page.textContent('[data-figure="approach"] dd'));
    const restBefore = plain(await page.locator('#ledger-body tr[data-species="CO"] td').nth(1).textContent());
    await page.focus('#pin');
    await page.keyboard.press('Enter');
    assert.equal(await page.locator('.numbers .pinned').count(), 0, 'an answer is not set beside itself');
    await page.fill('#temperature', '230 ± 2 °C');
    await page.waitForSelector('[data-figure="approach"] .pinned');
    assert.equal(plain(await page.textContent('[data-figure="approach"] .pinned')), `pinned ${before}`);
    const under = page.locator('#ledger-body tr[data-species="CO"] + tr.pinned');
    assert.equal(plain(await under.locator('th').textContent()), 'CO, pinned');
    assert.equal(plain(await under.locator('td').nth(1).textContent()), restBefore);

    await page.fill('#temperature', 'warm');
    assert.equal(await page.isDisabled('#pin'), true, 'what is out of date is not pinned');
    await page.fill('#temperature', '230 ± 2 °C');
    await page.focus('#unpin');
    await page.keyboard.press('Enter');
    assert.equal(await page.locator('#answer .pinned, #ledger-body .pinned').count(), 0);
    assert.equal(await page.evaluate(() => document.activeElement?.id), 'pin');
  }, AT_DESK));

test('a pinned answer of another reaction does no harm', () =>
  visit('one file', async (page) => {
    await answered(page);
    await page.click('#pin');
    await page.click('#cases-button');
    await page.click('[data-example="lime-kiln"]');
    await page.waitForSelector('#ledger-body tr[data-species="CaO(s)"]');
    assert.equal(await page.locator('#ledger-body tr[data-species="CaO(s)"] + tr.pinned').count(), 0);
    assert.equal(await page.locator('#ledger-body tr[data-species="N2"] + tr.pinned').count(), 1, 'what both hold is compared');
    assert.equal(await page.isVisible('#compare-table'), true);
  }, AT_DESK));
