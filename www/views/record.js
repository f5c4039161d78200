/**
 * The record: one sheet of paper with the job, the reading, the verdict, the working and its sources. It is put
 * together from what the page shows when it is printed, so it can say nothing else than the page does.
 */

import { byId, create } from '../dom.js';
import { formula } from '../format.js';
import { hashOf, plainHashOf } from '../link.js';
import { readingRows } from '../reading-rows.js';

/** @import { State } from '../state.js' */

const sheet = byId('record', HTMLElement);
const LINK_PAUSE_MS = 250;
/** The sheet is as wide as a page of A4 within its margins; its type shrinks until it is no higher. */
const HEIGHT_MM = 270;
const PX_PER_MM = 96 / 25.4;
const SIZES_PT = [9, 8.5, 8, 7.5, 7, 6.5, 6, 5.5];

/** @type {State | null} */
let latest = null;
/** The hash of the case, packed; packing takes a moment, so it is done before anyone prints. */
let packed = { text: '', hash: '' };
let timer = 0;

/** @param {State} state */
export function render(state) {
  latest = state;
  window.clearTimeout(timer);
  timer = window.setTimeout(() => void pack(JSON.stringify(state.question)), LINK_PAUSE_MS);
}

/** @param {string} text */
async function pack(text) {
  packed = { text, hash: await hashOf(text) };
}

window.addEventListener('beforeprint', () => {
  if (latest !== null) build(latest);
});
window.addEventListener('afterprint', () => {
  sheet.hidden = true;
  sheet.replaceChildren();
});

/** @param {State} state */
function build(state) {
  const { question, current, problems } = state;
  const text = JSON.stringify(question);
  const hash = packed.text === text ? packed.hash : plainHashOf(text);
  sheet.replaceChildren(
    create('header', {},
      create('h1', {}, question.title.trim() || 'Case without a title'),
      create('p', {}, `Shiftgauge record, printed ${new Date().toLocaleString('en-GB', { dateStyle: 'long', timeStyle: 'short' })}`),
    ),
    ...(question.note.trim() === '' ? [] : [create('p', { class: 'record-note' }, question.note)]),
    ...(current ? [] : [create('p', { class: 'record-old' }, `Out of date: the answer below is not of this case. ${problems.map(({ message }) => message).join(' ')}`)]),
    part('verdict', 'Verdict', copy('sentence'), copy('sentence-more'), copy('numbers')),
    create('div', { class: 'record-columns' },
      part('reading', 'Reading', table(state)),
      part('ledger', byId('ledger-heading', HTMLElement).textContent ?? '', ...all('.ledger table, .ledger #conversions'))),
    create('div', { class: 'record-columns' },
      part('picture', byId('valley-heading', HTMLElement).textContent ?? '', copy('valley-drawing'), copy('valley-text')),
      part('assumptions', 'Assumed and converted', copy('note-list'))),
    create('div', { class: 'record-columns' },
      part('certainty', 'How sure', copy('certainty-text'), copy('better'), inOneLine('#budget-rows li', 4, 'Most of it comes from')),
      part('nudges', 'What one small change does to rest', inOneLine('#nudge-list summary', 5))),
    part('extras', 'Feed and solution', copy('extra-figures')),
    part('working', 'Working', copy('working-lines')),
    part('sources', 'Constant and sources', copy('constant-forms'), copy('source-text'), ...all('.constants .records, .constants #citations')),
    part('cautions', 'Cautions', ...all('.cautions > p:first-child')),
    part('link', `The case as a link, for Shiftgauge ${byId('version', HTMLElement).textContent ?? ''}`,
      create('p', { class: 'record-link' }, window.location.href.replace(/#.*$/, '') + hash)),
  );
  sheet.hidden = false;
  fit();
}

/**
 * A part of the sheet, left out where the page shows nothing of it.
 * @param {string} name
 * @param {string} heading
 * @param {...(Node | null)} content
 */
function part(name, heading, ...content) {
  const found = content.filter((node) => node !== null && node.textContent?.trim() !== '').filter((node) => node !== null);
  return found.length === 0 ? '' : create('section', { 'data-record': name }, create('h2', {}, heading), ...found);
}

/**
 * A list of the page as one line of the sheet.
 * @param {string} selector
 * @param {number} most   so many of its lines
 * @param {string} [lead]
 */
function inOneLine(selector, most, lead = '') {
  const each = all(selector).slice(0, most).map((row) => [...row.children].map(({ textContent }) => textContent?.trim() ?? '').filter((text) => !['', '→', '←', '·'].includes(text)).join(': '));
  return each.length === 0 ? null : create('p', {}, `${lead === '' ? '' : `${lead}: `}${each.join('; ')}.`);
}

/** @param {State} state */
function table({ question }) {
  return create('dl', {}, ...readingRows(question).map(([name, value]) => create('div', {}, create('dt', {}, formula(name)), create('dd', {}, value))));
}

/** @param {string} id */
function copy(id) {
  const [found] = all(`#${id}`);
  return found ?? null;
}

/**
 * Copies of what the page shows, without the names that must stand only once in it.
 * @param {string} selector
 */
function all(selector) {
  return [...document.querySelectorAll(`main ${selector.split(', ').join(', main ')}`)]
    .filter((element) => element.closest('[hidden]') === null)
    .map((element) => {
      const made = /** @type {Element} */ (element.cloneNode(true));
      made.classList.add(`of-${element.id || element.localName}`);
      for (const named of [made, ...made.querySelectorAll('[id], [aria-labelledby], [aria-describedby]')]) {
        for (const attribute of ['id', 'aria-labelledby', 'aria-describedby', 'tabindex']) named.removeAttribute(attribute);
      }
      return made;
    });
}

/** Takes the largest type with which the sheet is one page. */
function fit() {
  sheet.classList.add('is-measured');
  for (const size of SIZES_PT) {
    sheet.style.setProperty('--record-size', `${size}pt`);
    if (sheet.scrollHeight <= HEIGHT_MM * PX_PER_MM) break;
  }
  sheet.classList.remove('is-measured');
}
