/** Parts of the form that stay folded until a case, or the user, wants them. */

import { byId } from './dom.js';

/**
 * Opens a part that the case uses; one that it does not use is left as the user has it.
 * @param {string} id
 * @param {boolean} used
 */
export function unfold(id, used) {
  if (used) byId(id, HTMLDetailsElement).open = true;
}

/**
 * Opens whatever is folded around an element.
 * @param {Element} element
 */
export function reveal(element) {
  for (let fold = element.closest('details'); fold !== null; fold = fold.parentElement?.closest('details') ?? null) fold.open = true;
}

/** Folds every part again: for a case that comes in the place of another. */
export function foldAll() {
  for (const fold of document.querySelectorAll('#inputs details.fold')) if (fold instanceof HTMLDetailsElement) fold.open = false;
}

/** On a narrow screen the longer parts of the answer are folded until they are wanted. */
export function foldWhereNarrow() {
  if (!window.matchMedia('(max-width: 699.98px)').matches) return;
  for (const fold of document.querySelectorAll('details[data-fold="wide"]')) if (fold instanceof HTMLDetailsElement) fold.open = false;
}
