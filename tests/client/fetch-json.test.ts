import { afterEach, expect, it, vi } from 'vitest';
import { fetchJson, RequestProblem } from '@/lib/client/fetch-json';

const anything = { parse: (value: unknown) => value };

function answerWith(body: BodyInit | null, status = 200) {
  const fetched = vi.fn<typeof fetch>(() => Promise.resolve(new Response(body, { status })));
  vi.stubGlobal('fetch', fetched);
  return fetched;
}

async function problemOf(request: Promise<unknown>): Promise<RequestProblem> {
  const problem: unknown = await request.then(
    () => undefined,
    (thrown: unknown) => thrown,
  );
  if (!(problem instanceof RequestProblem)) throw new Error('The request went through');
  return problem;
}

afterEach(() => vi.unstubAllGlobals());

it('sends JSON and gives back what the parser made of the reply', async () => {
  const fetched = answerWith('{"volume":68}');
  const reply = await fetchJson(
    '/api/pool',
    { parse: (value) => (value as { volume: number }).volume },
    { method: 'POST', body: { volume: '68,0' } },
  );
  expect(reply).toBe(68);
  const [address, init] = fetched.mock.calls[0] ?? [];
  expect(address).toBe('/api/pool');
  expect(init).toMatchObject({ method: 'POST', body: '{"volume":"68,0"}' });
  expect(new Headers(init?.headers).get('content-type')).toBe('application/json');
});

it('keeps the code and the words for each field', async () => {
  answerWith(
    '{"error":{"code":"invalid-input","message":"Look again.","problems":[{"path":"ph","message":"6.2 to 9"},7]}}',
    422,
  );
  const problem = await problemOf(fetchJson('/api/readings', anything));
  expect(problem.code).toBe('invalid-input');
  expect(problem.message).toBe('Look again.');
  expect(problem.at('ph')).toBe('6.2 to 9');
  expect(problem.at('freeChlorine')).toBeUndefined();
  expect(problem.problems).toHaveLength(1);
});

it.each([
  ['a proxy answers with a page', '<html>502</html>', 502],
  ['the code is none of ours', '{"error":{"code":"toString","message":"?"}}', 500],
  ['the body is empty', null, 500],
])('calls it unexpected when %s', async (_case, body, status) => {
  answerWith(body, status);
  expect((await problemOf(fetchJson('/api/week', anything))).code).toBe('unexpected');
});

it('calls it unexpected when the reply has another form than agreed', async () => {
  answerWith('{}');
  const refuses = {
    parse: () => {
      throw new TypeError('no week');
    },
  };
  expect((await problemOf(fetchJson('/api/week', refuses))).code).toBe('unexpected');
});

it('calls it no connection when nobody answers', async () => {
  vi.stubGlobal('fetch', () => Promise.reject(new TypeError('Failed to fetch')));
  expect((await problemOf(fetchJson('/api/week', anything))).code).toBe('no-connection');
});

it('does not make a problem of a request that was given up', async () => {
  const giveUp = new AbortController();
  giveUp.abort(new DOMException('left the page', 'AbortError'));
  vi.stubGlobal('fetch', (_address: string, init: RequestInit) => Promise.reject(init.signal?.reason));
  await expect(fetchJson('/api/week', anything, { signal: giveUp.signal })).rejects.toMatchObject({
    name: 'AbortError',
  });
});

it('reads a reply without a body', async () => {
  answerWith(null, 204);
  await expect(fetchJson('/api/sign-out', anything, { method: 'POST' })).resolves.toBeUndefined();
});
