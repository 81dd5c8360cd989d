import userEvent from '@testing-library/user-event';
import { vi } from 'vitest';
// What the index fetches later is there from the start.
import '@/components/situations/open-situation-view';
import { SituationIndexScreen } from '@/components/situations/situation-index-screen';
import { SituationScreen } from '@/components/situations/situation-screen';
import type { SituationHousehold } from '@/components/situations/situation-household';
import type { HouseNotes } from '@/lib/schemas/house-note';
import type { SituationKind, Situations } from '@/lib/schemas/situation';
import { renderWithWords } from '../../support/with-words';

export type Sent = { address: string; method: string; body: unknown };
/** What the server answers to a change, or that it does not. */
export type Answer = Situations | Promise<Situations> | 'no answer';

/** What the household has written down of whom to call. */
const noted: HouseNotes = {
  notes: { professionalName: 'Pond and Sons', professionalPhone: '555 0100' },
  updatedAt: null,
  updatedBy: null,
};

const household: SituationHousehold = {
  ...{ timeZone: 'Europe/Madrid', locale: 'en-GB', unitSystem: 'metric' },
  mayOpen: true,
};

/** Shows the page on a server that knows these situations; `width`: of the page, `plot`: of its charts [px]. */
export function showSituations(
  known: Situations | Promise<Situations>,
  {
    kind,
    answers = [],
    width = 1440,
    plot = 0,
    ...changes
  }: Partial<SituationHousehold> & { kind?: SituationKind; answers?: Answer[]; width?: number; plot?: number } = {},
) {
  const sent: Sent[] = [];
  vi.stubGlobal('matchMedia', () => ({ matches: width < 600, addEventListener() {}, removeEventListener() {} }));
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
  vi.stubGlobal('fetch', async (address: string, init?: RequestInit) => {
    const method = init?.method ?? 'GET';
    if (address === '/api/house-notes') return Response.json(noted);
    if (method === 'GET') return Response.json(await known);
    sent.push({ address, method, body: JSON.parse(String(init?.body)) });
    const answer = answers.shift() ?? 'no answer';
    if (answer === 'no answer') throw new TypeError('Failed to fetch');
    return Response.json(await answer);
  });
  const page = renderWithWords(
    kind === undefined ? (
      <SituationIndexScreen household={{ ...household, ...changes }} initial={undefined} />
    ) : (
      <SituationScreen household={{ ...household, ...changes }} kind={kind} />
    ),
  );
  return { ...page, sent, user: userEvent.setup() };
}

/** Whether each of these stands after the one before it. */
export function inOrder(parts: readonly (Element | null)[]): boolean {
  return parts.every((part, index) => {
    const before = parts[index - 1];
    if (part === null || before === null) return false;
    return before === undefined || Boolean(before.compareDocumentPosition(part) & Node.DOCUMENT_POSITION_FOLLOWING);
  });
}
