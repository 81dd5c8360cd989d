import { randomUUID } from 'node:crypto';
import { enterAs } from '../support/enter';
import { describePool, sundayEvening } from '../support/households';
import type { Journey, Stage } from '../support/journey';
import { Person } from '../support/person';
import type { Server } from '../support/server';
import { words } from '../support/words';

const most = 60;
const token = 'x'.repeat(43);

/** Limits on a real server, where sockets are, and what a device keeps once somebody has signed out on it. */
export const limits: Journey = {
  name: 'limits and leaving a device',
  seconds: 120,
  async run(stage) {
    const server = await stage.server({ name: 'limits', clock: sundayEvening, byName: true });
    await stage.part('bodies without a length', () => endlessBodies(stage, server));
    await stage.part('sessions', () => sessions(stage, server));
    await stage.part('signing out', () => signingOut(stage, server));
    await stage.part('an address that is claimed', () => claimedAddress(stage, server));
    const variables = { TRUSTED_PROXIES: '1' };
    const behind = await stage.server({ name: 'limits-behind', clock: sundayEvening, variables });
    await stage.part('an address that a proxy names', () => namedAddress(stage, behind));
  },
};

/** Opens a link that nobody sent, from wherever the headers say. */
async function tryLink(server: Server, headers: Record<string, string>): Promise<number> {
  const answer = await new Person(server).send('POST', '/api/email-confirmations', { token }, { headers });
  if ([...answer.headers.keys()].some((name) => name.includes('wadewell'))) throw new Error('The mark has got out.');
  return answer.status;
}

async function claimedAddress(stage: Stage, server: Server): Promise<void> {
  const claim = (at: number) => ({
    'x-forwarded-for': `203.0.113.${at}`,
    'x-real-ip': `203.0.113.${at}`,
    forwarded: `for=203.0.113.${at}`,
    'x-wadewell-socket': `guess 203.0.113.${at}`,
  });
  const statuses: number[] = [];
  for (let at = 0; at <= most; at += 1) statuses.push(await tryLink(server, claim(at)));
  stage.equal('another claim at each try is one visitor all the same', statuses.slice(-2), [409, 429]);
  await server.restart(sundayEvening);
  stage.equal('also after a restart', await tryLink(server, claim(200)), 429);
  stage.equal('and without any claim', await tryLink(server, {}), 429);
  const page = await new Person(server).send('GET', `/confirm/${token}`);
  stage.check('the page of a link says so', page.text.includes(words('start.confirm.over.too-often')), page.status);
}

async function namedAddress(stage: Stage, server: Server): Promise<void> {
  const through = (at: number, seen: string) => ({ 'x-forwarded-for': `203.0.113.${at}, ${seen}` });
  const statuses: number[] = [];
  for (let at = 0; at <= most; at += 1) statuses.push(await tryLink(server, through(at, '198.51.100.1')));
  stage.equal('what was claimed before the proxy counts for nothing', statuses.slice(-2), [409, 429]);
  stage.equal('somebody else behind the same proxy goes on', await tryLink(server, through(1, '198.51.100.2')), 409);
}

async function endlessBodies(stage: Stage, server: Server): Promise<void> {
  const person = new Person(server);
  await person.signUp();
  const send = (path: string, type: string, megabytes: number) => {
    let left = megabytes * 16;
    const body = new ReadableStream<Uint8Array>({
      pull(controller) {
        left -= 1;
        if (left < 0) controller.close();
        else controller.enqueue(new Uint8Array(65_536).fill(32));
      },
    });
    const headers = { origin: server.origin, cookie: person.cookie, 'content-type': type };
    const init = { method: 'POST', headers, body, duplex: 'half', signal: AbortSignal.timeout(30_000) };
    return fetch(`${server.address}${path}`, init);
  };
  const photo = () => `/api/photos?id=${randomUUID()}&kind=equipment`;
  for (const megabytes of [1, 9, 60]) {
    stage.equal(
      `${megabytes} MB of JSON in pieces`,
      (await send('/api/sign-in', 'application/json', megabytes)).status,
      413,
    );
    // One is no picture, but not too much of it.
    const wanted = megabytes === 1 ? 422 : 413;
    stage.equal(
      `${megabytes} MB of a picture in pieces`,
      (await send(photo(), 'image/jpeg', megabytes)).status,
      wanted,
    );
  }
  const health = await fetch(`${server.address}/api/health`, { signal: AbortSignal.timeout(5000) });
  stage.equal('and the server goes on', health.status, 200);
}

