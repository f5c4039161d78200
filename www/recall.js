/**
 * What stays in this browser: the case in hand, the one before it, a case that stopped the engine, and
 * the steps that can be undone. Each tab comes back to its own; a new tab to the last case written.
 */

const PREFIX = 'shiftgauge.';

/** @typedef {'case' | 'before' | 'stopped' | 'steps'} Slot */

/** Steps belong to their tab alone. */
/** @type {readonly Slot[]} */
const OF_THE_TAB = ['steps'];

/**
 * @param {Slot} slot
 * @returns {string | null}   null where nothing is kept or the browser keeps nothing
 */
export function recall(slot) {
  try {
    const own = window.sessionStorage.getItem(PREFIX + slot);
    return OF_THE_TAB.includes(slot) ? own : own ?? window.localStorage.getItem(PREFIX + slot);
  } catch {
    return null;
  }
}

/**
 * @param {Slot} slot
 * @param {string} text
 * @returns {boolean}   whether it was kept
 */
export function keep(slot, text) {
  try {
    window.sessionStorage.setItem(PREFIX + slot, text);
    if (!OF_THE_TAB.includes(slot)) window.localStorage.setItem(PREFIX + slot, text);
    return true;
  } catch {
    return false;
  }
}

/** @param {Slot} slot */
export function forget(slot) {
  try {
    window.sessionStorage.removeItem(PREFIX + slot);
    window.localStorage.removeItem(PREFIX + slot);
  } catch {
    // A browser that keeps nothing has nothing to forget.
  }
}
