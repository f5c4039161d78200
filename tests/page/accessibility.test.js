import assert from 'node:assert/strict';
import { createRequire } from 'node:module';
import { test } from 'node:test';
import { openPage } from './browser.js';
import { answered } from './reading.js';

const { AxeBuilder } = createRequire(new URL('../../www/package.json', import.meta.url))('@axe-core/playwright');

for (const colorScheme of /** @type {const} */ (['light', 'dark'])) {
  for (const viewport of [{ width: 1280, height: 800 }, { width: 390, height: 844 }]) {
    test(`no accessibility fault, right or wrong (${colorScheme}, ${viewport.width} wide)`, async () => {
      const { page, close } = await openPage({ from: 'served', viewport });
      try {
        await page.emulateMedia({ colorScheme });
        await answered(page);
        const faults = async () => (await new AxeBuilder({ page }).analyze()).violations
          .map((/** @type {{ id: string, nodes: { html: string }[] }} */ { id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join(' ')}`);
        assert.deepEqual(await faults(), []);
        await page.click('#cases-button');
        await page.fill('#temperature', 'warm');
        assert.deepEqual(await faults(), [], 'with the cases open and a problem');
      } finally {
        await close();
      }
    });
  }
}
