import assert from 'node:assert/strict';
import { readFile } from 'node:fs/promises';
import { test } from 'node:test';
import { openPage } from './browser.js';
import { answered, direction, gasField, openExample } from './reading.js';

const viewport = { width: 1280, height: 800 };

for (const from of /** @type {const} */ (['served', 'disk'])) {
  test(`a case saved to a file opens again as it was (${from})`, async () => {
    const { page, close } = await openPage({ from, viewport });
    try {
      await answered(page);
      await page.fill('#title', 'Bed 7: Monday <b>night</b>');
      await page.fill('#temperature', '268 ± 2 °C');
      await gasField(page, 'CO').fill('0,31 %');
      await page.click('#cases-button');
      const downloading = page.waitForEvent('download');
      await page.click('#case-save');
      const download = await downloading;
      assert.match(download.suggestedFilename(), /^bed-7-monday.*\.json$/);
      const text = await readFile(await download.path(), 'utf8');
      const saved = JSON.parse(text);
      assert.equal(saved.format, 'shiftgauge 1');
      assert.equal(saved.temperature, '268 ± 2 °C');

      await openExample(page, 'chlorine-recovery');
      assert.notEqual(await page.inputValue('#temperature'), saved.temperature);
      await page.setInputFiles('#case-open', { name: 'again.json', mimeType: 'application/json', buffer: Buffer.from(text) });
      await page.waitForFunction(() => document.querySelector('#title') instanceof HTMLInputElement && document.title.startsWith('Bed 7'));
      assert.equal(await page.inputValue('#temperature'), '268 ± 2 °C');
      assert.equal(await gasField(page, 'CO').inputValue(), '0,31 %');
      assert.equal(await direction(page), 'reverse');
    } finally {
      await close();
    }
  });

  test(`a link holds the whole case (${from})`, async () => {
    const { page, close } = await openPage({ from, viewport });
    try {
      await answered(page);
      await page.fill('#temperature', '268 °C');
      await page.click('#cases-button');
      await page.click('#case-link');
      await page.waitForSelector('#case-link-text:visible');
      const link = await page.inputValue('#case-link-text');
      await page.fill('#temperature', '208 °C');
      const other = await page.context().newPage();
      await other.goto(link);
      await other.waitForFunction(() => document.querySelector('#temperature') instanceof HTMLInputElement && window.location.hash === '');
      assert.equal(await other.inputValue('#temperature'), '268 °C');
      assert.equal(await direction(other), 'reverse');
      await other.click('#cases-button');
      await other.click('#case-before');
      assert.equal(await other.inputValue('#temperature'), '208 °C', 'the case that stood there is not lost');
    } finally {
      await close();
    }
  });
}

test('closing and opening the page loses nothing', async () => {
  const { page, close } = await openPage({ from: 'served', viewport });
  try {
    await answered(page);
    await page.fill('#temperature', 'as read by Ann: 2');
    await page.reload();
    await page.waitForSelector('#out-of-date:visible');
    assert.equal(await page.inputValue('#temperature'), 'as read by Ann: 2', 'also what is not right yet');
    const other = await page.context().newPage();
    await other.goto(page.url());
    await other.waitForSelector('#out-of-date:visible');
    assert.equal(await other.inputValue('#temperature'), 'as read by Ann: 2');
  } finally {
    await close();
  }
});

const NOT_CASES = [
  { name: 'no JSON', text: 'a,b,c\n1,2,3' },
  { name: 'another JSON', text: '{"a": 1}' },
  { name: 'a list', text: '[1, 2]' },
  { name: 'bytes', text: '\u0000\u0001PK\u0003\uffff' },
  { name: 'far too large', text: `{"format": "shiftgauge 1", "note": "${'x'.repeat(1_000_001)}"}` },
  { name: 'nested without end', text: `{"format": "shiftgauge 1", "note": ${'['.repeat(4000)}${']'.repeat(4000)}}` },
  { name: 'a later format', text: '{"format": "shiftgauge 99"}' },
];
for (const { name, text } of NOT_CASES) {
  test(`a file that is no case changes nothing and is said so: ${name}`, async () => {
    const { page, close } = await openPage({ from: 'served', viewport });
    try {
      await answered(page);
      const before = await page.inputValue('#temperature');
      await page.setInputFiles('#case-open', { name: 'x.json', mimeType: 'application/json', buffer: Buffer.from(text) });
      await page.waitForSelector('#notice.alarm:visible');
      assert.match((await page.textContent('#notice')) ?? '', /Nothing was changed/);
      assert.equal(await page.inputValue('#temperature'), before);
    } finally {
      await close();
    }
  });
}

test('a case with the wrong things in its fields is checked like anything typed', async () => {
  const { page, close } = await openPage({ from: 'served', viewport });
  try {
    await answered(page);
    /** @type {string[]} */
    const errors = [];
    page.on('pageerror', (error) => errors.push(error.message));
    const odd = { format: 'shiftgauge 1', title: '<img src=x onerror=alert(1)>', temperature: { a: 1 }, reactions: 'none', reading: { gas: { entries: [7, null, { species: '<b>x</b>', value: 3 }] }, solids: [] } };
    await page.setInputFiles('#case-open', { name: 'odd.json', mimeType: 'application/json', buffer: Buffer.from(JSON.stringify(odd)) });
    await page.waitForSelector('#out-of-date:visible');
    assert.equal(await page.inputValue('#title'), odd.title);
    assert.equal(await page.locator('main img, main b').count(), 0, 'text stays text');
    assert.deepEqual(errors, []);
  } finally {
    await close();
  }
});

test('a damaged link is said so and changes nothing', async () => {
  const { page, close } = await openPage({ from: 'served', viewport });
  try {
    await answered(page);
    await page.evaluate(() => { window.location.hash = '#case=zAAAA'; });
    await page.waitForSelector('#notice.alarm:visible');
    assert.equal(await direction(page), 'forward');
  } finally {
    await close();
  }
});
