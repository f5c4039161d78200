import assert from 'node:assert/strict';
import { test } from 'node:test';
import { createHistory } from '../../www/history.js';
import { visit } from './browser.js';
import { answered, AT_DESK, BY_TOUCH, direction, gasField } from './reading.js';

/** A shelf and a clock to put under a history. */
function under() {
  const shelf = { text: /** @type {string | null} */ (null), time: 0 };
  const make = () => createHistory({ load: () => shelf.text, store: (text) => { shelf.text = text; } }, () => shelf.time);
  return { shelf, make };
}

test('typing without a pause in one field is one step; another field, or a pause, begins a new one', () => {
  const { shelf, make } = under();
  const history = make();
  for (const [text, where, time] of /** @type {[string, string, number][]} */ ([['a', '', 0], ['b', 'x', 10], ['c', 'x', 20], ['d', 'y', 30], ['e', 'y', 5000]])) {
    shelf.time = time;
    history.note(text, where);
  }
  assert.deepEqual([history.back(), history.back(), history.back(), history.back()], ['d', 'c', 'a', null]);
  assert.deepEqual([history.forward(), history.forward()], ['c', 'd']);
  history.note('f', 'y');
  assert.equal(history.canGoForward(), false, 'a new step forgets the way forward');
  assert.equal(history.back(), 'd');
});

test('the steps outlive a reload, and what is no history is left alone', () => {
  const { shelf, make } = under();
  const first = make();
  for (const text of ['a', 'b', 'c']) first.note(text, '');
  first.back();
  const second = make();
  assert.equal(second.forward(), 'c');
  assert.equal(second.back(), 'b');
  for (const text of ['{', '7', '{"texts": [1], "index": 0}', 'null']) {
    shelf.text = text;
    assert.equal(make().canGoBack(), false, text);
  }
});

test('what is kept of the steps stays small', () => {
  const { shelf, make } = under();
  const history = make();
  for (let step = 0; step < 150; step += 1) history.note(`${step} ${'x'.repeat(20_000)}`, '');
  assert.ok((shelf.text?.length ?? 0) < 400_000);
  assert.match(make().back() ?? '', /^148 /);
});

test('each step is taken back and forward with the keys, and a text field keeps its own undo', () =>
  visit('one file', async (page) => {
    await answered(page);
    await page.fill('#temperature', '268 °C');
    assert.equal(await direction(page), 'reverse');
    await page.focus('#cases-button');
    await page.keyboard.press('Control+z');
    assert.equal(await page.inputValue('#temperature'), '208 ± 2 °C');
    assert.equal(await direction(page), 'forward');
    await page.keyboard.press('Control+Shift+Z');
    assert.equal(await page.inputValue('#temperature'), '268 °C');
    await page.focus('#pressure');
    await page.keyboard.press('End');
    await page.keyboard.type('x');
    await page.keyboard.press('Control+z');
    assert.equal(await page.inputValue('#pressure'), '23.6 ± 0.2 bar(g)', 'what was typed in a field is taken back there');
    assert.equal(await page.inputValue('#temperature'), '268 °C');
    await page.keyboard.press('Control+z');
    await page.keyboard.press('Control+z');
    await page.keyboard.press('Control+z');
    assert.equal(await page.inputValue('#temperature'), '208 ± 2 °C', 'then the case goes back');
  }, AT_DESK));

test('by touch, a removed row and a changed example come back, also after a reload', () =>
  visit('one file', async (page) => {
    await answered(page);
    await page.getByRole('button', { name: 'Remove N₂' }).tap();
    assert.equal(await gasField(page, 'N₂').count(), 0);
    await page.tap('#undo');
    assert.equal(await gasField(page, 'N₂').inputValue(), '3.8 ± 0.1 %');
    await page.tap('#cases-button');
    await page.tap('[data-example="chlorine-recovery"]');
    await page.reload();
    await answered(page);
    assert.match(await page.title(), /HCl/);
    await page.tap('#undo');
    assert.match(await page.title(), /shift/);
    assert.equal(await page.isEnabled('#redo'), true);
  }, BY_TOUCH));
