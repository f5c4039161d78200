// The library, the sheet of a species, and a book of one's own, as a user works them.

import assert from 'node:assert/strict';
import { test } from 'node:test';
import { WAYS, visit } from './browser.js';

/** @import { Page } from 'playwright-core' */

/** @param {Page} page */
async function openLibrary(page) {
  await page.click('#library-fold > summary');
}

/**
 * @param {Page} page
 * @param {string} text
 */
async function find(page, text) {
  await page.fill('#library-find', text);
  return page.locator('.found-species').allTextContents();
}

/**
 * Fills the form of a species with an invented sulfur trioxide.
 * @param {Page} page
 * @param {Record<string, string>} [other]
 */
async function fillOwn(page, other = {}) {
  const figures = { species: 'SO3(g)', names: 'our trioxide', enthalpy: '-395 ± 0.6 kJ/mol', entropy: '256.8 J/(mol K)', source: 'Invented works, test bench', ...other };
  for (const [name, value] of Object.entries(figures)) await page.fill(`#own-${name}`, value);
  await page.fill('#own-heat [data-part="from"]', '298.15 K');
  await page.fill('#own-heat [data-part="to"]', '1000 K');
  await page.fill('#own-heat [data-term="1"]', '58');
}

for (const way of WAYS) test(`a species is found by formula in any order, name, number and slip (${way})`, () => visit(way, async (page) => {
  await openLibrary(page);
  for (const [text, first] of [['O2S', 'SO₂'], ['quicklime', 'CaO'], ['7664-41-7', 'NH₃'], ['amonia', 'NH₃']]) {
    const found = await find(page, text ?? '');
    assert.ok(found[0]?.startsWith(first ?? ''), `${text}: ${found[0]}`);
  }
  await find(page, 'amonia');
  assert.match(await page.textContent('#library-count') ?? '', /Nearest/);
  await find(page, 'qqqqqqqq');
  assert.match(await page.textContent('#library-count') ?? '', /nothing like this/);
  assert.equal(await page.locator('.found-species').count(), 0);
}));

for (const way of WAYS) test(`a sheet shows figures, range, uncertainty and source, and draws each property (${way})`, () => visit(way, async (page) => {
  await openLibrary(page);
  await find(page, 'quartz');
  await page.locator('.found-species').first().click();
  const sheet = page.locator('#sheet');
  assert.match(await sheet.textContent() ?? '', /SiO₂/);
  // JANAF has -910.857 kJ/mol for quartz.
  assert.match(await page.textContent('#sheet-figures') ?? '', /−910\.86/);
  assert.match(await page.textContent('#sheet-figures') ?? '', /Transition at 847/);
  assert.match(await page.textContent('#sheet-uncertainty') ?? '', /u\(ΔfG°\).*kJ\/mol/);
  assert.match(await page.textContent('#sheet-sources') ?? '', /JANAF/);
  for (const property of ['gibbs', 'enthalpy', 'entropy', 'heat']) {
    await page.selectOption('#sheet-property', property);
    const drawn = page.locator('#sheet-figure path.line');
    assert.ok(await drawn.count() >= 1, property);
    assert.ok(await page.locator('#sheet-figure .outside').count() >= 1, 'what lies outside the data is shaded');
  }
}));

for (const way of WAYS) test(`figures of my own are refused with reasons, kept, used in the case and taken out again (${way})`, () => visit(way, async (page) => {
  await page.fill('#equation', 'SO2 + 1/2 O2 = SO3');
  await openLibrary(page);
  await page.click('#book-new');
  await fillOwn(page, { entropy: '-3 J/(mol K)', source: '' });
  await page.click('#own-keep');
  const problems = await page.textContent('#own-problems') ?? '';
  assert.match(problems, /says where its figures come from/);
  assert.equal(await page.getAttribute('#own-source', 'aria-invalid'), 'true');
  await page.fill('#own-source', 'Invented works, test bench');
  await page.click('#own-keep');
  assert.match(await page.textContent('#own-problems') ?? '', /third law/);
  await page.fill('#own-entropy', '256.8 J/(mol K)');
  await page.click('#own-keep');
  assert.equal(await page.isHidden('#own'), true);
  await page.waitForFunction(() => /your own record/.test(document.getElementById('note-list')?.textContent ?? ''));
  assert.match(await page.textContent('#note-list') ?? '', /Invented works, test bench/);
  await page.uncheck('#book-list input[type="checkbox"]');
  await page.waitForFunction(() => !/your own record/.test(document.getElementById('note-list')?.textContent ?? ''));
  // The book stays on the device.
  await page.reload();
  await openLibrary(page);
  assert.match(await page.textContent('#book-list') ?? '', /SO₃/);
}));

for (const way of WAYS) test(`a K of my own is kept in the book and used again (${way})`, () => visit(way, async (page) => {
  await page.fill('#equation', 'SO2(g) + 1/2 O2(g) = SO3(g)');
  await openLibrary(page);
  await page.click('#book-k');
  assert.match(await page.textContent('#book-said') ?? '', /K comes from the library here/);
  await page.selectOption('#constant-from', 'value');
  await page.selectOption('#constant-kind', 'log10 K');
  await page.fill('#constant-value', '2.5');
  await page.fill('#book-k-source', 'Invented works');
  await page.click('#book-k');
  assert.match(await page.textContent('#book-said') ?? '', /is in the book/);
  await page.selectOption('#constant-from', 'book');
  await page.waitForFunction(() => /your book keeps/.test(document.getElementById('note-list')?.textContent ?? ''));
}));

for (const way of WAYS) test(`a book is saved to a file and opened again (${way})`, () => visit(way, async (page) => {
  await openLibrary(page);
  await page.click('#book-new');
  await fillOwn(page);
  await page.click('#own-keep');
  const [download] = await Promise.all([page.waitForEvent('download'), page.click('#book-save')]);
  const stream = await download.createReadStream();
  const parts = [];
  for await (const chunk of stream) parts.push(chunk);
  const text = Buffer.concat(parts).toString('utf8');
  assert.match(text, /"format": "shiftgauge book 1"/);
  await page.locator('#book-list button', { hasText: '✕' }).click();
  assert.match(await page.textContent('#book-said') ?? '', /out of the book/);
  await page.setInputFiles('#book-open', { name: 'book.json', mimeType: 'application/json', buffer: Buffer.from(text) });
  await page.waitForFunction(() => /1 species and 0 constants/.test(document.getElementById('book-said')?.textContent ?? ''));
  await page.setInputFiles('#book-open', { name: 'x.json', mimeType: 'application/json', buffer: Buffer.from('{}') });
  await page.waitForFunction(() => /not a book/.test(document.getElementById('book-said')?.textContent ?? ''));
}));

for (const way of WAYS) test(`ones own figures start from the library, and the sheet compares them (${way})`, () => visit(way, async (page) => {
  await openLibrary(page);
  await find(page, 'SO3(g)');
  await page.locator('.found-species').first().click();
  await page.click('#sheet-own');
  assert.equal(await page.inputValue('#own-species'), 'SO3(g)');
  await page.fill('#own-enthalpy', '-396.753 kJ/mol');
  await page.fill('#own-source', 'Invented works');
  await page.click('#own-keep');
  await find(page, 'SO3(g) ');
  await page.locator('.found-species').first().click();
  assert.match(await page.textContent('#sheet-instead') ?? '', /differs from yours by \+1\.00 kJ\/mol in ΔfH°, by 0 J/);
}));

