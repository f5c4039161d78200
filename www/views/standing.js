/** How the page stands without a network, and the offer to change to a newer version. */

import { byId } from '../dom.js';

const offline = byId('offline', HTMLElement);
const update = byId('update', HTMLButtonElement);

/**
 * @param {'file' | 'ready' | 'update'} standing
 * @param {() => void} [takeOver]   changes to the newer version
 */
export function tell(standing, takeOver) {
  if (standing !== 'update') {
    offline.textContent = `${standing === 'file' ? 'All of it is in this file' : 'Kept in this browser'}: works without a network.`;
    return;
  }
  byId('update-line', HTMLElement).hidden = false;
  update.addEventListener('click', () => takeOver?.(), { once: true });
}
