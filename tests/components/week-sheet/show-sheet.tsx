import { act, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { vi } from 'vitest';
import { WeekSheetScreen } from '@/components/week-sheet/week-sheet-screen';
// What follows the page in a browser is here already, so that it stands as soon as it is asked for.
import '@/components/try-out/try-it';
import '@/components/ui/dialog-panel';
import '@/components/week-sheet/confirm-stop';
import '@/components/week-sheet/days-table';
import '@/components/week-sheet/end-event';
import '@/components/week-sheet/first-test';
import '@/components/week-sheet/hours-table';
import '@/components/week-sheet/margin';
import '@/components/week-sheet/other-amount';
import '@/components/week-sheet/report-event';
import '@/components/week-sheet/unsent-notice';
import '@/lib/client/checked-ticks';
import type { DoseTick } from '@/lib/schemas/plan-dose';
import { type WeekSheet, weekSheetSchema } from '@/lib/schemas/week-sheet';
import { renderWithWords } from '../../support/with-words';

type SentTick = { address: string; tick: DoseTick };
/** What the server answers to a tick: a sheet, an error with its status, or no answer at all. */
export type TickAnswer = WeekSheet | { status: number; code: string; message: string } | 'no answer';

// A whole page on a busy machine.
vi.setConfig({ testTimeout: 20_000 });

/** Gives the page a width, and its plots one when charts are to be drawn; jsdom lays nothing out by itself. */
function stubLayout(width: number, plot: number): void {
  vi.stubGlobal('matchMedia', (query: string) => ({
    matches: /max-width: 599/.test(query) && width < 600,
    addEventListener() {},
    removeEventListener() {},
  }));
  vi.stubGlobal(
    'ResizeObserver',
    class {
      observe() {}
      unobserve() {}
      disconnect() {}
    },
  );
  const box = { width: plot, height: 200, top: 0, left: 0, right: plot, bottom: 200, x: 0, y: 0 };
  vi.spyOn(HTMLElement.prototype, 'getBoundingClientRect').mockReturnValue({ ...box, toJSON: () => box });
}

/** Shows the screen on a server that answers with this sheet, and with these answers to ticks, in their order. */
export async function showSheet(
  sheet: WeekSheet,
  {
    width = 1440,
    plot = 0,
    start,
    answers = [],
  }: { width?: number; plot?: number; start?: string; answers?: TickAnswer[] } = {},
) {
  weekSheetSchema.parse(sheet);
  stubLayout(width, plot);
  const sent: SentTick[] = [];
  const asked: string[] = [];
  vi.stubGlobal(
    'fetch',
    vi.fn(async (address: string, init?: RequestInit) => {
      if (init?.method !== 'POST') {
        asked.push(address);
        return Response.json(sheet);
      }
      sent.push({ address, tick: JSON.parse(String(init.body)) as DoseTick });
      const answer = answers.shift();
      if (answer === undefined || answer === 'no answer') throw new TypeError('Failed to fetch');
      if ('status' in answer)
        return Response.json({ error: { code: answer.code, message: answer.message } }, { status: answer.status });
      return Response.json(answer);
    }),
  );
  const page = renderWithWords(<WeekSheetScreen start={start} />);
  await screen.findByRole('heading', { level: 1 });
  await act(() => new Promise<void>((settled) => setTimeout(settled)));
  return { ...page, sent, asked, user: userEvent.setup() };
}
