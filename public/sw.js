// Keeps the emergency card on the device, so that it opens without a connection: the page with the policy it came with, and
// the files it names. Nothing else is kept. Plain, because it needs no package and no build of its own.

const card = '/help/emergency';
const kept = 'wadewell-emergency-card';
const anHour = 3_600_000;

let keptAt = 0;

self.addEventListener('install', (event) => {
  // Without a connection now, the next page that is opened tries again.
  event.waitUntil(keepCard().catch(() => undefined));
  self.skipWaiting();
});

self.addEventListener('activate', (event) => {
  event.waitUntil(self.clients.claim());
});

self.addEventListener('fetch', (event) => {
  const { request } = event;
  const { origin, pathname } = new URL(request.url);
  if (request.method !== 'GET' || origin !== self.location.origin) return;
  if (request.mode === 'navigate') {
    if (pathname === card) event.respondWith(fetch(request).catch(() => keptCard()));
    event.waitUntil(renewCard().catch(() => undefined));
  } else if (pathname.startsWith('/_next/static/')) {
    event.respondWith(fetch(request).catch(async () => (await caches.match(request)) ?? Response.error()));
  }
});

async function keptCard() {
  return (await caches.match(card)) ?? Response.error();
}

/** Once an hour; at once where somebody signed out and it was forgotten. */
async function renewCard() {
  if (Date.now() - keptAt > anHour || !(await caches.has(kept))) await keepCard();
}

/** Fetches the card as this person sees it, and every file that it or its styles name; what was kept before goes. */
async function keepCard() {
  keptAt = Date.now();
  const page = await fetch(card, { credentials: 'same-origin', cache: 'no-store' });
  if (!page.ok || page.redirected) return;
  const text = await page.clone().text();
  const files = filesIn(text);
  const styles = await Promise.all(files.filter((file) => file.endsWith('.css')).map(textOf));
  const wanted = [...new Set([...files, ...styles.flatMap(filesIn)])];
  const cache = await caches.open(kept);
  await cache.put(card, page);
  await Promise.all(wanted.map((file) => cache.add(file).catch(() => undefined)));
  for (const request of await cache.keys()) {
    const { pathname } = new URL(request.url);
    if (pathname !== card && !wanted.includes(pathname)) await cache.delete(request);
  }
}

async function textOf(file) {
  const answer = await fetch(file);
  return answer.ok ? answer.text() : '';
}

/** Addresses of built files in a page or a style sheet; styles name fonts from beside them. */
function filesIn(text) {
  const whole = text.match(/\/_next\/static\/[\w./~-]+\.(?:css|js|woff2)/g) ?? [];
  const besideStyles = [...text.matchAll(/url\(["']?\.\.\/media\/([\w.~-]+\.woff2)/g)].map(
    ([, name]) => `/_next/static/media/${name}`,
  );
  return [...new Set([...whole, ...besideStyles])];
}
