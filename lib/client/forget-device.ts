/** Everything that this product keeps in a browser is named so. */
const ours = 'wadewell';

/** What waits to be sent, and a test being written down: named by its person, shown to them alone, sent as nobody else. */
const unsent = /^wadewell\.(?:unsent-\w+|test)\./;

/** Heard by whoever keeps something in the memory of a page. */
export const forgotten = 'wadewell-forgotten';

/**
 * Forgets on this device what belongs to a person and their household: whoever uses it next must not find it. For signing
 * out, for a membership or a role that is over, and for a session that was ended elsewhere. Nothing of it can fail the way
 * out: what a browser refuses is left to the server's `Clear-Site-Data`.
 *
 * @param keepUnsent leaves what could not be sent yet, for a person who is only signed out and will be back
 */
export async function forgetDevice({ keepUnsent = false } = {}): Promise<void> {
  forgetStored(keepUnsent);
  window.dispatchEvent(new Event(forgotten));
  await Promise.allSettled([forgetDatabases(), forgetCaches(), forgetPush()]);
}

/** Whether something waits on this device that forgetting would lose. */
export function somethingWaits(): boolean {
  return storedNames().some((name) => /^wadewell\.unsent-/.test(name) && window.localStorage.getItem(name) !== '[]');
}

function forgetStored(keepUnsent: boolean): void {
  try {
    for (const name of storedNames()) if (!keepUnsent || !unsent.test(name)) window.localStorage.removeItem(name);
    window.sessionStorage.clear();
  } catch {
    // Storage that may not be used holds nothing either.
  }
}

function storedNames(): string[] {
  try {
    return Object.keys(window.localStorage).filter((name) => name.startsWith(ours));
  } catch {
    return [];
  }
}

async function forgetDatabases(): Promise<void> {
  if (!('indexedDB' in globalThis) || typeof indexedDB.databases !== 'function') return;
  for (const { name } of await indexedDB.databases()) if (name !== undefined) indexedDB.deleteDatabase(name);
}

/** The emergency card is kept as a person saw it, with names on it. It is kept anew for whoever comes next. */
async function forgetCaches(): Promise<void> {
  if (!('caches' in globalThis)) return;
  await Promise.all((await caches.keys()).map((name) => caches.delete(name)));
}

async function forgetPush(): Promise<void> {
  if (!('serviceWorker' in navigator)) return;
  const worker = await navigator.serviceWorker.getRegistration();
  await (await worker?.pushManager?.getSubscription())?.unsubscribe();
}
