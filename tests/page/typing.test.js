import assert from 'node:assert/strict';
import { test } from 'node:test';
import { openPage } from './browser.js';
import { answered, direction, figure, gasField, ledger, number } from './reading.js';

for (const from of /** @type {const} */ (['served', 'disk'])) {
  test(`every keystroke gives the answer to what stands there (${from})`, async () => {
    const { page, close } = await openPage({ from, viewport: { width: 1280, height: 800 } });
    try {
      await answered(page);
      assert.equal(await direction(page), 'forward');
      await page.fill('#temperature', '208 °C');
      const quotients = [await figure(page, 'k')];
      await page.focus('#temperature');
      await page.keyboard.press('Home');
      await page.keyboard.press('ArrowRight');
      for (const key of ['Delete', '6']) {
        await page.keyboard.press(key);
        quotients.push(await figure(page, 'k'));
      }
      assert.equal(await page.inputValue('#temperature'), '268 °C');
      assert.equal(new Set(quotients).size, 3, `K follows 208, 28 and 268 °C: ${quotients.join(', ')}`);
      assert.equal(await direction(page), 'reverse', 'the shift gives off heat, so a hotter bed lies past equilibrium');
    } finally {
      await close();
    }
  });
}

test('the answer agrees with itself', async () => {
  const { page, close } = await openPage({ from: 'served', viewport: { width: 1280, height: 800 } });
  try {
    await answered(page);
    const [q, k] = [number(await figure(page, 'q')), number(await figure(page, 'k'))];
    assert.ok(q < k, 'forward means Q below K');
    const gibbs = 8.314462618e-3 * (208 + 273.15) * Math.log(q / k);
    assert.ok(Math.abs(number(await figure(page, 'gibbs')) - gibbs) < 0.02 + 0.02 * Math.abs(gibbs), 'ΔG = RT ln(Q/K)');
    const [now, rest, change] = await ledger(page, 'CO');
    assert.ok(rest < now && change < 0, 'forward uses up CO');
    assert.ok(Math.abs(rest - now - change) < 0.002, 'the change is the difference of what is shown');
    const tStar = number(await figure(page, 't_star'));
    assert.ok(Math.abs(208 - tStar - number(await figure(page, 'approach'))) <= 1, 'T − T* fits T*');
  } finally {
    await close();
  }
});

test('a remainder moves to the row that claims it, and a species of the reaction is offered a row', async () => {
  const { page, close } = await openPage({ from: 'served', viewport: { width: 1280, height: 800 } });
  try {
    await answered(page);
    const row = page.locator('#gas-rows .entry').filter({ has: page.getByRole('textbox', { name: 'N₂, value', exact: true }) });
    await row.getByRole('button', { name: 'remainder' }).click();
    assert.equal(await gasField(page, 'N₂').inputValue(), 'remainder');
    assert.equal(await gasField(page, 'H₂').inputValue(), '');
    await page.fill('#equation', 'CO + 3 H2 = CH4 + H2O');
    assert.equal(await gasField(page, 'CH₄').count(), 1);
  } finally {
    await close();
  }
});
