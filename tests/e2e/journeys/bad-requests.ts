import { randomUUID } from 'node:crypto';
import { rowCounts } from '../support/database';
import { describePool, fullTest, sundayEvening } from '../support/households';
import type { Journey, Stage } from '../support/journey';
import { type Answer, Person } from '../support/person';
import { allRoutes, filled } from '../support/routes';
import type { Server } from '../support/server';

const refusals = [401, 403, 404, 405, 409, 413, 415, 422];
/** What tells about the machine and not about the mistake. */
const technical =
  /\bat .+:\d+:\d+|\.tsx?\b|node_modules|TypeError|SyntaxError|SQLITE|undefined|\bNaN\b|\[object|expected \w+, received|Invalid input|Unexpected token|ZodError/i;
const publicRoutes = [
  '/api/health',
  '/api/sign-in',
  '/api/sign-in/passkey',
  '/api/sign-in/passkey/options',
  '/api/sign-out',
  '/api/sign-up',
  '/api/look-round',
  '/api/language',
  '/api/email-confirmations',
  '/api/password-resets',
  '/api/invitations/sign-up',
];

/** What no page of ours would send: refused in words, with nothing written. */
export const badRequests: Journey = {
  name: 'bad requests',
  seconds: 150,
  async run(stage) {
    const server = await stage.server({ name: 'bad-requests', clock: sundayEvening });
    const ines = new Person(server);
    await ines.signUp();
    await describePool(ines);
    await ines.must('POST', '/api/readings', fullTest(sundayEvening));
    await stage.part('every route', () => everyRoute(stage, server, ines));
    await stage.part('fields', () => everyField(stage, server, ines));
    await stage.part('another household', () => anotherHousehold(stage, server, ines));
  },
};

const counts = async (server: Server) => {
  const { rate_limits: _tries, sessions: _sessions, ...rows } = await rowCounts(server);
  return rows;
};

async function everyRoute(stage: Stage, server: Server, ines: Person): Promise<void> {
  const routes = allRoutes();
  stage.check('the routes are found', routes.length >= 14 && routes.every(({ methods }) => methods.length > 0), routes);
  const before = await counts(server);
  for (const { pattern, methods, takesInput } of routes) {
    for (const method of methods) {
      const name = `${method} ${pattern}`;
      const bodyless = method === 'GET';
      const ask = (id: string, body?: unknown, more?: Parameters<Person['send']>[3]) =>
        ines.send(method, filled(pattern, id), body, more);
      if (takesInput(method) && method !== 'GET')
        await badBodies(stage, name, (body, more) => ask(randomUUID(), body, more));
      if (takesInput(method) && method === 'GET')
        checkRefusal(
          stage,
          `${name} with an unknown question`,
          await ines.send('GET', `${pattern}?colour=blue`),
          [422],
        );
      if (pattern.includes('[')) {
        checkRefusal(
          stage,
          `${name} for what is no id`,
          await ask('%00..%2F', bodyless ? undefined : {}),
          [403, 404, 422],
        );
        checkRefusal(
          stage,
          `${name} for what is not there`,
          await ask(randomUUID(), bodyless ? undefined : {}),
          [403, 404, 422],
        );
      }
      if (!publicRoutes.includes(pattern))
        checkRefusal(
          stage,
          `${name} signed out`,
          await new Person(server).send(method, filled(pattern, randomUUID()), method === 'GET' ? undefined : {}),
          [401],
        );
      if (method === 'GET') continue;
      const path = filled(pattern, randomUUID());
      checkRefusal(
        stage,
        `${name} from another site`,
        await ines.send(
          method,
          path,
          {},
          { headers: { 'sec-fetch-site': 'cross-site', origin: 'https://elsewhere.example' } },
        ),
        [403],
      );
      checkRefusal(
        stage,
        `${name} from another site, old browser`,
        await ines.send(method, path, {}, { headers: { origin: 'https://elsewhere.example' } }),
        [403],
      );
      checkRefusal(
        stage,
        `${name} from nowhere`,
        await ines.send(method, path, {}, { headers: { origin: '' } }),
        [403],
      );
    }
    for (const verb of ['GET', 'POST', 'PUT', 'PATCH', 'DELETE'].filter((verb) => !methods.includes(verb)))
      checkRefusal(
        stage,
        `${verb} ${pattern}, which it does not answer`,
        await ines.send(verb, filled(pattern, randomUUID())),
        [405],
      );
  }
  stage.equal('no row was written, none is gone', await counts(server), before);
}

async function badBodies(
  stage: Stage,
  name: string,
  ask: (body?: unknown, more?: Parameters<Person['send']>[3]) => Promise<Answer>,
): Promise<void> {
  checkRefusal(stage, `${name}, broken JSON`, await ask(undefined, { text: '{"a": ' }), [422]);
  checkRefusal(stage, `${name}, nothing`, await ask(undefined, { text: '' }), [415, 422]);
  checkRefusal(
    stage,
    `${name}, another type`,
    await ask(undefined, { text: 'a=1', headers: { 'content-type': 'application/x-www-form-urlencoded' } }),
    [415],
  );
  checkRefusal(stage, `${name}, far too much`, await ask({ note: 'x'.repeat(200_000) }), [413]);
  for (const body of [
    null,
    5,
    'text',
    [],
    [{}],
    {},
    { colour: 'blue' },
    { id: 5, values: 'none', name: {}, step: 7, answers: [] },
  ]) {
    const answer = await ask(body);
    // A change of nothing changes nothing, and may be taken.
    if (JSON.stringify(body) === '{}' && answer.status === 200) continue;
    checkRefusal(stage, `${name}, ${JSON.stringify(body)}`, answer, [422]);
  }
}

function checkRefusal(
  stage: Stage,
  what: string,
  { status, body, text, headers }: Answer,
  wanted: readonly number[],
): void {
  const faults = [
    ...(wanted.includes(status) ? [] : [`answered ${status}`]),
    ...(refusals.includes(status) && !hasWords(body) ? ['has no words'] : []),
    ...(technical.test(text) ? ['speaks of the machine'] : []),
    ...(headers.get('content-type')?.startsWith('application/json') ? [] : ['is no JSON']),
  ];
  stage.check(what, faults.length === 0, `${faults.join(', ')}: ${text.slice(0, 300)}`);
}

type Refusal = { error?: { message?: unknown; problems?: { path: string; message: string }[] } };

function hasWords(body: unknown): boolean {
  const { error } = (body ?? {}) as Refusal;
  return typeof error?.message === 'string' && error.message.length > 10;
}

/** One wrong value in what is sound otherwise: the answer names that field, in words. */
async function everyField(stage: Stage, server: Server, ines: Person): Promise<void> {
  const before = await counts(server);
  const account = {
    name: 'Bram',
    email: 'bram@pool.example',
    password: 'four words in a row',
    householdName: 'Marrow Lane',
    timeZone: 'America/New_York',
    unitSystem: 'metric',
    locale: 'en-US',
  };
  const size = { how: 'entered', volume: 75.7, unit: 'm3', sure: true };
  const sun = {
    latitude: 28,
    longitude: -81.5,
    timeZone: 'America/New_York',
    sunExposure: 1,
    cover: 'none',
    waterFeatures: false,
  };
  const product = { id: randomUUID(), form: 'granular', substance: 'calcium-hypochlorite', strength: 65, stock: 100 };
  const tomorrow = new Date(Date.parse(sundayEvening) + 26 * 3_600_000).toISOString();

  const cases: [method: string, path: string, sound: Record<string, unknown>, field: string, wrong: unknown[]][] = [
    ...(['name', 'householdName'] as const).map(
      (field) => ['POST', '/api/sign-up', account, field, ['', '   ', 5, null, 'x'.repeat(5000)]] as const,
    ),
    ['POST', '/api/sign-up', account, 'email', ['', 'ines', 'ines@', '@pool.example', 'a b@c.d', 5]],
    ['POST', '/api/sign-up', account, 'password', ['', 'short', 'password123', 'x'.repeat(5000), {}]],
    ['POST', '/api/sign-up', account, 'timeZone', ['', 'Mars/Base', 7]],
    ['POST', '/api/sign-up', account, 'unitSystem', ['imperial', null]],
    ['POST', '/api/sign-up', account, 'locale', ['', '../../etc', 'x'.repeat(100)]],
    ['PUT', '/api/pool', { step: 'size', answers: size }, 'answers.volume', [0, -5, 1e12, '75,7', null, 0.01]],
    ['PUT', '/api/pool', { step: 'size', answers: size }, 'answers.unit', ['bathtubs', null]],
    ['PUT', '/api/pool', { step: 'size', answers: size }, 'answers.meanDepth', [-1, 0, 99]],
    ['PUT', '/api/pool', { step: 'sun', answers: sun }, 'answers.latitude', [91, -91, '28', null]],
    ['PUT', '/api/pool', { step: 'sun', answers: sun }, 'answers.longitude', [181, -999]],
    ['PUT', '/api/pool', { step: 'sun', answers: sun }, 'answers.sunExposure', [-0.1, 2]],
    ['PUT', '/api/pool', { step: 'sun', answers: sun }, 'answers.timeZone', ['', 'Mars/Base']],
    ['POST', '/api/shelf-products', product, 'strength', [0, -1, 101, 'strong']],
    ['POST', '/api/shelf-products', product, 'stock', [-1, 1e12, 'some']],
    ['POST', '/api/shelf-products', product, 'substance', ['bleach', null]],
    ['POST', '/api/shelf-products', product, 'form', ['liquid', 'powder']],
    ['POST', '/api/readings', fullTest(sundayEvening), 'id', ['1', 5, null]],
    ['POST', '/api/readings', fullTest(sundayEvening), 'takenAt', ['yesterday', tomorrow, 5, '2026-13-45T00:00:00Z']],
    ...(['freeChlorine', 'pH', 'totalAlkalinity', 'calciumHardness', 'cyanuricAcid', 'temperature'] as const).map(
      (quantity) =>
        [
          'POST',
          '/api/readings',
          fullTest(sundayEvening),
          `values.${quantity}`,
          [-50, 1e9, 'high', { low: 3, high: 1 }, [1]],
        ] as const,
    ),
    ['POST', '/api/readings', fullTest(sundayEvening), 'method', ['nose', null]],
    ['POST', '/api/readings', fullTest(sundayEvening), 'note', ['x'.repeat(5000), 5]],
  ] as never;

  for (const [method, path, sound, field, wrong] of cases)
    for (const value of wrong) {
      const answer = await ines.send(method, path, withValue(sound, field, value));
      const what = `${method} ${path}: ${field} ${JSON.stringify(value)?.slice(0, 40)}`;
      checkRefusal(stage, what, answer, [422]);
      const problems = (answer.body as Refusal | undefined)?.error?.problems ?? [];
      const last = field.split('.').at(-1) ?? field;
      stage.check(
        `${what} names the field`,
        problems.some((problem) => problem.path.split('.').includes(last) && problem.message.length > 8),
        answer.text.slice(0, 300),
      );
    }
  stage.equal('no row was written by a wrong field', await counts(server), before);
}

/** A copy with one value changed. */
function withValue(sound: Record<string, unknown>, field: string, value: unknown): Record<string, unknown> {
  const copy = structuredClone(sound);
  const names = field.split('.');
  const last = names.pop() ?? '';
  const place = names.reduce<Record<string, unknown>>((at, name) => at[name] as Record<string, unknown>, copy);
  place[last] = value;
  return copy;
}

/** What belongs to others is not there. */
async function anotherHousehold(stage: Stage, server: Server, ines: Person): Promise<void> {
  const bram = new Person(server);
  await bram.signUp({ name: 'Bram' });
  await describePool(bram);
  const reading = fullTest(sundayEvening);
  await bram.must('POST', '/api/readings', reading);
  const before = await counts(server);
  checkRefusal(
    stage,
    'a reading of another household cannot be corrected',
    await ines.send('PUT', `/api/readings/${reading.id}`, reading),
    [403, 404],
  );
  checkRefusal(stage, 'nor removed', await ines.send('DELETE', `/api/readings/${reading.id}`), [403, 404]);
  checkRefusal(
    stage,
    'nor taken over by its id',
    await ines.send('POST', '/api/readings', reading),
    [403, 404, 409, 422],
  );
  const week = await bram.must<{ doses: { id: string; planVersion: number }[] }>('GET', '/api/week');
  const dose = week.doses[0];
  if (dose) {
    const tick = { action: 'given', id: randomUUID(), planVersion: dose.planVersion };
    checkRefusal(
      stage,
      'a dose of another household cannot be ticked',
      await ines.send('POST', `/api/doses/${dose.id}/ticks`, tick),
      [403, 404],
    );
  }
  const stranger = await ines.send('PUT', '/api/households/chosen', { householdId: randomUUID() });
  checkRefusal(stage, 'a household one does not belong to cannot be opened', stranger, [403, 404]);
  stage.equal('nothing of it was written', await counts(server), before);
}
