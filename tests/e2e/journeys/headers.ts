import { nonceOf } from '@/lib/api/headers';
import { enterAs } from '../support/enter';
import { describePool, sundayEvening } from '../support/households';
import type { Journey, Stage } from '../support/journey';
import { type Answer, Person } from '../support/person';
import type { Server } from '../support/server';

const openPages = [
  ...['/', '/sign-in', '/sign-up', '/help', '/help/emergency', '/help/safety', '/help/how', '/help/how/sun'],
  '/there-is-no-such-page',
];
const householdPages = ['/week', '/test', '/pool', '/pool/size', '/help'];

/** Headers and cookies of both kinds of origin, and a policy with a nonce of its own on every page. */
export const headers: Journey = {
  name: 'headers and cookies',
  seconds: 90,
  async run(stage) {
    const plain = await stage.server({ name: 'headers-http', clock: sundayEvening });
    const secure = await stage.server({
      name: 'headers-https',
      clock: sundayEvening,
      origin: 'https://pool.example.test',
    });
    for (const server of [plain, secure]) await stage.part(server.options.name, () => askEverything(stage, server));
    await stage.part('in the browser', () => look(stage, plain));
  },
};

async function askEverything(stage: Stage, server: Server): Promise<void> {
  const kind = server.options.origin === undefined ? 'http' : 'https';
  const person = new Person(server);
  for (const path of openPages)
    checkPage(stage, kind, path, await person.send('GET', path), await person.send('GET', path));
  const { email, password } = await person.signUp();
  checkPage(
    stage,
    kind,
    '/first-run/scope',
    await person.send('GET', '/first-run/scope'),
    await person.send('GET', '/first-run/scope'),
  );
  await describePool(person);
  for (const path of householdPages)
    checkPage(stage, kind, path, await person.send('GET', path), await person.send('GET', path));

  const entered = await new Person(server).send('POST', '/api/sign-in', { email, password });
  checkCookie(stage, kind, entered.headers.getSetCookie());
  for (const [method, path] of [
    ['GET', '/api/health'],
    ['GET', '/api/week'],
    ['POST', '/api/readings'],
    ['GET', '/api/there-is-no-such-route'],
    ['DELETE', '/api/week'],
  ] as const)
    checkApi(stage, kind, `${method} ${path}`, await person.send(method, path));
  checkApi(stage, kind, 'signed out', await new Person(server).send('GET', '/api/week'));
}

function checkPage(stage: Stage, kind: 'http' | 'https', path: string, first: Answer, second: Answer): void {
  const here = (what: string) => `${kind} ${path}: ${what}`;
  const policy = first.headers.get('content-security-policy') ?? '';
  const nonce = nonceOf(policy) ?? '';
  stage.check(here('the policy has a nonce'), nonce.length >= 16, policy);
  stage.check(here('another one for each request'), nonce !== nonceOf(second.headers.get('content-security-policy')));
  const scripts = [...first.text.matchAll(/<script\b[^>]*>/g)].map(([tag]) => tag);
  stage.none(
    here('every script on the page carries it'),
    scripts.filter((tag) => !tag.includes(`nonce="${nonce}"`)),
  );
  stage.check(here('the page has scripts at all'), scripts.length > 0);
  stage.check(here('nothing unsafe for scripts'), !/script-src[^;]*unsafe/.test(policy), policy);
  stage.check(
    here('no plug-ins, no frames, no other base'),
    /object-src 'none'/.test(policy) && /frame-ancestors 'none'/.test(policy) && /base-uri 'self'/.test(policy),
    policy,
  );
  stage.equal(here('upgrades only an https origin'), policy.includes('upgrade-insecure-requests'), kind === 'https');
  stage.equal(here('promises https only on https'), first.headers.has('strict-transport-security'), kind === 'https');
  stage.equal(here('nosniff'), first.headers.get('x-content-type-options'), 'nosniff');
  stage.check(
    here('is not kept by anything between'),
    /no-store|no-cache/.test(first.headers.get('cache-control') ?? ''),
    first.headers.get('cache-control'),
  );
  stage.equal(here('says nothing of what it runs on'), first.headers.has('x-powered-by'), false);
  stage.equal(here('status'), first.status, path.includes('no-such') ? 404 : 200);
}

function checkCookie(stage: Stage, kind: 'http' | 'https', cookies: string[]): void {
  const cookie = cookies[0] ?? '';
  stage.equal(`${kind}: one cookie`, cookies.length, 1);
  stage.equal(`${kind}: bound to the host`, cookie.startsWith('__Host-'), kind === 'https');
  stage.equal(`${kind}: Secure`, /;\s*secure/i.test(cookie), kind === 'https');
  stage.check(
    `${kind}: HttpOnly, SameSite=Lax, for the whole site`,
    /httponly/i.test(cookie) && /samesite=lax/i.test(cookie) && /path=\//i.test(cookie),
    cookie.replace(/=[^;]*/, '=...'),
  );
  stage.check(`${kind}: no domain, so no other host`, !/domain=/i.test(cookie));
}

function checkApi(stage: Stage, kind: 'http' | 'https', what: string, { headers: found, text }: Answer): void {
  const here = (words: string) => `${kind} ${what}: ${words}`;
  stage.check(here("default-src 'none'"), (found.get('content-security-policy') ?? '').includes("default-src 'none'"));
  stage.equal(here('nosniff'), found.get('x-content-type-options'), 'nosniff');
  stage.equal(here('no-store'), found.get('cache-control'), 'no-store');
  stage.equal(here('promises https only on https'), found.has('strict-transport-security'), kind === 'https');
  stage.check(here('is JSON'), (found.get('content-type') ?? '').startsWith('application/json'), text.slice(0, 80));
}

/** What the browser itself thinks of the cookie; the complaints of each page are checked when the journey ends. */
async function look(stage: Stage, server: Server): Promise<void> {
  const person = new Person(server);
  await person.signUp();
  await describePool(person);
  const visitor = await stage.visitor(server, 'every page');
  visitor.expect(/404/);
  for (const path of openPages) await visitor.page.goto(path, { waitUntil: 'networkidle' });
  await enterAs(visitor, person);
  for (const path of householdPages) await visitor.page.goto(path, { waitUntil: 'networkidle' });
  stage.equal('scripts cannot read the session', await visitor.page.evaluate(() => document.cookie), '');
}