async function sessions(stage: Stage, server: Server): Promise<void> {
  const ines = new Person(server);
  const { email, password } = await ines.signUp();
  const isIn = async (cookie: string) => {
    const asking = new Person(server);
    asking.cookie = cookie;
    return (await asking.send('GET', '/api/account')).status === 200;
  };
  const planted = `wadewell=${'b'.repeat(40)}`;
  const phone = new Person(server);
  phone.cookie = planted;
  await phone.must('POST', '/api/sign-in', { email, password });
  stage.check('a planted session is not taken over', phone.cookie !== planted && !(await isIn(planted)));
  const before = phone.cookie;
  await phone.must('POST', '/api/sign-out');
  stage.check('a session is dead once signed out', !(await isIn(before)) && (await isIn(ines.cookie)));
}

async function signingOut(stage: Stage, server: Server): Promise<void> {
  const ines = new Person(server);
  await ines.signUp();
  await describePool(ines);
  const visitor = await stage.visitor(server, 'Ines', { width: 1280 });
  await enterAs(visitor, ines);
  const { page, context } = visitor;
  await page.goto('/week', { waitUntil: 'networkidle' });
  await page.evaluate(async () => {
    localStorage.setItem('wadewell.pool.size.x', '{"draft":1}');
    sessionStorage.setItem('wadewell.x', '1');
    await (await caches.open('wadewell-x')).put('/x', new Response('kept'));
    await new Promise((resolve) => {
      indexedDB.open('wadewell-x').onsuccess = ({ target }) => {
        (target as IDBOpenDBRequest).result.close();
        resolve(undefined);
      };
    });
  });
  const kept = () =>
    page.evaluate(async () => ({
      stored: Object.keys(localStorage),
      session: sessionStorage.length,
      caches: await caches.keys(),
      databases: (await indexedDB.databases()).map(({ name }) => name),
    }));
  stage.check('there is something to forget', (await kept()).stored.length > 1, await kept());
  const answered = page.waitForResponse((response) => response.url().endsWith('/api/sign-out'));
  const started = performance.now();
  await page
    .getByRole('button', { name: words('navigation.signOut'), exact: true })
    .first()
    .click();
  const headers = await (await answered).allHeaders();
  stage.equal('the server says to forget', headers['clear-site-data'], '"cache", "storage"');
  await page.waitForURL((url) => url.pathname === '/');
  const seconds = (performance.now() - started) / 1000;
  stage.check('it takes no while', seconds < 10, `${seconds.toFixed(1)} s`);
  stage.equal('nothing of it is left', await kept(), { stored: [], session: 0, caches: [], databases: [] });
  stage.equal(
    'nor a session',
    (await context.cookies()).filter(({ name }) => name === 'wadewell'),
    [],
  );
  // By the server alone, as where the page was closed in that moment.
  await enterAs(visitor, await anew(server));
  await page.goto('/help', { waitUntil: 'networkidle' });
  await page.evaluate(() => localStorage.setItem('wadewell.pool.size.x', '{}'));
  await page.evaluate(() => fetch('/api/sign-out', { method: 'POST' }).then((answer) => answer.json()));
  await page.goto('/help', { waitUntil: 'networkidle' });
  stage.equal('also without the page’s help', (await kept()).stored, []);
  await removed(stage, server);
}

async function anew(server: Server): Promise<Person> {
  const person = new Person(server);
  await person.signUp();
  return person;
}

/** Somebody who is taken out of a household keeps nothing of it on their device. */
async function removed(stage: Stage, server: Server): Promise<void> {
  const ines = await anew(server);
  await describePool(ines);
  const invitation = { id: randomUUID(), name: 'Otto', role: 'caretaker', chemicalsAllowed: false };
  const { link } = await ines.must<{ link: string }>('POST', '/api/invitations', invitation);
  const otto = new Person(server);
  const account = {
    name: 'Otto',
    email: `${randomUUID()}@pool.example`,
    password: 'four words in a row',
    locale: 'en-US',
  };
  await otto.must('POST', '/api/invitations/sign-up', { token: link.split('/').at(-1), ...account });
  await otto.must('PUT', '/api/tour', { closed: true });
  const visitor = await stage.visitor(server, 'Otto', { width: 390, height: 844 });
  visitor.expect(/status of 403/);
  await enterAs(visitor, otto);
  const { page } = visitor;
  await page.goto('/week', { waitUntil: 'networkidle' });
  await page.evaluate(() => localStorage.setItem('wadewell.bottle.x', '{"left":1}'));
  const { members } = await ines.must<{ members: { id: string; name: string }[] }>('GET', '/api/members');
  const { id } = members.find(({ name }) => name === 'Otto')!;
  const gone = await ines.send('DELETE', `/api/members/${id}`);
  stage.equal('the owner takes Otto out', gone.status, 200);
  await page.goto('/week', { waitUntil: 'networkidle' });
  const left = await page.evaluate(() => Object.keys(localStorage).filter((name) => name !== 'wadewell-owner'));
  stage.equal('Otto’s phone keeps nothing of the household', left, []);
}
