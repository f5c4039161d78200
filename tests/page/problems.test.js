import assert from 'node:assert/strict';
import { test } from 'node:test';
import { openPage } from './browser.js';
import { answered, direction, figure, gasField } from './reading.js';

const viewport = { width: 1280, height: 800 };

test('a wrong input shows its problem at its field, keeps what was typed, and marks the old answer', async () => {
  const { page, close } = await openPage({ from: 'served', viewport });
  try {
    await answered(page);
    const [word, k] = [await direction(page), await figure(page, 'k')];
    await page.fill('#temperature', '208 parsec');
    assert.equal(await page.inputValue('#temperature'), '208 parsec');
    assert.equal(await page.getAttribute('#temperature', 'aria-invalid'), 'true');
    const ids = (await page.getAttribute('#temperature', 'aria-describedby'))?.split(' ') ?? [];
    const described = await Promise.all(ids.map((id) => page.textContent(`[id="${id}"]`)));
    assert.match(described.join(' '), /parsec/, 'the field is described by its problem');
    assert.equal(await page.isVisible('#out-of-date'), true);
    assert.match((await page.textContent('#out-of-date')) ?? '', /Out of date/);
    assert.deepEqual([await direction(page), await figure(page, 'k')], [word, k], 'the old answer is kept');
    assert.match((await page.getAttribute('#results', 'class')) ?? '', /is-old/);

    await page.fill('#temperature', '208 °C');
    assert.equal(await page.getAttribute('#temperature', 'aria-invalid'), null);
    assert.equal(await page.isHidden('#out-of-date'), true);
    assert.equal(await page.locator('.problem').count(), 0);
  } finally {
    await close();
  }
});

test('all problems are listed at the answer, and each leads to the place in its text', async () => {
  const { page, close } = await openPage({ from: 'served', viewport });
  try {
    await answered(page);
    await page.fill('#pressure', '23.6 furlong');
    await gasField(page, 'CO').fill('0.26 furlong');
    const items = page.locator('#problem-list li');
    assert.ok((await items.count()) >= 2);
    await items.filter({ hasText: 'Pressure' }).getByRole('button').click();
    const marked = await page.evaluate(() => {
      const field = document.activeElement;
      return field instanceof HTMLInputElement ? [field.id, field.value.slice(field.selectionStart ?? 0, field.selectionEnd ?? 0)] : [];
    });
    assert.equal(marked[0], 'pressure');
    assert.match(marked[1] ?? '', /furlong/);
  } finally {
    await close();
  }
});

test('a problem of the whole gas stands at the gas', async () => {
  const { page, close } = await openPage({ from: 'served', viewport });
  try {
    await answered(page);
    await gasField(page, 'H₂').fill('10 %');
    assert.equal(await page.isVisible('#out-of-date'), true, 'fractions that do not add to 1 are a problem');
    assert.ok((await page.locator('section[aria-labelledby="gas-heading"] .problem').count()) >= 1);
  } finally {
    await close();
  }
});
