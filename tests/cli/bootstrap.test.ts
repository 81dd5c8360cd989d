import { statSync } from 'node:fs';
import { createServer } from 'node:net';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { finish, makeProject, type Project, waitFor } from './bootstrap-project';

// Each test starts several processes, on a machine that may be busy with the other stages.
vi.setConfig({ testTimeout: 60_000 });

let project: Project;
beforeEach(() => {
  project = makeProject();
});
afterEach(() => project.remove());

describe('an old Node.js', () => {
  it('is refused with one line', async () => {
    const pretend = "Object.defineProperty(process, 'versions', { value: { ...process.versions, node: '18.20.4' } });";
    const node = ['--import', `data:text/javascript,${encodeURIComponent(pretend)}`];
    const { code, out, err } = await project.run(['plan', 'scenario.json'], { node });
    expect({ code, out, err }).toEqual({
      code: 1,
      out: '',
      err: 'Wadewell needs Node.js 20.19 or newer; this is 18.20.4.\n',
    });
    expect(project.calls()).toEqual([]);
  });
});

describe('packages', () => {
  it('are installed once, and nothing but the plan reaches standard output', async () => {
    const first = await project.run(['plan', 'scenario.json']);
    expect(JSON.parse(first.out)).toEqual({ scenario: 'scenario.json', text: 'a pool' });
    expect(first.err).toContain('npm: added 1 package');
    const second = await project.run(['plan', 'scenario.json']);
    expect(second).toEqual({ code: 0, out: first.out, err: '' });
    expect(project.calls()).toEqual(['npm ci --include=dev --no-audit --no-fund --loglevel=error']);
  });

  it('are installed again when the lock file has changed', async () => {
    await project.run(['plan', 'scenario.json']);
    project.write('package-lock.json', '{ "lockfileVersion": 3, "packages": {} }');
    await project.run(['plan', 'scenario.json']);
    expect(project.calls()).toHaveLength(2);
  });

  it('are installed by one of two commands that start together', async () => {
    const both = await Promise.all([project.run(['plan', 'scenario.json']), project.run(['plan', 'scenario.json'])]);
    expect(both.map(({ code }) => code)).toEqual([0, 0]);
    expect(project.calls()).toHaveLength(1);
  });

  it('are not waited for when whoever installed them has died', async () => {
    // No process has this number: it is above the highest that Linux gives.
    project.write('.tmp/install.lock', '4999999 1');
    expect(await project.run(['plan', 'scenario.json'])).toMatchObject({ code: 0 });
  });

  it('that cannot be installed are one line after what npm says', async () => {
    project.write('packages.json', 'no json');
    const { code, out, err } = await project.run(['plan', 'scenario.json']);
    expect({ code, out }).toEqual({ code: 1, out: '' });
    expect(err.trim().split('\n').at(-1)).toMatch(/^npm ci did not succeed/);
  });
});

describe('signals', () => {
  it.each([
    { signal: 'SIGTERM' as const, code: 7 },
    { signal: 'SIGINT' as const, code: 8 },
  ])('$signal reaches the program, whose exit code is ours', async ({ signal, code }) => {
    const child = project.start(['plan', 'wait']);
    const ended = finish(child);
    await waitFor(child, 'waiting');
    child.kill(signal);
    expect((await ended).code).toBe(code);
  });
});

describe('build', () => {
  const builds = () => project.calls().filter((call) => call === 'next build').length;

  it('happens again only when something that it is made from has changed', async () => {
    const counts: number[] = [];
    const build = async (env = {}) => {
      await project.run(['build'], { env });
      counts.push(builds());
    };
    await build();
    await build();
    project.write('app/page.tsx', 'export default function Page() { return null; }');
    await build();
    await build({ NEXT_PUBLIC_NAME: 'ours' });
    await build({ NEXT_PUBLIC_NAME: 'ours', SMTP_URL: 'smtp://127.0.0.1' });
    project.write('.env.local', 'NEXT_PUBLIC_NAME=yours');
    await build();
    project.write('tests/new.test.ts', 'not part of the build');
    await build();
    await build({ NEXT_DIST_DIR: '.next-test' });
    await project.run(['build', '--force']);
    counts.push(builds());
    expect(counts).toEqual([1, 1, 2, 3, 3, 4, 4, 5, 6]);
  });

  it('that failed is no build', async () => {
    project.write('break-the-build', '');
    expect((await project.run(['build'])).code).toBe(1);
    expect((await project.run(['build'])).err).toContain('The build did not succeed');
    expect(builds()).toBe(2);
  });

  it('is done by one of two commands that start together', async () => {
    await project.run(['plan', 'scenario.json']);
    const env = { BUILD_MILLISECONDS: '300' };
    const both = await Promise.all([project.run(['build'], { env }), project.run(['build'], { env })]);
    expect(both.map(({ code }) => code)).toEqual([0, 0]);
    expect(builds()).toBe(1);
  });
});

