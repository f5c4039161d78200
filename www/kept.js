/** Cases kept on this device under a name, one place of the browser's storage for each. */

const PREFIX = 'shiftgauge.kept.';

/**
 * @typedef {object} Kept
 * @property {string} name
 * @property {string} text   the case, as a file would hold it
 * @property {number} saved  when, in ms since 1970
 */

/**
 * Whether a place of the storage holds a kept case.
 * @param {string} key
 */
export const isKept = (key) => key.startsWith(PREFIX);

/** @typedef {'kept' | 'full' | 'blocked'} Outcome */

/**
 * All kept cases by name; null where the browser allows no storage.
 * @returns {Kept[] | null}
 */
export function list() {
  try {
    const storage = window.localStorage;
    const keys = Array.from({ length: storage.length }, (_, index) => storage.key(index) ?? '');
    return keys.filter(isKept)
      .flatMap((key) => read(key.slice(PREFIX.length)) ?? [])
      .sort((a, b) => a.name.localeCompare(b.name));
  } catch {
    return null;
  }
}

/**
 * @param {string} name
 * @returns {Kept | null}
 */
export function read(name) {
  try {
    const found = JSON.parse(window.localStorage.getItem(PREFIX + name) ?? 'null');
    return typeof found?.text === 'string' ? { name, text: found.text, saved: Number(found.saved) || 0 } : null;
  } catch {
    return null;
  }
}

/**
 * Keeps a case, in the place of one of the same name.
 * @param {Kept} kept
 * @returns {Outcome}
 */
export function write({ name, text, saved }) {
  try {
    window.localStorage.setItem(PREFIX + name, JSON.stringify({ text, saved }));
    return 'kept';
  } catch {
    return list() === null ? 'blocked' : 'full';
  }
}

/** @param {string} name */
export function remove(name) {
  try {
    window.localStorage.removeItem(PREFIX + name);
  } catch {
    // Where nothing can be kept, there is nothing to remove.
  }
}
