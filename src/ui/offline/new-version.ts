/** The service worker: registered once the page has loaded, and whether a newer version of the page waits. */

let waiting: ServiceWorker | null = null;
const listeners = new Set<() => void>();

/** Registers the service worker. Where there is none (development, a browser that refuses) the page works as before, online. */
export function registerOffline(): void {
  if (!('serviceWorker' in navigator)) return;
  const register = () =>
    navigator.serviceWorker
      .register('./service-worker.js', { scope: './', updateViaCache: 'none' })
      .then(watch, () => undefined);
  if (document.readyState === 'complete') void register();
  else window.addEventListener('load', () => void register());
}

function watch(registration: ServiceWorkerRegistration): void {
  const found = () => {
    if (registration.waiting === null || navigator.serviceWorker.controller === null) return;
    waiting = registration.waiting;
    for (const listener of listeners) listener();
  };
  found();
  registration.addEventListener('updatefound', () => registration.installing?.addEventListener('statechange', found));
  document.addEventListener('visibilitychange', () => {
    if (document.visibilityState === 'visible') void registration.update().catch(() => undefined);
  });
}

/** Whether a newer version waits. */
export function hasNewVersion(): boolean {
  return waiting !== null;
}

/** Calls back when a newer version begins to wait; the answer stops it. */
export function onNewVersion(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

/** Lets the newer version take over, then loads the page again. Only ever on the user's word. */
export function reloadIntoNewVersion(): void {
  navigator.serviceWorker.addEventListener('controllerchange', () => window.location.reload(), { once: true });
  waiting?.postMessage('take over');
}
