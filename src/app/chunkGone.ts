/** What to do when a page's bundle cannot be fetched. */

const key = 'coldloop.reloaded';
// A second failure this soon after loading anew is no old version but a fault: it is shown, not reloaded for ever.
const settleMs = 60_000;

const worker = () => ('serviceWorker' in navigator ? navigator.serviceWorker.controller : null);

/**
 * Loads the page anew when that can help: the bundle belongs to a version that the server or, after an update in
 * another tab, this device no longer has. Without a network only the network is gone: what is on the screen stays.
 */
export function watchForGoneChunks(): void {
  const startedUnder = worker();
  window.addEventListener('vite:preloadError', () => {
    const isSuperseded = startedUnder !== null && worker() !== startedUnder;
    const last = Number(sessionStorage.getItem(key) ?? -Infinity);
    if ((!navigator.onLine && !isSuperseded) || Date.now() - last < settleMs) return;
    sessionStorage.setItem(key, String(Date.now()));
    window.location.reload();
  });
}
