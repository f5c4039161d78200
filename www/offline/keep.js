// Keeps the served page for use without a network, and says how that stands.

/**
 * Tells 'ready' once the page works without a network, and 'update' with a function that changes
 * to the new version when a newer one has been fetched. A page in one file needs no keeping: 'file'.
 * Does nothing where the browser allows no service worker.
 * @param {(state: 'file' | 'ready' | 'update', take_over?: () => void) => void} tell
 */
export async function keepOffline(tell) {
  if (document.getElementById('engine-bytes')) return tell('file');
  if (!navigator.serviceWorker) return undefined;
  try {
    const registration = await navigator.serviceWorker.register('./service-worker.js');
    if (registration.waiting) offer(registration.waiting, tell);
    registration.addEventListener('updatefound', () => {
      const fresh = registration.installing;
      fresh?.addEventListener('statechange', () => {
        if (fresh.state === 'installed' && navigator.serviceWorker.controller) offer(fresh, tell);
      });
    });
    await navigator.serviceWorker.ready;
    tell('ready');
  } catch (error) {
    // The page works all the same while there is a network.
    console.info('Shiftgauge is not kept for offline use:', error);
  }
  return undefined;
}

/**
 * @param {ServiceWorker} fresh
 * @param {(state: 'ready' | 'update', take_over?: () => void) => void} tell
 */
function offer(fresh, tell) {
  tell('update', () => {
    navigator.serviceWorker.addEventListener('controllerchange', () => location.reload(), {
      once: true,
    });
    fresh.postMessage('take over');
  });
}
