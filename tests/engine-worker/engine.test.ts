import { Worker } from 'node:worker_threads';
import { afterEach, describe, expect, it } from 'vitest';
import { Engine } from '@/lib/engine-worker/engine';
import { AppError } from '@/lib/errors';
import type { Scenario } from '@/lib/schemas/scenario';

const oddThread = () => new Worker(new URL('./odd-thread.mjs', import.meta.url));
const engines: Engine[] = [];

function anEngine(limits: { jobLimit?: number; loadLimit?: number; queueLimit?: number } = {}): Engine {
  const engine = new Engine({ startThread: oddThread, ...limits });
  engines.push(engine);
  return engine;
}

/** What the stand-in thread is told to do travels where the scenario would. */
const order = (deed: string, value = 0) => ({ deed, value }) as unknown as Scenario;
const ask = async (engine: Engine, deed: string, value = 0) =>
  (await engine.run('plan', order(deed, value))) as unknown as { value: number; threadId: number };

afterEach(async () => {
  await Promise.all(engines.splice(0).map((engine) => engine.close()));
});

describe('Engine', () => {
  it('answers many jobs in the order asked, all from one thread', async () => {
    const engine = anEngine();
    const finished: number[] = [];
    const asked = Array.from({ length: 100 }, async (_, value) => {
      const answer = await ask(engine, 'answer', value);
      finished.push(answer.value);
      return answer.threadId;
    });
    const threads = new Set(await Promise.all(asked));
    expect(finished).toEqual(Array.from({ length: 100 }, (_, value) => value));
    expect(threads.size).toBe(1);
  });

  it('keeps its thread from one job to the next', async () => {
    const engine = anEngine();
    const first = await ask(engine, 'answer');
    const second = await ask(engine, 'answer');
    expect(second.threadId).toBe(first.threadId);
  });

  it('hands on what the planner refused, and goes on in the same thread', async () => {
    const engine = anEngine();
    const first = await ask(engine, 'answer');
    const refused = await ask(engine, 'refuse').catch((error: unknown) => error);
    expect(refused).toBeInstanceOf(AppError);
    expect(refused).toMatchObject({ code: 'plan-refused', message: 'No.' });
    expect((await ask(engine, 'answer')).threadId).toBe(first.threadId);
  });

  it.each(['crash', 'exit'])('loses one job by a %s; those behind it get a new thread', async (deed) => {
    const engine = anEngine();
    const before = await ask(engine, 'answer');
    const lost = ask(engine, deed).catch((error: unknown) => error);
    const after = ask(engine, 'answer', 7);
    expect(await lost).toBeInstanceOf(Error);
    expect(await lost).not.toBeInstanceOf(AppError);
    expect((await after).value).toBe(7);
    expect((await after).threadId).not.toBe(before.threadId);
  });

  it('ends a job over its limit as busy; the next one gets a new thread', async () => {
    const engine = anEngine({ jobLimit: 150 });
    const before = await ask(engine, 'answer');
    const stuck = ask(engine, 'hang').catch((error: unknown) => error);
    const after = ask(engine, 'answer', 8);
    expect(await stuck).toMatchObject({ code: 'engine-busy' });
    expect((await after).value).toBe(8);
    expect((await after).threadId).not.toBe(before.threadId);
  });

  it('counts the limit for each job alone, not for its time in the queue', async () => {
    const engine = anEngine({ jobLimit: 400 });
    await ask(engine, 'answer');
    const stuck = [ask(engine, 'hang'), ask(engine, 'hang')].map((job) => job.catch((error: unknown) => error));
    const last = await ask(engine, 'answer', 9);
    expect(last.value).toBe(9);
    for (const job of stuck) expect(await job).toMatchObject({ code: 'engine-busy' });
  });

  it('does not wait for ever for a thread that never loads', async () => {
    const silent = () => new Worker('setInterval(() => {}, 1000)', { eval: true });
    const engine = new Engine({ startThread: silent, loadLimit: 100 });
    engines.push(engine);
    await expect(engine.run('plan', order('answer'))).rejects.toMatchObject({ code: 'engine-busy' });
  });

  it('refuses a job when too many wait', async () => {
    const engine = anEngine({ queueLimit: 2 });
    const jobs = Array.from({ length: 4 }, (_, value) => ask(engine, 'answer', value).catch((error: unknown) => error));
    const outcomes = await Promise.all(jobs);
    expect(outcomes.slice(0, 3)).toMatchObject([{ value: 0 }, { value: 1 }, { value: 2 }]);
    expect(outcomes[3]).toMatchObject({ code: 'engine-busy' });
  });
});
