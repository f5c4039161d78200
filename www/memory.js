/** Keeps the case in hand as it changes, with the steps back, and says so once where it cannot. */

import { createHistory } from './history.js';
import { keep, recall } from './recall.js';

/** The field in hand, so that typing in it is one step back. */
function fieldInHand() {
  const field = document.activeElement;
  return field instanceof HTMLInputElement || field instanceof HTMLTextAreaElement ? field.dataset.field ?? field.id : '';
}

/** @param {(message: string, alarm: boolean) => void} tell */
export function createMemory(tell) {
  const history = createHistory({ load: () => recall('steps'), store: (text) => keep('steps', text) });
  let saidUnkept = false;
  return {
    history,
    /** @param {string} text */
    keepCase(text) {
      history.note(text, fieldInHand());
      if (keep('case', text) || saidUnkept) return;
      saidUnkept = true;
      tell('This browser keeps nothing for this page: its storage is full or blocked. Save the case to a file before you close the page.', true);
    },
  };
}
