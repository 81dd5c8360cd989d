import { screen, within } from '@testing-library/react';
import { vi } from 'vitest';
import type { TryItAnswer, TryItQuestion } from '@/lib/client/try-it/messages';
import type { TryOutStart } from '@/lib/schemas/try-out';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { idOf } from '../../support/week-sheet';
import { showSheet } from '../week-sheet/show-sheet';

type Sent = { method: string; address: string; body: unknown };
type Answer = 'no answer' | { status: number; code: string };

/** A thread that keeps what it is asked; the test answers for it. */
class Thread {
  static opened: Thread[] = [];
  static get asked(): TryItQuestion[] {
    return Thread.opened.flatMap(({ asked }) => asked);
  }
  readonly asked: TryItQuestion[] = [];
  onmessage: ((event: MessageEvent<TryItAnswer>) => void) | null = null;
  onerror = null;
  constructor() {
    Thread.opened.push(this);
  }
  postMessage(question: TryItQuestion): void {
    this.asked.push(question);
  }
  terminate(): void {}
}

export function startOn(sheet: WeekSheet, overrides: Partial<TryOutStart> = {}): TryOutStart {
  return {
    planId: sheet.plan?.id ?? idOf(9),
    scenario: {},
    doses: [],
    evenings: sheet.days.map(({ day }) => ({ day, at: `${day}T19:40:00+02:00` })),
    mostTablets: 3,
    ...overrides,
  };
}

/**
 * The screen on a server that answers with this start, and with these answers to what is sent, in their order; it says yes
 * to whatever is left.
 */
export async function showTryIt(sheet: WeekSheet, start: TryOutStart | Answer, answers: Answer[] = []) {
  Thread.opened = [];
  vi.stubGlobal('Worker', Thread);
  const page = await showSheet(sheet);
  const ofSheet = vi.mocked(fetch).getMockImplementation()!;
  const state = { sheet, start };
  const sent: Sent[] = [];
  vi.mocked(fetch).mockImplementation(async (address, init) => {
    const method = init?.method ?? 'GET';
    if (!String(address).startsWith('/api/try-outs')) {
      page.asked.push(String(address));
      return method === 'GET' ? Response.json(state.sheet) : ofSheet(address, init);
    }
    if (method === 'GET') page.asked.push(String(address));
    else sent.push({ method, address: String(address), body: init?.body ? JSON.parse(String(init.body)) : undefined });
    const answer = method === 'GET' ? state.start : (answers.shift() ?? { done: true });
    if (answer === 'no answer') throw new TypeError('Failed to fetch');
    if ('status' in answer)
      return Response.json({ error: { code: answer.code, message: 'No.' } }, { status: answer.status });
    return Response.json(answer);
  });
  const section = within(screen.getByRole('heading', { name: 'Try it' }).closest('section')!);
  /** Turns the device to a phone's width; the next sheet that comes finds it so. */
  const turn = () => {
    const narrow = { matches: true, addEventListener() {}, removeEventListener() {} };
    vi.stubGlobal('matchMedia', () => narrow);
    window.dispatchEvent(new Event('visibilitychange'));
  };
  return { ...page, sent, state, section, turn, threads: Thread };
}
