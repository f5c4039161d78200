/**
 * What stays in this browser: the case in hand, the one before it, and a case that stopped the
 * engine. Each tab comes back to its own; a new tab to the last one written.
 */

const PREFIX = 'shiftgauge.';

/** @typedef {'case' | 'before' | 'stopped'} Slot */

/**
 * @param {Slot} slot
 * @returns {string | null}   null where nothing is kept or the browser keeps nothing
 */
export function recall(slot) {
  try {
    return window.sessionStorage.getItem(PREFIX + slot) ?? window.localStorage.getItem(PREFIX + slot);
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
    window.localStorage.setItem(PREFIX + slot, text);
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
