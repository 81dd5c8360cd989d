/** So long after a page has come: the card is fetched with every file it names, and the page's own first seconds come first [ms]. */
const A_WHILE = 10_000;

/**
 * Has the emergency card kept on this device, so that it opens without a connection. A browser that has no service workers,
 * or a page over plain http, goes without.
 */
export function keepEmergencyCard(): void {
  if (!('serviceWorker' in navigator)) return;
  setTimeout(() => {
    // The next page tries again.
    if (navigator.onLine) navigator.serviceWorker.register('/sw.js').catch(() => undefined);
  }, A_WHILE);
}
