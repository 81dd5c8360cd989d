import { expect, it, vi } from 'vitest';
import type { SampleAnswer } from '@/lib/client/sample-week/messages';
import { SampleSession, type SampleThread } from '@/lib/client/sample-week/session';
import { type SampleWater, type SampleWeek, startingSample } from '@/lib/schemas/sample-water';

const waterOf = (volume: number): SampleWater => ({ ...startingSample, volume });

function start() {
  const threads: (SampleThread & { postMessage: ReturnType<typeof vi.fn> })[] = [];
  const heard = vi.fn<(answer: SampleAnswer) => void>();
  const session = new SampleSession(heard, () => {
    const thread = { postMessage: vi.fn(), terminate: vi.fn(), onmessage: null, onerror: null };
    threads.push(thread);
    return thread;
  });
  const answer = (volume: number) =>
    threads.at(-1)!.onmessage?.({ data: { week: { water: waterOf(volume) } as SampleWeek } } as MessageEvent);
  const asked = () =>
    threads.flatMap(({ postMessage }) => postMessage.mock.calls.map(([water]: SampleWater[]) => water?.volume));
  return { session, threads, heard, answer, asked };
}

it('loads no engine before it is asked', () => {
  const { threads } = start();
  expect(threads).toHaveLength(0);
});

it('works on one question and keeps only the newest of those that wait', () => {
  const { session, answer, asked } = start();
  for (const volume of [20, 25, 30, 35]) session.ask(waterOf(volume));
  expect(asked()).toEqual([20]);
  answer(20);
  expect(asked()).toEqual([20, 35]);
  answer(35);
  expect(asked()).toEqual([20, 35]);
});

it('says what failed, and asks a new engine the next time', () => {
  const { session, threads, heard, asked } = start();
  session.ask(waterOf(20));
  threads[0]!.onerror?.({} as ErrorEvent);
  expect(heard).toHaveBeenCalledWith({ failed: waterOf(20) });
  session.ask(waterOf(25));
  expect(threads).toHaveLength(2);
  expect(asked()).toEqual([20, 25]);
});

it('lets its thread go', () => {
  const { session, threads } = start();
  session.ask(waterOf(20));
  session.close();
  expect(threads[0]!.terminate).toHaveBeenCalledOnce();
});
