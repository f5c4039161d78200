import assert from 'node:assert/strict';
import { test } from 'node:test';
import { visit } from './browser.js';

test('once opened, the served page works when the server is gone', () =>
  visit('served', async (page, { stopServer }) => {
    await page.evaluate(() => navigator.serviceWorker.ready);
    await page.waitForFunction(() => navigator.serviceWorker.controller);
    await stopServer();
    await page.reload({ waitUntil: 'networkidle' });
    assert.match(await page.title(), /Shiftgauge/);
    assert.equal(await page.locator('#no-engine:visible').count(), 0);
  }));

test('the caches of other programs at the same place are left alone', () =>
  visit('served', async (page) => {
    await page.evaluate(() => caches.open('of another program'));
    await page.evaluate(() => navigator.serviceWorker.ready);
    const names = await page.evaluate(() => caches.keys());
    assert.ok(names.includes('of another program'), names.join(', '));
    assert.equal(names.filter((name) => name.startsWith('shiftgauge ')).length, 1);
  }));
