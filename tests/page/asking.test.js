import assert from 'node:assert/strict';
import { test } from 'node:test';
import { visit } from './browser.js';
import { answered, AT_DESK, BY_TOUCH, caseOf } from './reading.js';

/** @import { Page } from 'playwright-core' */

/** Spaces that do not break as plain ones. @param {string | null} found */
const plain = (found) => (found ?? '').replace(/[\u00a0\u202f]/g, ' ');

/**
 * @param {Page} page
 * @param {string} selector
 */
const text = async (page, selector) => plain(await page.textContent(selector));

/**
 * Opens what a narrow screen has folded.
 * @param {Page} page
 * @param {string} id
 */
const unfolded = (page, id) => page.locator(`#${id} > details`).evaluate((fold) => {
  if (fold instanceof HTMLDetailsElement) fold.open = true;
});

test('a chart is drawn once the answer stands, and its values are read by keyboard', () =>
  visit('one file', async (page) => {
    await answered(page);
    await page.waitForSelector('#chart-rest svg .line');
    const values = page.locator('#chart-rest [data-part="values"]');
    const before = plain(await values.textContent());
    await page.focus('#chart-rest input[type="range"]');
    await page.keyboard.press('ArrowRight');
    const after = plain(await values.textContent());
    assert.notEqual(after, before);
    assert.match(after ?? '', /^\d+ °C – .*\d %$/);
    assert.equal(plain(await page.getAttribute('#chart-rest input[type="range"]', 'aria-valuetext')), after);
  }, AT_DESK));

test('a touch on the chart moves its cursor', () =>
  visit('one file', async (page) => {
    await answered(page);
    await unfolded(page, 'charts');
    await page.waitForSelector('#chart-k svg .line');
    const drawing = page.locator('#chart-k svg');
    await drawing.scrollIntoViewIfNeeded();
    const box = await drawing.boundingBox();
    assert.ok(box);
    await page.touchscreen.tap(box.x + box.width * 0.85, box.y + box.height * 0.4);
    const right = await text(page, '#chart-k [data-part="values"]');
    await page.touchscreen.tap(box.x + box.width * 0.3, box.y + box.height * 0.4);
    assert.notEqual(await text(page, '#chart-k [data-part="values"]'), right);
  }, BY_TOUCH));

test('rest is drawn at several pressures where pressure matters, and along the pressure', () =>
  visit('one file', async (page) => {
    await answered(page);
    await page.click('#cases-button');
    await page.click('[data-example="ammonia-converter"]');
    await page.waitForFunction(() => document.querySelectorAll('#chart-rest svg .line').length === 3);
    const dashes = await page.locator('#chart-rest svg .line').evaluateAll((lines) => lines.map((line) => line.getAttribute('stroke-dasharray')));
    assert.equal(new Set(dashes).size, 3, 'told apart without colour');
    await page.selectOption('#chart-along', 'pressure');
    await page.waitForFunction(() => /bar/.test(document.querySelector('#chart-rest [data-part="values"]')?.textContent ?? ''));
    await page.click('#chart-rest details summary');
    assert.ok(await page.locator('#chart-rest tbody tr').count() >= 20);
  }, AT_DESK));

test('a late answer of a chart is dropped: the chart is that of the case in hand', () =>
  visit('one file', async (page) => {
    await answered(page);
    await page.waitForSelector('#chart-k svg .line');
    for (const degrees of [220, 230, 240, 250]) await page.fill('#temperature', `${degrees} °C`);
    await page.waitForFunction(() => /250/.test(document.querySelector('#chart-rest svg')?.textContent ?? '') || document.querySelector('#chart-rest svg .rest-mark') !== null);
    assert.match(await text(page, '#working-lines'), /523\.15/);
  }, AT_DESK));

test('a target is found, and put into the case by keyboard', () =>
  visit('one file', async (page) => {
    await answered(page);
    await page.fill('#target-value', '0.2 %');
    await page.keyboard.press('Enter');
    assert.match(await text(page, '#target-answer'), /^One setting reaches it: 2\d\d\.\d/);
    await page.locator('#target-settings button').focus();
    await page.keyboard.press('Enter');
    const { temperature } = await caseOf(page);
    assert.match(temperature, /^2\d\d\.\d+ °C$/);
  }, AT_DESK));

test('a target out of reach says how near it gets, and a wrong number is shown at its field', () =>
  visit('one file', async (page) => {
    await answered(page);
    await page.fill('#target-value', '60 %');
    await page.click('#target-ask');
    assert.match(await text(page, '#target-answer'), /^No setting in this range reaches it; the nearest is/);
    await page.fill('#target-value', 'much');
    await page.click('#target-ask');
    assert.equal(await page.getAttribute('#target-value', 'aria-invalid'), 'true');
    assert.equal(await page.isVisible('#target-problem'), true);
  }, AT_DESK));

test('a number of K is turned into every other form', () =>
  visit('one file', async (page) => {
    await answered(page);
    await page.click('#convert > summary');
    await page.fill('#convert-equation', 'N2O4(g) = 2 NO2(g)');
    await page.fill('#convert-temperature', '25 °C');
    await page.selectOption('#convert-kind', 'Kp');
    assert.match(await text(page, '#convert-problem'), /pressure unit/);
    await page.selectOption('#convert-unit', 'atm');
    await page.fill('#convert-value', '0.143');
    // Kp in bar is 1.01325 times that in atm for Δν = 1.
    assert.match(await text(page, '#convert-forms'), /Kp in bar0\.1448[89]/);
  }, AT_DESK));

test('a pinned answer stands beside the one now, by touch', () =>
  visit('one file', async (page) => {
    await answered(page);
    await unfolded(page, 'compare');
    await page.tap('#pin');
    await page.fill('#temperature', '230 ± 2 °C');
    await page.waitForFunction(() => document.querySelector('#compare-text')?.textContent?.includes('230'));
    const row = await page.locator('#compare-rows tr', { hasText: 'T − T*' }).locator('td').allTextContents();
    assert.deepEqual([plain(row[0] ?? ''), plain(row[2] ?? '')], ['−23 K', '+22 K']);
    await page.tap('#unpin');
    assert.equal(await page.isVisible('#compare-table'), false);
  }, BY_TOUCH));
