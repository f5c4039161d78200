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
        await page.click('#keep-case');
        await page.getByRole('button', { name: /^Rename/ }).click();
        await page.fill('#temperature', 'warm');
        assert.deepEqual(await faults(), [], 'with the cases open, one of them renamed, and a problem');
        // The rarer states once in each of the two colours and widths.
        if ((colorScheme === 'light') !== (viewport.width === 1280)) return;
        await page.click('#cases-button');
        for (const source of ['value', 'points', 'formula', 'reading']) {
          await page.selectOption('#constant-from', source);
          assert.deepEqual(await faults(), [], `with K from: ${source}`);
        }
        for (const fold of await page.locator('#inputs details.fold > summary').all()) await fold.click();
        for (const name of ['solution', 'pure', 'gas']) await page.click(`#${name}-add`);
        await page.click('#gas-paste');
        await page.fill('#paste-text', 'CO 1 %');
        assert.deepEqual(await faults(), [], 'with everything unfolded');
        await page.fill('#equation', 'CaO + H2O');
        await page.keyboard.press('ArrowDown');
        assert.equal(await page.locator('[role="option"][aria-selected="true"]').count(), 1);
        assert.deepEqual(await faults(), [], 'with species offered');
      } finally {
        await close();
      }
    });
  }
}
