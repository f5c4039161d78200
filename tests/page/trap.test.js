import assert from 'node:assert/strict';
import { test } from 'node:test';
import { openPage } from './browser.js';
import { answered, direction } from './reading.js';

/** Makes `check` trap while the title says so, as a fault of the engine would. */
function trapOnTitle() {
  const Real = WebAssembly.Instance;
  /** @param {[WebAssembly.Module, WebAssembly.Imports?]} args */
  function Trapping(...args) {
    const exports = { ...new Real(...args).exports };
    const check = exports.check;
    exports.check = (/** @type {unknown[]} */ ...given) => {
      const title = document.querySelector('#title');
      if (title instanceof HTMLInputElement && title.value === 'stop here') throw new WebAssembly.RuntimeError('unreachable');
      return typeof check === 'function' ? check(...given) : undefined;
    };
    document.documentElement.dataset.instances = String(Number(document.documentElement.dataset.instances ?? 0) + 1);
    return { exports };
  }
  Reflect.set(WebAssembly, 'Instance', Trapping);
}

test('after a trap the case is still there, the user is told, and the engine runs again', async () => {
  const { page, close } = await openPage({ from: 'served', viewport: { width: 1280, height: 800 }, expected: /unreachable/ });
  try {
    await page.addInitScript(trapOnTitle);
    await page.reload();
    await answered(page);
    await page.fill('#temperature', '209 °C');
    await page.fill('#title', 'stop here');
    assert.match((await page.textContent('#notice')) ?? '', /engine stopped/);
    assert.equal(await page.isVisible('#out-of-date'), true);
    assert.equal(await page.inputValue('#temperature'), '209 °C');
    assert.equal(await page.getAttribute('html', 'data-instances'), '2', 'a second instance took its place');

    await page.reload();
    await page.waitForSelector('#notice.alarm:visible');
    assert.equal(await page.inputValue('#temperature'), '209 °C', 'the case that did it is not tried again, nor lost');

    await page.fill('#title', 'go on');
    await page.fill('#temperature', '268 °C');
    assert.equal(await direction(page), 'reverse');
    assert.equal(await page.isHidden('#out-of-date'), true);
  } finally {
    await close();
  }
});

/** Makes `species` trap, always. */
function trapOnSpecies() {
  const Real = WebAssembly.Instance;
  /** @param {[WebAssembly.Module, WebAssembly.Imports?]} args */
  function Trapping(...args) {
    const exports = { ...new Real(...args).exports };
    exports.species = () => { throw new WebAssembly.RuntimeError('unreachable'); };
    return { exports };
  }
  Reflect.set(WebAssembly, 'Instance', Trapping);
}

test('a trap while species are looked up costs the suggestions and nothing else', async () => {
  const { page, close } = await openPage({ from: 'served', viewport: { width: 1280, height: 800 }, expected: /unreachable/ });
  try {
    await page.addInitScript(trapOnSpecies);
    await page.reload();
    await answered(page);
    await page.click('#gas-add');
    await page.keyboard.type('argon');
    assert.equal(await page.locator('[role="option"]:visible').count(), 0);
    await page.fill('#temperature', '268 °C');
    await page.getByRole('button', { name: 'Remove argon' }).click();
    assert.equal(await direction(page), 'reverse');
    assert.equal(await page.isHidden('#out-of-date'), true);
  } finally {
    await close();
  }
});

/** Makes everything that is asked beside the answer trap, always. */
function trapOnQuestions() {
  const Real = WebAssembly.Instance;
  /** @param {[WebAssembly.Module, WebAssembly.Imports?]} args */
  function Trapping(...args) {
    const exports = { ...new Real(...args).exports };
    for (const name of ['sweep', 'target', 'convert']) {
      if (typeof exports[name] !== 'function') throw new Error(`the engine has no ${name}`);
      exports[name] = () => { throw new WebAssembly.RuntimeError('unreachable'); };
    }
    return { exports };
  }
  Reflect.set(WebAssembly, 'Instance', Trapping);
}

test('a trap in a chart, a target or a conversion is said in its place and costs the answer nothing', async () => {
  const { page, close } = await openPage({ from: 'served', viewport: { width: 1280, height: 800 }, expected: /unreachable/ });
  try {
    await page.addInitScript(trapOnQuestions);
    await page.reload();
    await answered(page);
    await page.waitForSelector('#chart-k figcaption:has-text("engine stopped")');
    await page.click('#target-ask');
    assert.match((await page.textContent('#target-problem')) ?? '', /engine stopped/);
    await page.click('#convert > summary');
    await page.fill('#convert-value', '7');
    assert.match((await page.textContent('#convert-problem')) ?? '', /engine stopped/);
    await page.fill('#temperature', '268 °C');
    assert.equal(await direction(page), 'reverse');
    assert.equal(await page.isHidden('#out-of-date'), true);
  } finally {
    await close();
  }
});

test('without WebAssembly the page says what it needs', async () => {
  const { page, close } = await openPage({ from: 'served', viewport: { width: 1280, height: 800 }, expected: /WebAssembly is off/ });
  try {
    await page.addInitScript(() => Reflect.deleteProperty(globalThis, 'WebAssembly'));
    await page.reload();
    await page.waitForSelector('#no-engine:visible');
    assert.match((await page.textContent('#no-engine')) ?? '', /WebAssembly/);
  } finally {
    await close();
  }
});
