/** The user's own book: what it holds, what of it this case uses, its file, and the K of this case. */

import * as shelf from '../book.js';
import { byId, create } from '../dom.js';
import { book as lookThrough } from '../engine.js';
import { saveText } from '../files.js';
import { formula } from '../format.js';

/** @import { Case, OwnConstant, OwnSpecies } from '../shiftgauge.js' */
/** @import { Whole } from '../book.js' */
/** @import { State } from '../state.js' */

const list = byId('book-list', HTMLElement);
const said = byId('book-said', HTMLElement);
const source = byId('book-k-source', HTMLInputElement);
const opened = byId('book-open', HTMLInputElement);

/**
 * @typedef {object} Actions
 * @property {() => Case} current
 * @property {(question: Case) => void} change
 * @property {(entry: OwnSpecies | null) => void} edit   opens the form for a species of one's own
 */

/** @type {Actions | null} */
let actions = null;
/** @type {Case | null} */
let question = null;
let shown = '';

/** @param {Actions} given */
export function connect(given) {
  actions = given;
  byId('book-new', HTMLButtonElement).addEventListener('click', () => given.edit(null));
  byId('book-save', HTMLButtonElement).addEventListener('click', () => saveText('my book.json', shelf.bookToText(everything())));
  byId('book-k', HTMLButtonElement).addEventListener('click', keepConstant);
  opened.addEventListener('change', () => void openFile());
  show();
}

/** @param {State} state */
export function render(state) {
  ({ question } = state);
  show();
}

/** What is kept on this device, and what only the case carries. */
function everything() {
  return shelf.joined(shelf.load(), shelf.whole(question?.book));
}

function show() {
  const all = everything();
  // What has the focus is not replaced while nothing has changed.
  const now = JSON.stringify([all, question?.book ?? null]);
  if (now === shown) return;
  shown = now;
  const entries = [...all.species.map((entry) => row(entry, entry.species, true)), ...all.constants.map((entry) => row(entry, `K of ${entry.equation}`, false))];
  list.replaceChildren(...entries);
  if (entries.length === 0) list.append(create('li', { class: 'hint' }, 'Nothing yet.'));
}

/**
 * @param {OwnSpecies | OwnConstant} entry
 * @param {string} name
 * @param {boolean} isSpecies
 */
function row(entry, name, isSpecies) {
  const use = create('input', { type: 'checkbox' });
  use.checked = question !== null && shelf.carries(question, entry);
  use.addEventListener('change', () => take(entry, use.checked));
  const remove = create('button', { type: 'button', 'aria-label': `Take ${name} out of my book` }, '✕');
  remove.addEventListener('click', () => {
    shelf.store(shelf.without(shelf.load(), entry));
    take(entry, false);
    shown = '';
    show();
    say(`${name} is out of the book.`, () => keep(/** @type {OwnSpecies & OwnConstant} */ (entry), isSpecies));
  });
  const label = create('label', { class: 'use' }, use, create('span', {}, isSpecies ? formula(name) : name), ' ', create('em', {}, `${entry.source}; use in this case`));
  if (!isSpecies) return create('li', {}, label, remove);
  const edit = create('button', { type: 'button' }, 'Change');
  edit.addEventListener('click', () => actions?.edit(/** @type {OwnSpecies} */ (entry)));
  return create('li', {}, label, edit, remove);
}

/**
 * Puts an entry into the case, or takes it out.
 * @param {OwnSpecies | OwnConstant} entry
 * @param {boolean} used
 */
function take(entry, used) {
  if (actions === null) return;
  const current = actions.current();
  const rest = shelf.without(shelf.whole(current.book), entry);
  const more = used ? ('equation' in entry ? { species: [], constants: [/** @type {OwnConstant} */ (entry)] } : { species: [/** @type {OwnSpecies} */ (entry)], constants: [] }) : shelf.whole(null);
  actions.change(shelf.withBook(current, shelf.joined(rest, more)));
}

/**
 * Keeps an entry on this device and uses it in the case.
 * @param {OwnSpecies & OwnConstant} entry
 * @param {boolean} isSpecies
 */
function keep(entry, isSpecies) {
  const one = isSpecies ? { species: [entry], constants: [] } : { species: [], constants: [entry] };
  const kept = shelf.store(shelf.joined(shelf.load(), one));
  take(entry, true);
  return kept;
}

/**
 * @param {OwnSpecies} entry
 * @returns {void}
 */
export function keepSpecies(entry) {
  const kept = keep(/** @type {OwnSpecies & OwnConstant} */ (entry), true);
  say(kept ? `${entry.species} is in the book, and this case uses it.` : `This browser keeps nothing: ${entry.species} is in this case only. Save the case or the book to a file.`);
}

function keepConstant() {
  if (actions === null) return;
  const { equation, constant } = actions.current().reactions[0] ?? { equation: '', constant: { from: '' } };
  if (!['value', 'points', 'formula'].includes(constant.from)) return say('K comes from the library here. Give a value, points or a formula first, under “K comes from”.');
  const own = Object.fromEntries(Object.entries(constant).filter(([name]) => name !== 'for' && name !== 'approach'));
  const entry = { equation: constant.for ?? equation, constant: own, source: source.value.trim() };
  const answer = lookThrough({ constants: [entry] });
  if (!answer.ok) return say(answer.problems.map(({ message, hint }) => `${message} ${hint}`).join(' '));
  keep(/** @type {OwnSpecies & OwnConstant} */ (/** @type {unknown} */ (entry)), false);
  return say(`K of ${entry.equation} is in the book. Choose “my book” under “K comes from” to use it.`);
}

async function openFile() {
  const file = opened.files?.[0];
  opened.value = '';
  if (file === undefined) return;
  const read = shelf.bookFromText(await file.text());
  if (!read.ok) return say(read.message);
  const answer = lookThrough(read.book);
  if (!answer.ok) return say(`This book is refused, and nothing was changed. ${answer.problems.map(({ field, message }) => `${field}: ${message}`).join(' ')}`);
  const kept = shelf.store(shelf.joined(shelf.load(), read.book));
  shown = '';
  show();
  return say(kept ? `${read.book.species.length} species and ${read.book.constants.length} constants are in the book.` : 'This browser keeps nothing, so the book could not be taken in.');
}

/**
 * @param {string} message
 * @param {() => void} [undo]
 */
function say(message, undo) {
  said.replaceChildren(message);
  if (undo === undefined) return;
  const back = create('button', { type: 'button' }, 'Undo');
  back.addEventListener('click', () => {
    undo();
    said.textContent = 'Undone.';
  });
  said.append(' ', back);
}
