import assert from 'node:assert/strict';
import { test } from 'node:test';
import { visit } from './browser.js';
import { answered, AT_DESK, BY_TOUCH, openExample } from './reading.js';

/** @import { Page } from 'playwright-core' */

/** @param {Page} page */
const names = async (page) => (await page.locator('.kept-open').allTextContents()).map((text) => text.replace(/ \d+ \w+ \d{4}, \d\d:\d\d$/, ''));
/** @param {Page} page */
const said = async (page) => (await page.textContent('#kept-said')) ?? '';

test('a case is kept by name, opened, renamed, deleted and brought back, by keyboard', () =>
  visit('one file', async (page) => {
    await answered(page);
    await page.fill('#temperature', '211 °C');
    await page.click('#cases-button');
    await page.focus('#keep-name');
    await page.keyboard.type('Bed 7');
    await page.keyboard.press('Enter');
    assert.deepEqual(await names(page), ['Bed 7']);
    await openExample(page, 'chlorine-recovery');
    await page.reload();
    await answered(page);
    await page.focus('#cases-button');
    await page.keyboard.press('Enter');
    await page.getByRole('button', { name: 'Rename Bed 7' }).press('Enter');
    await page.keyboard.type('Bed 7, <b>old</b> catalyst');
    await page.keyboard.press('Enter');
    assert.deepEqual(await names(page), ['Bed 7, <b>old</b> catalyst']);
    assert.equal(await page.evaluate(() => document.activeElement?.getAttribute('aria-label')), 'Rename Bed 7, <b>old</b> catalyst', 'the focus stays in the row');
    await page.getByRole('button', { name: /^Delete Bed 7/ }).press('Enter');
    assert.deepEqual(await names(page), []);
    assert.equal(await page.evaluate(() => document.activeElement?.textContent), 'Undo');
    await page.keyboard.press('Enter');
    assert.deepEqual(await names(page), ['Bed 7, <b>old</b> catalyst']);
    await page.locator('.kept-open').press('Enter');
    assert.equal(await page.inputValue('#temperature'), '211 °C');
  }, AT_DESK));

test('a name that is taken is replaced only with a way back, and never by renaming; by touch', () =>
  visit('one file', async (page) => {
    await answered(page);
    await page.tap('#cases-button');
    await page.tap('#keep-case');
    const title = await page.inputValue('#title');
    assert.deepEqual(await names(page), [title], 'the title is the name where none is typed');
    await page.fill('#temperature', '268 °C');
    await page.tap('#keep-case');
    assert.match(await said(page), /in the place of/);
    await page.tap('#kept-undo');
    await page.fill('#keep-name', 'Another');
    await page.tap('#keep-case');
    await page.getByRole('button', { name: 'Rename Another' }).tap();
    await page.fill('.kept-name:visible', title);
    await page.getByRole('button', { name: 'Rename Another' }).tap();
    assert.match(await said(page), /already: nothing was renamed/);
    await page.locator('.kept-open:visible').tap();
    assert.equal(await page.inputValue('#temperature'), '208 ± 2 °C', 'the replaced case came back');
  }, BY_TOUCH));

test('a full storage is said, and nothing is lost', () =>
  visit('one file', async (page) => {
    await answered(page);
    await page.evaluate(() => {
      let size = 1_000_000;
      for (let index = 0; size >= 1; index += 1) {
        try {
          window.localStorage.setItem(`filler ${index}`, 'x'.repeat(size));
        } catch {
          size = Math.floor(size / 2);
        }
      }
    });
    await page.click('#cases-button');
    await page.fill('#keep-name', 'One more');
    await page.click('#keep-case');
    assert.match(await said(page), /no room left.*file/);
    assert.deepEqual(await names(page), []);
    await page.fill('#note', 'A longer note than before. '.repeat(40));
    assert.match((await page.textContent('#notice')) ?? '', /keeps nothing.*Save the case to a file/);
  }, AT_DESK));

test('a blocked storage is said, and the page works all the same', () =>
  visit('one file', async (page) => {
    await page.addInitScript(() => {
      for (const name of ['localStorage', 'sessionStorage']) {
        Object.defineProperty(window, name, { get() { throw new DOMException('denied', 'SecurityError'); } });
      }
    });
    await page.reload();
    await answered(page);
    assert.match((await page.textContent('#notice')) ?? '', /keeps nothing/);
    await page.click('#cases-button');
    assert.match(await said(page), /blocked.*file/);
    assert.equal(await page.isDisabled('#keep-case'), true);
    assert.equal(await page.isEnabled('#case-save'), true);
  }, AT_DESK));

test('what stands in the storage is checked like a file', () =>
  visit('one file', async (page) => {
    await answered(page);
    await page.evaluate(() => {
      window.localStorage.setItem('shiftgauge.kept.broken', '{');
      window.localStorage.setItem('shiftgauge.kept.odd', JSON.stringify({ text: 'no case', saved: 'long ago' }));
    });
    await page.reload();
    await answered(page);
    await page.click('#cases-button');
    assert.deepEqual(await names(page), ['odd ']);
    await page.click('.kept-open');
    assert.match((await page.textContent('#notice')) ?? '', /not a case.*Nothing was changed/);
  }, AT_DESK));
