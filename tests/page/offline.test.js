import assert from 'node:assert/strict';
import { cp, mkdtemp, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { test } from 'node:test';
import { fileURLToPath } from 'node:url';
import { DIST, visit } from './browser.js';
import { answered, caseOf } from './reading.js';

test('once opened, the served page works when the server is gone', () =>
  visit('served', async (page, { stopServer }) => {
    await page.evaluate(() => navigator.serviceWorker.ready);
    await page.waitForFunction(() => navigator.serviceWorker.controller);
    await page.waitForSelector('#offline:has-text("works without a network")');
    await stopServer();
    await page.reload({ waitUntil: 'networkidle' });
    await page.waitForSelector('#offline:has-text("works without a network")');
    await page.fill('#temperature', '211 °C');
    assert.equal(await page.isHidden('#out-of-date'), true, 'it answers');
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

test('a newer version is said, waits until it is wanted, and keeps the case in hand', async () => {
  const folder = await mkdtemp(join(tmpdir(), 'shiftgauge-update-'));
  await cp(fileURLToPath(DIST), folder, { recursive: true });
  try {
    await visit('served', async (page) => {
      await answered(page);
      await page.waitForFunction(() => navigator.serviceWorker.controller);
      await page.fill('#temperature', '211 °C');
      const worker = await readFile(join(folder, 'service-worker.js'), 'utf8');
      await writeFile(join(folder, 'service-worker.js'), worker.replace(/(OFFLINE_VERSION|CACHE) = (.*);/, '$1 = $2 + "2";'));
      await page.reload();
      await page.waitForSelector('#update-line:visible');
      assert.match((await page.textContent('#update-line')) ?? '', /newer version.*stays/);
      const before = await caseOf(page);
      await Promise.all([page.waitForEvent('load'), page.click('#update')]);
      await answered(page);
      assert.deepEqual(await caseOf(page), before);
      assert.equal(before.temperature, '211 °C');
      await page.waitForFunction(async () => (await caches.keys()).filter((name) => name.startsWith('shiftgauge ')).length === 1);
      assert.equal(await page.isHidden('#update-line'), true);
    }, { folder });
  } finally {
    await rm(folder, { recursive: true });
  }
});
