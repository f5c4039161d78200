import assert from 'node:assert/strict';
import { test } from 'node:test';
import { visit } from './browser.js';
import { answered } from './reading.js';

/** @import { Page } from 'playwright-core' */

/**
 * A case as a file would hold it; what it leaves out is that of an empty case.
 * @param {Record<string, unknown>} parts
 */
const question = (parts) => ({
  format: 'shiftgauge 1', temperature: '900 °C', pressure: '1 bar', hold: 'pressure',
  reactions: [{ equation: 'CaCO3 = CaO + CO2', constant: { from: 'library' } }],
  ...parts,
});

/** @param {...[string, string]} rows */
const entries = (...rows) => rows.map(([species, value]) => ({ species, value }));

/** @param {...[string, string]} rows */
const wet = (...rows) => ({ basis: 'wet', water: null, entries: entries(...rows) });

/**
 * @param {Page} page
 * @param {object} parts
 */
async function openCase(page, parts) {
  await answered(page);
  await page.setInputFiles('#case-open', { name: 'case.json', mimeType: 'application/json', buffer: Buffer.from(JSON.stringify(parts)) });
  await page.waitForSelector('#notice:has-text("Opened case.json")');
}

/**
 * @param {Page} page
 * @param {string} selector
 */
const text = async (page, selector) => (await page.textContent(selector)) ?? '';

test('a reaction without a limit is given no state at rest', () =>
  visit('served', async (page) => {
    const solids = { entries: entries(['CaCO3', 'present'], ['CaO', 'present']) };
    await openCase(page, question({ pressure: '0.5 bar', reading: { gas: wet(['CO2', '1 mol']), solids } }));
    assert.match(await text(page, '#sentence-more'), /ample phases/);
    const cells = await page.locator('#ledger-body td:not(:nth-child(2))').allTextContents();
    assert.deepEqual([...new Set(cells)], ['–'], 'no figures at rest');
    assert.equal(await page.locator('#valley-drawing .rest-mark').count(), 0);
    assert.doesNotMatch(await text(page, '#valley-text'), /Now stands at rest/);
  }));

test('a reaction that has nothing to use up is said to be spent, and of what', () =>
  visit('served', async (page) => {
    const solids = { entries: entries(['CaCO3', 'absent'], ['CaO', 'absent']) };
    await openCase(page, question({ reading: { gas: wet(['CO2', '20 %'], ['N2', 'remainder']), solids } }));
    assert.match(await text(page, '#sentence'), /at rest: it would move forward, but there is no CaCO₃\(s\) to use up\.$/);
  }));

test('a reading with species missing on both sides is told once, with formulas as they are read', () =>
  visit('served', async (page) => {
    const reactions = [{ equation: '2 SO2 + O2 = 2 SO3', constant: { from: 'library' } }];
    await openCase(page, question({ temperature: '450 °C', reactions, reading: { gas: wet(['SO2', '8 %'], ['N2', '92 %']) } }));
    assert.match(await text(page, '#sentence'), /This reading cannot tell which way the mixture moves\.$/);
    assert.match(await text(page, '#sentence-more'), /^There is no O₂ and no SO₃, so Q has no value\./);
  }));

test('what the page has no field for is listed, and can be taken out of the case', () =>
  visit('served', async (page) => {
    const reactions = [...question({}).reactions, { equation: 'N2 + 3 H2 = 2 NH3', constant: { from: 'library' } }];
    await openCase(page, question({ reactions, heat: 'adiabatic', models: { gas: 'SRK' }, nonsense: 4, reading: { gas: wet(['CO2', '1 mol']) } }));
    const out = page.getByRole('button', { name: /^Take .* out of the case$/ });
    const listed = await out.count();
    assert.equal(listed, 4);
    for (let left = listed; left > 0; left -= 1) {
      assert.equal(await out.count(), left);
      await out.first().click();
    }
    assert.equal(await page.isHidden('#out-of-date'), true);
    assert.equal(await page.inputValue('#equation'), 'CaCO3 = CaO + CO2');
  }));

test('solids are offered as solids before anything else is known', () =>
  visit('served', async (page) => {
    await answered(page);
    await page.click('#cases-button');
    await page.click('[data-example="empty"]');
    for (const [equation, solids, gases] of /** @type {[string, string[], string[]][]} */ ([
      ['CaCO3 = CaO + CO2', ['CaCO₃', 'CaO'], ['CO₂']],
      ['CaO + H2O = Ca(OH)2', ['CaO', 'Ca(OH)₂'], []],
    ])) {
      await page.fill('#equation', equation);
      assert.deepEqual(await page.locator('#pure-rows .name').allTextContents(), solids, equation);
      assert.deepEqual(await page.locator('#gas-rows .name').allTextContents(), gases, equation);
    }
  }));

test('the numbers of the answer lead to working that the answer does not cover', () =>
  visit('served', async (page) => {
    await answered(page);
    for (const name of ['k', 'q', 'gibbs', 't_star']) {
      await page.focus(`[data-figure="${name}"] a`);
      await page.keyboard.press('Enter');
      await page.waitForFunction((id) => document.activeElement?.id === id, `working-${name}`);
      const [top, covered] = await page.evaluate(() => [document.activeElement, document.querySelector('#answer')]
        .map((element, index) => element?.getBoundingClientRect()[index === 0 ? 'top' : 'bottom'] ?? Number.NaN));
      assert.ok(Number(top) >= Number(covered), `${name}: ${top} is below ${covered}`);
    }
  }, { context: { viewport: { width: 1280, height: 800 } } }));