describe('start', () => {
  let port: number;
  beforeEach(async () => {
    port = await freePort();
  });

  it('makes the secret, builds, serves, says where, and ends with 0 on Ctrl-C', async () => {
    const child = project.start(['start'], { env: { PORT: `${port}` } });
    const ended = finish(child);
    await waitFor(child, `Look round without an account: http://127.0.0.1:${port}/ and press 'Look round'`);
    const reply = await fetch(`http://127.0.0.1:${port}/api/health`);
    expect(await reply.text()).toBe(`production ${port}`);
    expect(project.read('.env.local')).toMatch(/^WADEWELL_SECRET=[\w-]{43}\n$/);
    expect(statSync(project.path('.env.local')).mode & 0o777).toBe(0o600);
    expect(project.has('data')).toBe(true);

    const whileServing = await project.run(['build', '--force']);
    expect(whileServing.code).toBe(1);
    expect(whileServing.err).toMatch(/^A new build is due, and process \d+ still serves/);

    child.kill('SIGINT');
    expect((await ended).code).toBe(0);
    expect((await project.run(['build', '--force'])).code).toBe(0);
  });

  it('keeps what stands in .env.local and does not build twice', async () => {
    project.write('.env.local', 'WADEWELL_SECRET=ours\nSMTP_URL=smtp://127.0.0.1');
    for (let time = 0; time < 2; time += 1) {
      const child = project.start(['start'], { env: { PORT: `${port}` } });
      const ended = finish(child);
      await waitFor(child, 'Look round');
      child.kill('SIGTERM');
      expect((await ended).code).toBe(0);
    }
    expect(project.read('.env.local')).toBe('WADEWELL_SECRET=ours\nSMTP_URL=smtp://127.0.0.1');
    expect(project.calls().filter((call) => call === 'next build')).toHaveLength(1);
  });

  it('adds a secret that is missing to the others', async () => {
    project.write('.env.local', 'SMTP_URL=smtp://127.0.0.1:2500');
    const child = project.start(['start'], { env: { PORT: `${port}` } });
    const ended = finish(child);
    await waitFor(child, 'Look round');
    child.kill('SIGTERM');
    await ended;
    expect(project.read('.env.local')).toMatch(/^SMTP_URL=smtp:\/\/127\.0\.0\.1:2500\nWADEWELL_SECRET=[\w-]{43}\n$/);
  });

  it('says in one line that the port is in use, before it does anything', async () => {
    const taken = createServer().listen(port, '127.0.0.1');
    const { code, out, err } = await project.run(['start'], { env: { PORT: `${port}` } });
    taken.close();
    expect({ code, out }).toEqual({ code: 1, out: '' });
    expect(err).toBe(
      `Port ${port} is in use. Stop the program that listens there, or choose another: PORT=3000 npm start\n`,
    );
    expect(project.calls()).toEqual([]);
  });

  it('says in one line that a port is none', async () => {
    const { code, err } = await project.run(['start'], { env: { PORT: 'home' } });
    expect({ code, err }).toEqual({ code: 1, err: 'PORT must be a number from 1 to 65535; it is "home".\n' });
  });
});

describe('a command that does not exist', () => {
  it('is answered with those that do', async () => {
    const { code, err } = await project.run(['strat']);
    expect(code).toBe(2);
    expect(err).toBe(
      'There is no command "strat". There are: start, dev, build, test, verify, plan, bench, mutants, shots, audit, licences, audit:packages.\n',
    );
  });
});

function freePort(): Promise<number> {
  return new Promise((resolve) => {
    const probe = createServer().listen(0, '127.0.0.1', () => {
      const address = probe.address();
      probe.close(() => resolve(typeof address === 'object' && address ? address.port : 0));
    });
  });
}
