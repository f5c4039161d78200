/** Finds the field that a path of the case belongs to, and leads to it. */

import { reveal } from './folds.js';

/**
 * The visible element of this path, or of the nearest path above it.
 * @param {string} path
 * @returns {HTMLElement | null}
 */
export function findField(path) {
  for (let at = path; at !== ''; at = at.replace(/(?:^|\.)[^.[\]]+$|\[\d+\]$/, '')) {
    for (const found of document.querySelectorAll(`[data-field~="${CSS.escape(at.replaceAll(' ', '_'))}"]`)) {
      if (found instanceof HTMLElement && found.closest('[hidden]') === null) return found;
    }
  }
  return null;
}

/**
 * Opens what hides the field of this path and puts the cursor into it.
 * @param {string} path
 */
export function goTo(path) {
  const field = findField(path);
  if (field === null) return;
  reveal(field);
  field.focus();
  field.scrollIntoView({ block: 'nearest' });
}
