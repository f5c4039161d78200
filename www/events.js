/** What the user does to the form and the page, reported upward to whoever runs the page. */

import { byId } from './dom.js';

/**
 * @typedef {object} Handlers
 * @property {() => void} changed              something was typed, chosen, added or removed
 * @property {(hash: string) => void} linked   another link was opened in this tab
 */

/** @param {Handlers} handlers */
export function listen({ changed, linked }) {
  const form = byId('inputs', HTMLFormElement);
  for (const kind of ['input', 'change']) {
    form.addEventListener(kind, changed);
    byId('title', HTMLInputElement).addEventListener(kind, changed);
  }
  window.addEventListener('hashchange', () => linked(window.location.hash));
  byId('print-button', HTMLButtonElement).addEventListener('click', () => window.print());
}
