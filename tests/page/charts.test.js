import assert from 'node:assert/strict';
import { test } from 'node:test';
import { visit } from './browser.js';
import { answered, AT_DESK, openCase, openExample } from './reading.js';

/** @import { Page } from 'playwright-core' */

/**
 * Waits until a chart has this many lines.
 * @param {Page} page
 * @param {string} id
 * @param {number} count
 */
const lines = (page, id, count) => page.waitForFunction(([chart, wanted]) => document.querySelectorAll(`#${chart} svg .line`).length === wanted, /** @type {const} */ ([id, count]));

test('the user names the lines of a chart; one that cannot be read is said at its field', () =>
  visit('one file', async (page) => {
    await answered(page);
    await openExample(page, 'ammonia-converter');
    await lines(page, 'chart-rest', 3);
    await page.focus('#chart-lines');
    await page.keyboard.press('Control+A');
    await page.keyboard.type('60 bar; 120 bar(g)');
    await lines(page, 'chart-rest', 2);
    assert.match((await page.textContent('#chart-rest figcaption')) ?? '', /60 bar and 120 bar\(g\)/);

    await page.keyboard.type('; much');
    await page.waitForSelector('#chart-problem:visible:has-text("much")');
    assert.equal(await page.getAttribute('#chart-lines', 'aria-invalid'), 'true');
    assert.equal(await page.locator('#chart-rest svg').count(), 0, 'no old chart stands in its place');

    await page.selectOption('#chart-along', 'pressure');
    await lines(page, 'chart-rest', 3);
    assert.equal(await page.isHidden('#chart-problem'), true);
    assert.match(await page.inputValue('#chart-lines'), /^443 °C; 468 °C; 493 °C$/, 'the usual lines of the other axis');
  }, AT_DESK));

test('the reading and its rest stand on the chart, and the cursor begins there', () =>
  visit('one file', async (page) => {
    await answered(page);
    await openExample(page, 'ammonia-converter');
    await lines(page, 'chart-rest', 3);
    assert.equal(await page.inputValue('#chart-show'), 'fraction NH3(g)', 'what the way to rest changes most');
    assert.deepEqual(await page.locator('#chart-rest svg .flag').allTextContents(), ['rest', 'now']);
    assert.match((await page.textContent('#chart-rest [data-part="values"]')) ?? '', /^468/);
    assert.match((await page.textContent('#chart-k [data-part="values"]')) ?? '', /^46[78]/);
  }, AT_DESK));

test('ln K is broken where its points end, shows them, and has round temperatures above', () =>
  visit('one file', async (page) => {
    await answered(page);
    // Invented points on a straight line.
    const points = [['700 K', '4.2'], ['750 K', '3.1'], ['800 K', '2.2']];
    await openCase(page, {
      temperature: '560 °C', pressure: '2 bar',
      reactions: [{ equation: 'SO2 + 1/2 O2 = SO3', constant: { from: 'points', kind: 'ln K', points } }],
      reading: { gas: { basis: 'wet', entries: [{ species: 'SO2', value: '6 %' }, { species: 'O2', value: '8 %' }, { species: 'SO3', value: '2 %' }, { species: 'N2', value: 'remainder' }] } },
    });
    await page.waitForSelector('#chart-k svg .point-mark');
    assert.equal(await page.locator('#chart-k svg .point-mark').count(), points.length);
    const dashes = await page.locator('#chart-k svg .line:not(.thin)').evaluateAll((found) => found.map((line) => line.getAttribute('stroke-dasharray')));
    assert.ok(dashes.includes('') && dashes.some((dash) => dash !== ''), `solid within the data, dashed beyond: ${dashes.join(' | ')}`);
    assert.ok((await page.locator('#chart-k svg .outside').count()) >= 1);
    assert.match((await page.textContent('#chart-k figcaption')) ?? '', /Shaded and dashed: outside the range of the data/);
    const above = await page.locator('#chart-k svg .tick').evaluateAll((ticks) => ticks.filter((tick) => Number(tick.getAttribute('y')) < 60).map((tick) => tick.textContent ?? ''));
    assert.equal(above[0], '°C');
    assert.ok(above.length > 2 && above.slice(1).every((text) => Number(text) % 10 === 0), above.join(' '));
  }, AT_DESK));

test('every point of a chart is copied as bare numbers with tabs', () =>
  visit('served', async (page) => {
    await page.context().grantPermissions(['clipboard-read', 'clipboard-write']);
    await answered(page);
    await openExample(page, 'ammonia-converter');
    await lines(page, 'chart-k', 4);
    await page.click('#chart-k details summary');
    await page.focus('#chart-k [data-part="copy"]');
    await page.keyboard.press('Enter');
    await page.waitForSelector('#chart-k [data-part="copy"]:has-text("Copied")');
    const rows = (await page.evaluate(() => navigator.clipboard.readText())).split('\n').map((row) => row.split('\t'));
    assert.deepEqual(rows[0], ['temperature, °C', '1000 K/T', 'ln K', 'ln K − 2u', 'ln K + 2u', 'ln Q now']);
    assert.equal(rows.length, 122);
    for (const row of rows.slice(1)) assert.ok(row.length === 6 && row.every((cell) => cell !== '' && Number.isFinite(Number(cell))), row.join(' '));
    const [celsius, reciprocal] = rows[60]?.map(Number) ?? [];
    assert.ok(Math.abs(Number(reciprocal) * (Number(celsius) + 273.15) - 1000) < 1e-2, 'the two scales are of one temperature');
  }, { context: { viewport: { width: 1280, height: 800 } } }));
