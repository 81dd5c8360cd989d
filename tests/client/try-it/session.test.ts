import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { TryItAnswer, TryItQuestion } from '@/lib/client/try-it/messages';
import { TryItSession, type TryItThread } from '@/lib/client/try-it/session';
import { type TryOutStart, tryOutChangesSchema } from '@/lib/schemas/try-out';

const start: TryOutStart = { planId: 'p', scenario: {}, doses: [], evenings: [], mostTablets: 0 };
const swimmers = (count: number) =>
  tryOutChangesSchema.parse({ swimmers: [{ day: '2026-07-11', swimmerHours: count }] });

/** Threads that keep what they are asked, to be answered by the test. */
function aSession() {
  const threads: { asked: TryItQuestion[]; thread: TryItThread; say: (answer: TryItAnswer) => void }[] = [];
  const open = () => {
    const asked: TryItQuestion[] = [];
    const thread: TryItThread = {
      onmessage: null,
      onerror: null,
      postMessage: (question) => asked.push(question),
      terminate: vi.fn(),
    };
    const say = (data: TryItAnswer) => thread.onmessage?.(new MessageEvent('message', { data }));
    threads.push({ asked, thread, say });
    return thread;
  };
  const heard = { course: vi.fn(), advice: vi.fn(), failed: vi.fn(), stopped: vi.fn() };
  return { session: new TryItSession(start, heard, open), threads, heard };
}
const course = (number: number): TryItAnswer => ({
  ...{ kind: 'course', number, likely: false, facts: [] },
  ...{ plan: { at: [], levels: [], jumps: [] }, tried: { at: [], levels: [], jumps: [] } },
});
const advice = (number: number): TryItAnswer => ({ kind: 'advice', number, advice: { code: 'refused' } });
const numbers = (asked: readonly TryItQuestion[]) => asked.flatMap((each) => ('number' in each ? [each.number] : []));

beforeEach(() => void vi.useFakeTimers());
afterEach(() => void vi.useRealTimers());

describe('a session of trying', () => {
  it('asks at once for a course, and for a plan when nothing has been changed for a while', () => {
    const { session, threads } = aSession();
    session.try(swimmers(7));
    expect(threads.map(({ asked }) => asked.map(({ kind }) => kind))).toEqual([['start', 'course']]);
    vi.advanceTimersByTime(249);
    expect(threads).toHaveLength(1);
    vi.advanceTimersByTime(1);
    expect(threads[1]?.asked.map(({ kind }) => kind)).toEqual(['start', 'advice']);
  });

  it('plans once for many quick inputs', () => {
    const { session, threads } = aSession();
    for (const count of [7, 8, 9]) {
      session.try(swimmers(count));
      vi.advanceTimersByTime(100);
    }
    vi.advanceTimersByTime(250);
    expect(numbers(threads[0]!.asked)).toEqual([1, 2, 3]);
    expect(numbers(threads[1]!.asked)).toEqual([3]);
  });

  it('hears the newest question only', () => {
    const { session, threads, heard } = aSession();
    session.try(swimmers(7));
    session.try(swimmers(8));
    threads[0]!.say(course(1));
    expect(heard.course).not.toHaveBeenCalled();
    threads[0]!.say(course(2));
    expect(heard.course).toHaveBeenCalledTimes(1);
    session.stop();
    threads[0]!.say(course(2));
    expect(heard.course).toHaveBeenCalledTimes(1);
  });

  it('keeps the planning thread to one plan, and goes on with the newest', () => {
    const { session, threads, heard } = aSession();
    session.try(swimmers(7));
    vi.advanceTimersByTime(250);
    for (const count of [8, 9]) {
      session.try(swimmers(count));
      vi.advanceTimersByTime(250);
    }
    expect(numbers(threads[1]!.asked)).toEqual([1]);
    threads[1]!.say(advice(1));
    expect(heard.advice).not.toHaveBeenCalled();
    expect(numbers(threads[1]!.asked)).toEqual([1, 3]);
    threads[1]!.say(advice(3));
    expect(heard.advice).toHaveBeenCalledTimes(1);
  });

  it('says that it failed, and ends both threads when it is closed', () => {
    const { session, threads, heard } = aSession();
    session.try(swimmers(7));
    vi.advanceTimersByTime(250);
    threads[0]!.say({ kind: 'failed', number: 1 });
    expect(heard.failed).toHaveBeenCalledTimes(1);
    session.close();
    for (const { thread } of threads) expect(thread.terminate).toHaveBeenCalledTimes(1);
  });
});
