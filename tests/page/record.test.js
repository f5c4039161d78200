import assert from 'node:assert/strict';
import { test } from 'node:test';
import { visit } from './browser.js';
import { answered, AT_DESK, BY_TOUCH, caseOf, direction, openCase, openExample } from './reading.js';

/** @import { Page } from 'playwright-core' */

const PARTS = ['verdict', 'reading', 'ledger', 'picture', 'assumptions', 'certainty', 'nudges', 'working', 'sources', 'cautions', 'link'];

/**
 * How many sheets the page prints on.
 * @param {Page} page
 */
async function sheets(page) {
  const pdf = (await page.pdf({ preferCSSPageSize: true })).toString('latin1');
  return { count: pdf.match(/\/Type\s*\/Page\b(?!s)/g)?.length, size: /\/MediaBox\s*\[0 0 ([\d.]+) ([\d.]+)/.exec(pdf)?.slice(1).map((side) => Math.round(Number(side))) };
}

/**
 * Shows the record as it is printed.
 * @param {Page} page
 */
async function onPaper(page) {
  await page.emulateMedia({ media: 'print' });
  await page.evaluate(() => window.dispatchEvent(new Event('beforeprint')));
}

/** @param {Page} page */
async function offPaper(page) {
  await page.evaluate(() => window.dispatchEvent(new Event('afterprint')));
  await page.emulateMedia({ media: null });
}

for (const example of ['low-temperature-shift', 'ammonia-converter', 'chlorine-recovery', 'lime-kiln', 'scrubber-sump']) {
  test(`the record of an example is one sheet of A4 with every part: ${example}`, () =>
    visit('one file', async (page) => {
      await answered(page);
      await openExample(page, example);
      assert.deepEqual(await sheets(page), { count: 1, size: [595, 842] });
      await onPaper(page);
      const shown = await page.evaluate(() => [...document.querySelectorAll('[data-record]')]
        .filter((part) => part.checkVisibility() && part.getBoundingClientRect().height > 10)
        .map((part) => part.getAttribute('data-record')));
      assert.deepEqual(shown, example === 'scrubber-sump' ? PARTS.toSpliced(7, 0, 'extras') : PARTS);
      assert.equal(await page.isVisible('#inputs'), false, 'nothing else of the page');
      assert.ok(((await page.locator('[data-record="picture"] svg').boundingBox())?.height ?? 0) > 100, 'the valley is drawn');
      const smallest = await page.evaluate(() => Math.min(...[...document.querySelectorAll('.record p, .record li, .record td')].map((element) => Number.parseFloat(getComputedStyle(element).fontSize))));
      assert.ok(smallest >= 6.5, `small print is legible: ${smallest} px`);
    }, AT_DESK));
}

test('the record says the job, the time, the versions, and the case as a link that opens', () =>
  visit('one file', async (page) => {
    await answered(page);
    await page.fill('#title', 'Bed 7, <i>evening</i> round');
    await page.fill('#note', 'Read by nobody');
    await page.fill('#temperature', '211 ± 2 °C');
    const question = await caseOf(page);
    for (const wait of [0, 600]) {
      await page.waitForTimeout(wait);
      await onPaper(page);
      const text = (await page.textContent('#record')) ?? '';
      for (const found of [/^Bed 7, <i>evening<\/i> round/, /printed \d+ \w+ \d{4} at \d\d:\d\d/, /Read by nobody/, /211 ± 2 °C/, /forward/, /McBride/, /Shiftgauge 0\.\d+\.\d+.*shiftgauge 1/, /not how fast/]) assert.match(text, found);
      const link = (await page.textContent('.record-link')) ?? '';
      await offPaper(page);
      const other = await page.context().newPage();
      await other.goto(link);
      await answered(other);
      await other.waitForFunction(() => window.location.hash === '');
      assert.deepEqual(await caseOf(other), question, 'also at once, before the link is packed');
      await other.close();
    }
    assert.equal(await page.locator('#record > *').count(), 0, 'it is gone from the screen');
  }, AT_DESK));

test('a record of a case with a problem says that its answer is out of date', () =>
  visit('one file', async (page) => {
    await answered(page);
    await page.fill('#temperature', 'warm');
    await onPaper(page);
    assert.match((await page.textContent('.record-old')) ?? '', /Out of date.*warm/);
  }, BY_TOUCH));

test('a long case stays on one sheet as long as it can be read', () =>
  visit('one file', async (page) => {
    await answered(page);
    const names = ['Ar', 'He', 'CH4', 'C2H6', 'NH3', 'HCN', 'H2S', 'COS'];
    const { reading, ...rest } = await caseOf(page);
    await openCase(page, { ...rest, reading: { ...reading, gas: { ...reading.gas, entries: [...reading.gas.entries, ...names.map((species) => ({ species, value: '40 ppm' }))] } } });
    assert.equal(await direction(page), 'forward');
    assert.equal((await sheets(page)).count, 1);
  }, BY_TOUCH));
