/** Text saved to a file of the user's. */

import { create } from './dom.js';

/**
 * @param {string} name
 * @param {string} text   JSON
 */
export function saveText(name, text) {
  const address = URL.createObjectURL(new Blob([text], { type: 'application/json' }));
  const anchor = create('a', { href: address, download: name });
  anchor.click();
  window.setTimeout(() => URL.revokeObjectURL(address), 10_000);
}
