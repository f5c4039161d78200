/** The feed: a second table of gases, made from the reading's markup, folded away until it is wanted. */

import { byId } from '../dom.js';
import { unfold } from '../folds.js';
import { createGasBlock } from '../gas-block.js';
import { fieldsOf } from '../state.js';

/** @import { Case } from '../shiftgauge.js' */
/** @import { State } from '../state.js' */

copyMarkup();
const fold = byId('feed-fold', HTMLDetailsElement);
const count = byId('feed-count', HTMLElement);
const block = createGasBlock('feed', 'feed.gas');
/** Whether the form stands for a feed at all; its choice of a basis alone makes none. */
const given = () => block.entries.given().length > 0;

/** The same fields once more, under names of their own. */
function copyMarkup() {
  const original = document.querySelector('[data-block="gas"]');
  if (original === null) throw new Error('The page has no table of gases to copy.');
  const copy = document.createElement('div');
  copy.dataset.field = 'feed.gas';
  copy.append(...[...original.children].map((child) => child.cloneNode(true)));
  for (const only of copy.querySelectorAll('h2, details, [data-only="reading"], option[value="from_feed"]')) only.remove();
  for (const element of copy.querySelectorAll('*')) {
    for (const name of ['id', 'for', 'name']) rename(element, name, /^gas-/, 'feed-');
    rename(element, 'data-field', /^reading\.gas/, 'feed.gas');
  }
  byId('feed-block', HTMLElement).append(copy);
}

/**
 * @param {Element} element
 * @param {string} attribute
 * @param {RegExp} from
 * @param {string} to
 */
function rename(element, attribute, from, to) {
  const value = element.getAttribute(attribute);
  if (value !== null) element.setAttribute(attribute, value.replace(from, to));
}

/** @param {Case} question */
export function fill(question) {
  block.fill(fieldsOf(question.feed).gas);
  unfold('feed-fold', given());
}

/**
 * @param {Case} question
 * @returns {Case}
 */
export function read(question) {
  const { gas: before = null, ...others } = fieldsOf(question.feed);
  const gas = given() ? block.read(before) : null;
  const kept = Object.values(others).some((value) => value !== null);
  return { ...question, feed: gas === null && !kept ? null : { ...others, gas } };
}

/** @type {State | null} */
let latest = null;
// The species of the reaction are offered once the table is seen.
fold.addEventListener('toggle', () => {
  if (latest !== null) render(latest);
});

/** @param {State} state */
export function render(state) {
  latest = state;
  if (fold.open) block.render(state);
  const rows = block.entries.given().length;
  count.textContent = rows === 0 ? 'not given' : rows === 1 ? 'one gas' : `${rows} gases`;
}
