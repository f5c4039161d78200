import assert from 'node:assert/strict';
import { test } from 'node:test';
import { visit, WAYS } from './browser.js';

for (const way of WAYS) {
  test(`the page opens without a fault, ${way}`, () =>
    visit(way, async (page) => {
      assert.match(await page.title(), /Shiftgauge/);
      assert.equal(await page.locator('h1').first().isVisible(), true);
      assert.equal(await page.locator('#no-engine:visible').count(), 0);
    }));

  test(`a script that is put into the page does not run, ${way}`, () =>
    visit(
      way,
      async (page) => {
        const ran = await page.evaluate(() => {
          const script = document.createElement('script');
          script.textContent = 'document.title = "run"';
          document.head.append(script);
          return document.title === 'run';
        });
        assert.equal(ran, false);
      },
      { expected: /Content Security Policy/ },
    ));
}

test('the served page fetches the engine from beside itself', () =>
  visit('served', async (page, { requests, address }) => {
    assert.ok(requests.includes(`${address}shiftgauge_bg.wasm`), requests.join('\n'));
  }));

test('the page in one file asks for nothing but itself', () =>
  visit('one file', async (page, { requests, address }) => {
    assert.deepEqual(requests.filter((url) => !url.startsWith('data:')), [address]);
    assert.match((await page.textContent('#offline')) ?? '', /in this file: works without a network/);
  }));
