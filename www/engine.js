/** The engine in WebAssembly: started once, called without waiting, started again after a trap. */

import * as glue from './shiftgauge.js';

/** @import { Asked, BalanceAnswer, Book, BookAnswer, Case, CheckAnswer, ConvertAnswer, Goal, Refusal, SheetAnswer, SpeciesMatch, StatedNumber, SweepAnswer, SweepRequest, TargetAnswer } from './shiftgauge.js' */

/** @type {WebAssembly.Module | null} */
let compiled = null;

/** Whether this browser can run WebAssembly at all. */
export function isSupported() {
  return typeof WebAssembly === 'object' && typeof WebAssembly.Module === 'function';
}

/** Loads the engine: from the page itself where it is one file, from beside the page otherwise. */
export async function startEngine() {
  const inline = document.getElementById('engine-bytes');
  compiled = inline
    ? await WebAssembly.compile(decodeBase64(inline.textContent ?? ''))
    : await compileFrom('./shiftgauge_bg.wasm');
  glue.initSync({ module: compiled });
}

/** @param {string} path */
async function compileFrom(path) {
  const response = await fetch(path);
  if (!response.ok) throw new Error(`${path} answered ${response.status}`);
  return WebAssembly.compile(await response.arrayBuffer());
}

/** @param {string} text */
function decodeBase64(text) {
  const bare = text.trim();
  const direct = /** @type {{ fromBase64?: (text: string) => Uint8Array<ArrayBuffer> }} */ (/** @type {unknown} */ (Uint8Array));
  if (direct.fromBase64) return direct.fromBase64(bare);
  return Uint8Array.from(atob(bare), (sign) => sign.charCodeAt(0));
}

/** Puts a new instance of the same module in the place of one that trapped. */
export function restartEngine() {
  if (compiled === null) throw new Error('The engine was never started.');
  glue.reset();
  glue.initSync({ module: compiled });
}

/**
 * @param {Case} question
 * @returns {CheckAnswer}
 */
export function check(question) {
  return glue.check(question, { language: 'en', units: 'as typed' });
}

/**
 * @param {Case} question
 * @param {SweepRequest} request
 * @returns {SweepAnswer}
 */
export function sweep(question, request) {
  return beside(() => glue.sweep(question, request, { language: 'en', units: 'as typed' }));
}

/**
 * @param {Case} question
 * @param {Goal} goal
 * @returns {TargetAnswer}
 */
export function target(question, goal) {
  return beside(() => glue.target(question, goal, { language: 'en', units: 'as typed' }));
}

/**
 * @param {StatedNumber} number
 * @returns {ConvertAnswer}
 */
export function convert(number) {
  return beside(() => glue.convert(number));
}

/**
 * What is asked beside the answer must not cost the answer: after a trap a new instance takes over, and
 * the question is refused like any that cannot be answered.
 * @template T
 * @param {() => T} ask
 * @returns {T | Refusal}
 */
function beside(ask) {
  try {
    return ask();
  } catch (thrown) {
    console.error(thrown);
    restartEngine();
    const message = 'The engine stopped on this, which is a fault of the program. The case and its answer are not touched.';
    return { ok: false, problems: [{ code: 'engine-stopped', field: '', span: null, arguments: {}, message, hint: 'Change a value and ask again.' }] };
  }
}

/**
 * How an equation is read: balanced, with the phases that the library alone settles.
 * @param {string} equation
 * @returns {BalanceAnswer}
 */
export function balance(equation) {
  const read = glue.balance(equation);
  if (!read.ok) return read;
  return { ...read, terms: read.terms.map((term) => ({ ...term, phase: term.phase ?? onlyPhase(term.species) })) };
}

/**
 * The phase of a species that the library has, as far as room temperature goes, as a gas only or never as a gas;
 * null otherwise.
 * @param {string} name
 */
function onlyPhase(name) {
  const exact = findSpecies(name).filter(({ found_by: by, likely }) => ['formula', 'atoms'].includes(by) && likely);
  const phases = [...new Set(exact.map(({ phase }) => phase))];
  return phases.length > 1 && phases.includes('g') ? null : phases[0] ?? null;
}

/**
 * The species that a formula in any order, a name, a CAS number or the beginning of one may mean, the likeliest
 * first; help with typing is not worth a dead page, so after a trap nothing is found.
 * @param {string} text
 * @param {Asked | null} [asked]
 * @returns {SpeciesMatch[]}
 */
export function findSpecies(text, asked = null) {
  if (text.trim() === '') return [];
  const found = beside(() => glue.species(text, asked));
  return found.ok ? found.species : [];
}

/**
 * @param {string} text
 * @param {Asked | null} asked
 * @returns {SheetAnswer}
 */
export function sheet(text, asked) {
  return beside(() => glue.sheet(text, asked));
}

/**
 * Looks a book through.
 * @param {Book} given
 * @returns {BookAnswer}
 */
export function book(given) {
  return beside(() => glue.book(given));
}

/** The program's and the tables' versions as one line. */
export function versionLine() {
  const { program, format, species } = glue.version();
  return `${program}, ${species} species, case format ${format}`;
}
