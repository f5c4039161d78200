/** The user's own book: kept in one place of the browser's storage, and carried inside a case. */

import { isRecord } from './state.js';

/** @import { Book, Case, OwnConstant, OwnSpecies } from './shiftgauge.js' */

const PLACE = 'shiftgauge.book';
const LONGEST_TEXT = 1_000_000;
export const BOOK_FORMAT = 'shiftgauge book 1';

/** @typedef {{ species: OwnSpecies[], constants: OwnConstant[] }} Whole */

/** @typedef {{ ok: true, book: Whole } | { ok: false, message: string }} ReadBook */

/**
 * Both lists of whatever should be a book.
 * @param {unknown} found
 * @returns {Whole}
 */
export function whole(found) {
  /** @param {unknown} list */
  const records = (list) => (Array.isArray(list) ? list.filter(isRecord) : []);
  const { species, constants } = isRecord(found) ? found : { species: [], constants: [] };
  return { species: /** @type {OwnSpecies[]} */ (/** @type {unknown} */ (records(species))), constants: /** @type {OwnConstant[]} */ (/** @type {unknown} */ (records(constants))) };
}

/**
 * Reads a book's file; what stands in it is looked through by the engine.
 * @param {string} text
 * @returns {ReadBook}
 */
export function bookFromText(text) {
  if (text.length > LONGEST_TEXT) return { ok: false, message: 'This file is far larger than a book can be. Nothing was changed.' };
  try {
    const found = JSON.parse(text);
    if (isRecord(found) && found.format === BOOK_FORMAT) return { ok: true, book: whole(found) };
  } catch {
    // What is not JSON is no book either.
  }
  return { ok: false, message: `This is not a book: it does not say "format": "${BOOK_FORMAT}". Nothing was changed.` };
}

/** @param {Whole} book */
export function bookToText(book) {
  return `${JSON.stringify({ format: BOOK_FORMAT, ...book }, null, 2)}\n`;
}

/** The book of this device; empty where there is none or the browser keeps nothing. */
export function load() {
  try {
    return whole(JSON.parse(window.localStorage.getItem(PLACE) ?? 'null'));
  } catch {
    return whole(null);
  }
}

/**
 * @param {Whole} book
 * @returns {boolean}   whether it was kept
 */
export function store(book) {
  try {
    window.localStorage.setItem(PLACE, JSON.stringify(book));
    return true;
  } catch {
    return false;
  }
}

/**
 * A book with the entries of another put in, in the place of those of the same species or equation.
 * @param {Whole} book
 * @param {Whole} more
 * @returns {Whole}
 */
export function joined(book, more) {
  const bare = (/** @type {string} */ text) => String(text).replace(/\s+/g, '');
  const named = new Set(more.species.map(({ species }) => bare(species)));
  const equations = new Set(more.constants.map(({ equation }) => bare(equation)));
  return {
    species: [...book.species.filter(({ species }) => !named.has(bare(species))), ...more.species],
    constants: [...book.constants.filter(({ equation }) => !equations.has(bare(equation))), ...more.constants],
  };
}

/**
 * A book without one of its entries.
 * @param {Whole} book
 * @param {OwnSpecies | OwnConstant} entry
 * @returns {Whole}
 */
export function without(book, entry) {
  const same = (/** @type {unknown} */ one) => JSON.stringify(one) === JSON.stringify(entry);
  return { species: book.species.filter((one) => !same(one)), constants: book.constants.filter((one) => !same(one)) };
}

/**
 * Whether a case carries this entry.
 * @param {Case} question
 * @param {OwnSpecies | OwnConstant} entry
 */
export function carries(question, entry) {
  const { species, constants } = whole(question.book);
  return [...species, ...constants].some((one) => JSON.stringify(one) === JSON.stringify(entry));
}

/**
 * A case with another book in it; an empty one leaves no trace.
 * @param {Case} question
 * @param {Whole} book
 * @returns {Case}
 */
export function withBook(question, book) {
  const copy = { ...question, book };
  if (book.species.length + book.constants.length === 0) Reflect.deleteProperty(copy, 'book');
  return copy;
}
