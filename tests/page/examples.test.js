import assert from 'node:assert/strict';
import { test } from 'node:test';
import { openPage } from './browser.js';
import { answered, direction, figure, ledger, number, openExample } from './reading.js';

const viewport = { width: 1280, height: 800 };

test('the shift example leads, is marked as invented, and does not mind the pressure', async () => {
  const { page, close } = await openPage({ from: 'served', viewport });
  try {
    await answered(page);
    assert.match(await page.inputValue('#title'), /invented/);
    assert.match(await page.inputValue('#note'), /[Ii]nvented/);
    assert.equal(await direction(page), 'forward');
    assert.equal(await page.locator('.problem').count(), 0);
    const q = await figure(page, 'q');
    await page.fill('#pressure', '40 bar(g)');
    assert.equal(await figure(page, 'q'), q, 'as many gas molecules on each side');
    assert.ok((await page.locator('#working-lines li').count()) > 0, 'the working is there');
    assert.notEqual((await page.textContent('#source-text'))?.trim(), '', 'K has a source');
  } finally {
    await close();
  }
});

/** [example, what is shown of its title, species that forms on the way to rest] */
const FURTHER = [
  ['ammonia-converter', 'ammonia converter', 'NH3'],
  ['lime-kiln', 'kiln', 'CO2'],
];
for (const [example = '', title = '', forms = ''] of FURTHER) {
  test(`the example opens, is marked as invented and is judged: ${example}`, async () => {
    const { page, close } = await openPage({ from: 'disk', viewport });
    try {
      await answered(page);
      await openExample(page, example);
      const shown = await page.inputValue('#title');
      assert.ok(shown.includes(title) && shown.includes('invented'), shown);
      assert.match(await page.inputValue('#note'), /[Ii]nvented/);
      assert.equal(await direction(page), 'forward');
      assert.equal(await page.locator('.problem').count(), 0);
      const [now, rest] = await ledger(page, forms);
      assert.ok(rest > now, `${forms}: ${now} % to ${rest} %`);
    } finally {
      await close();
    }
  });
}

test('the sump of the scrubber opens with its solution unfolded', async () => {
  const { page, close } = await openPage({ from: 'disk', viewport });
  try {
    await answered(page);
    await page.click('#cases-button');
    await page.click('[data-example="scrubber-sump"]');
    assert.match(await page.inputValue('#title'), /scrubber.*invented/);
    assert.equal(await page.getByRole('textbox', { name: 'Ca²⁺, value' }).inputValue(), '760 ± 20 mg/L');
    assert.equal(await page.isVisible('#solution-size'), true);
  } finally {
    await close();
  }
});

test('the chlorine example is marked as invented, and more pressure drives it further', async () => {
  const { page, close } = await openPage({ from: 'served', viewport });
  try {
    await answered(page);
    await openExample(page, 'chlorine-recovery');
    assert.match(await page.inputValue('#title'), /invented/);
    assert.match(await page.inputValue('#note'), /[Ii]nvented/);
    assert.equal(await direction(page), 'forward');
    const [, restBefore] = await ledger(page, 'HCl');
    const before = number(await figure(page, 'q'));
    await page.fill('#pressure', '9 bar(g)');
    const [, restAfter] = await ledger(page, 'HCl');
    assert.ok(restAfter < restBefore, `HCl at rest falls: ${restBefore} % to ${restAfter} %`);
    const ratio = number(await figure(page, 'q')) / before;
    const expected = (2.4 + 1.01325) / (9 + 1.01325);
    assert.ok(Math.abs(ratio / expected - 1) < 0.02, `Q goes with 1/P: ${ratio} against ${expected}`);
  } finally {
    await close();
  }
});

test('the valley has its walls, its floor and words that say the same', async () => {
  const { page, close } = await openPage({ from: 'served', viewport });
  try {
    await answered(page);
    const choice = page.locator('input[name="valley-part"][value="whole"]');
    if (await page.isVisible('#valley-choice')) await choice.check({ force: true });
    const labels = await page.locator('.wall-label').allTextContents();
    assert.deepEqual(labels.sort(), ['no CO left', 'no CO₂ left']);
    assert.equal(await page.locator('#valley-drawing .rest-mark').count(), 1);
    assert.equal(await page.locator('#valley-drawing .now-mark').count(), 1);
    assert.match((await page.textContent('#valley-text')) ?? '', /forward/);
    assert.match((await page.textContent('.valley-svg desc')) ?? '', /CO would run out/);
  } finally {
    await close();
  }
});

test('opening the case that already stands there answers it again', async () => {
  const { page, close } = await openPage({ from: 'served', viewport });
  try {
    await answered(page);
    await openExample(page, 'low-temperature-shift');
    assert.equal(await direction(page), 'forward');
    assert.equal(await page.isHidden('#out-of-date'), true);
  } finally {
    await close();
  }
});

test('a solid of the reaction is offered a row, and nothing widens the page however small the change', async () => {
  const { page, close } = await openPage({ from: 'served', viewport });
  try {
    await answered(page);
    await openExample(page, 'chlorine-recovery');
    await page.fill('#equation', 'CaCO3 = CaO + CO2');
    assert.equal(await direction(page), 'forward', 'there is no CO2 yet');
    assert.deepEqual(await page.locator('#pure-rows .name').allTextContents(), ['CaCO₃', 'CaO']);
    assert.equal(await page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth), 0);
    assert.equal(await page.locator('.ledger').evaluate((ledger) => ledger.scrollWidth - ledger.clientWidth), 0, 'no column is cut off');
    assert.match((await page.textContent('#valley-text')) ?? '', /[Ww]ithout CO₂ it cannot move in reverse/);
    await page.locator('#pure-rows').getByRole('textbox', { name: 'CaCO₃, value', exact: true }).fill('absent');
    assert.equal(await page.locator('#pure-rows .entry').count(), 2, 'a row that is filled in is not offered again');
  } finally {
    await close();
  }
});

test('with the volume held the valley is of the Helmholtz energy, and the pressure at rest is said', async () => {
  const { page, close } = await openPage({ from: 'served', viewport });
  try {
    await answered(page);
    await openExample(page, 'chlorine-recovery');
    await page.selectOption('#hold', 'volume');
    assert.match((await page.textContent('#valley-heading')) ?? '', /Helmholtz/);
    assert.match((await page.textContent('#sentence-more')) ?? '', /pressure goes from 3\.41/);
  } finally {
    await close();
  }
});

test('a problem elsewhere does not turn the solids of the reaction into gases', async () => {
  const { page, close } = await openPage({ from: 'served', viewport });
  try {
    await answered(page);
    await page.fill('#equation', 'CaCO3 = CaO + CO2');
    await page.fill('#temperature', 'warm');
    assert.equal(await page.isVisible('#out-of-date'), true);
    assert.equal(await page.locator('#gas-rows .name', { hasText: 'Ca' }).count(), 0);
    assert.equal(await page.locator('#pure-rows .entry').count(), 2);
  } finally {
    await close();
  }
});
