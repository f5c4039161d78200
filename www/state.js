/** The one state of the page, and the case's way in and out of text. */

/** @import { Case, Report, Problem, BalanceAnswer } from './shiftgauge.js' */

/** @typedef {{ report: Report, answered: Case }} Answered */
/**
 * @typedef {object} State
 * @property {Case} question       the case as the form reads now
 * @property {Report | null} report   the last good answer
 * @property {Case | null} answered   the case which that answer belongs to
 * @property {Problem[]} problems  what is wrong with the case as it reads now
 * @property {BalanceAnswer | null} balance   how the equation was understood
 * @property {boolean} current     whether the report answers the case as it reads now
 * @property {Answered | null} pinned   an answer kept beside the one now
 * @property {string} trapped      the case, as text, that stopped the engine; it is not tried again
 */

/**
 * Holds the state and tells its one listener of every change.
 * @param {State} initial
 * @param {(state: State) => void} changed
 */
export function createState(initial, changed) {
  let state = initial;
  return {
    get: () => state,
    /** @param {Partial<State>} patch */
    set(patch) {
      state = { ...state, ...patch };
      changed(state);
    },
  };
}

export const FORMAT = 'shiftgauge 1';
const LONGEST_TEXT = 1_000_000;
/** A case is nested six deep; this much more cannot trouble whatever walks it. */
const DEEPEST = 32;

/** @returns {Case} */
export function emptyCase() {
  return {
    format: FORMAT, title: '', note: '',
    reactions: [{ equation: '', constant: { from: 'library' } }],
    temperature: '', pressure: '', atmosphere: '101.325 kPa', hold: 'pressure', heat: 'isothermal', volume: null, band: '10 K',
    reading: { gas: { basis: 'dry', water: null, entries: [] }, liquid: null, solution: null, solids: null },
    feed: null,
    models: { gas: 'ideal', liquid: 'ideal', solution: 'ideal' },
  };
}

/** @typedef {{ ok: true, question: Case } | { ok: false, message: string }} ReadCase */

/**
 * Reads a saved case. Only its frame is looked at here; what stands in the fields is checked by
 * the engine like anything typed.
 * @param {string} text
 * @returns {ReadCase}
 */
export function caseFromText(text) {
  if (text.length > LONGEST_TEXT) return { ok: false, message: 'This file is far larger than a case can be. Nothing was changed.' };
  let found;
  try {
    found = JSON.parse(text);
  } catch {
    return { ok: false, message: 'This is not a case: its text is not JSON. Nothing was changed.' };
  }
  if (isDeeper(found, DEEPEST)) return { ok: false, message: 'This is not a case: it is nested far deeper than one can be. Nothing was changed.' };
  if (!isRecord(found) || typeof found.format !== 'string' || !found.format.startsWith('shiftgauge ')) {
    return { ok: false, message: `This is not a case: it does not say "format": "${FORMAT}". Nothing was changed.` };
  }
  if (found.format !== FORMAT) {
    return { ok: false, message: `This case says “${found.format.slice(0, 40)}”; this page reads “${FORMAT}”. Nothing was changed.` };
  }
  const base = emptyCase();
  const reactions = Array.isArray(found.reactions) && isRecord(found.reactions[0]) ? found.reactions : base.reactions;
  const reading = isRecord(found.reading) ? { ...base.reading, gas: null, ...found.reading } : base.reading;
  return { ok: true, question: /** @type {Case} */ ({ ...base, ...found, reactions, reading }) };
}

/**
 * @param {unknown} value
 * @param {number} levels
 * @returns {boolean}
 */
function isDeeper(value, levels) {
  if (!isContainer(value)) return false;
  return levels === 0 || Object.values(value).some((inner) => isDeeper(inner, levels - 1));
}

/**
 * @param {Case} question
 * @returns {string}
 */
export function caseToText(question) {
  return `${JSON.stringify(question, null, 2)}\n`;
}

/**
 * The case without what stands at this path: a known field goes back to that of an empty case.
 * @param {Case} question
 * @param {string} path   such as `models.gas` or `reactions[1]`
 * @returns {Case}
 */
export function withoutField(question, path) {
  const steps = path.split(/[.[\]]+/).filter((step) => step !== '');
  const last = steps.pop() ?? '';
  const copy = structuredClone(question);
  let [at, usual] = /** @type {unknown[]} */ ([copy, emptyCase()]);
  for (const step of steps) {
    at = isContainer(at) ? Reflect.get(at, step) : undefined;
    usual = isContainer(usual) ? Reflect.get(usual, step) : undefined;
  }
  if (!isContainer(at)) return question;
  if (isContainer(usual) && Object.hasOwn(usual, last)) Reflect.set(at, last, Reflect.get(usual, last));
  else if (Array.isArray(at)) at.splice(Number(last), 1);
  else Reflect.deleteProperty(at, last);
  return copy;
}

/**
 * @param {unknown} value
 * @returns {value is object}
 */
const isContainer = (value) => typeof value === 'object' && value !== null;

/**
 * Whatever a file holds where a text should stand, as text.
 * @param {unknown} value
 */
export function asText(value) {
  return typeof value === 'string' || typeof value === 'number' ? String(value) : '';
}

/**
 * @param {unknown} value
 * @returns {value is Record<string, unknown>}
 */
export function isRecord(value) {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

/**
 * The fields of whatever should be an object; none where it is something else.
 * @param {unknown} value
 * @returns {Record<string, unknown>}
 */
export const fieldsOf = (value) => (isRecord(value) ? value : {});
