import { screen, waitFor, within } from '@testing-library/react';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { ReadingSettingProvider } from '@/components/readings/reading-setting';
import { SavedTest } from '@/components/readings/saved-test';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { household } from '@/tests/components/readings/render-test';
import { showSheet } from '@/tests/components/week-sheet/show-sheet';
import { aWeekSheet, idOf } from '@/tests/support/week-sheet';
import { renderWithWords } from '@/tests/support/with-words';
import { rules, rulesOnScreen } from './rules';

beforeEach(() => localStorage.clear());
afterEach(() => {
  vi.restoreAllMocks();
  vi.unstubAllGlobals();
});

const standing = /^Before anyone goes in: you can see the bottom drain and its cover is whole/;
const phone = { width: 390 };
const thursday = idOf(103);
/** An hour before the granules of Thursday. */
const due = (change: Partial<PlanDose> = {}, me: Partial<WeekSheet['me']> = {}): WeekSheet => {
  const sheet = aWeekSheet({ now: ['2026-07-09', '18:30'] });
  const doses = sheet.doses.map((dose) => (dose.id === thursday ? { ...dose, ...change } : dose));
  return { ...sheet, doses, me: { ...sheet.me, ...me } };
};
const fine = (adviseDailyCheck: boolean): WeekSheet => {
  const until = '2026-07-08T19:10:00+02:00';
  return aWeekSheet({}, { verdict: { state: 'fine', reasons: [], until, adviseDailyCheck } });
};
const saved = (sheet: WeekSheet) =>
  renderWithWords(
    <ReadingSettingProvider household={household}>
      <SavedTest
        reading={sheet.readings.at(-1)!}
        week={{ sheet, doses: sheet.doses }}
        before={[]}
        onCorrect={() => undefined}
      />
    </ReadingSettingProvider>,
  );
const says = (words: RegExp) =>
  screen.getByText((_, element) => element?.tagName === 'P' && words.test(element.textContent));
const putsItIn = /I am adding it now|Mark as added|Other amount/;

const rows: readonly [of: (typeof rulesOnScreen)[number], says: string, holds: () => Promise<void>][] = [
  [
    'standing',
    'stands under a Fine on a desk, on a phone and after saving a test',
    async () => {
      const desk = await showSheet(fine(false));
      expect(says(standing)).toBeInTheDocument();
      desk.unmount();
      const small = await showSheet(fine(false), phone);
      expect(says(standing)).toBeInTheDocument();
      small.unmount();
      saved(fine(false));
      expect(says(standing)).toBeInTheDocument();
    },
  ],
  [
    'daily-check',
    'is said under a Fine that advises it, on the sheet and after saving, and under no other',
    async () => {
      const advice = /^Health authorities advise a check on every day of swimming: one minute\.$/;
      const advised = await showSheet(fine(true));
      expect(screen.getByText(advice)).toBeInTheDocument();
      advised.unmount();
      const not = await showSheet(fine(false));
      expect(screen.queryByText(advice)).toBeNull();
      not.unmount();
      saved(fine(true));
      expect(screen.getByText(advice)).toBeInTheDocument();
    },
  ],
  [
    'after-saving',
    'the swim state comes before everything that changed in the plan',
    async () => {
      const { container } = saved(fine(false));
      const text = container.textContent;
      const places = ['The water is fine for swimming until', 'What changed', 'You entered'].map((part) =>
        text.indexOf(part),
      );
      expect(places).not.toContain(-1);
      expect(places).toEqual(places.toSorted((a, b) => a - b));
      expect(screen.getAllByRole('heading')[0]).toHaveTextContent(/^The water is fine for swimming until/);
    },
  ],
  [
    'three-hours',
    'earlier the card reads See the steps, and offers nothing that puts the dose in',
    async () => {
      const { user } = await showSheet(aWeekSheet());
      await user.click(screen.getAllByRole('button', { name: 'See the steps' })[0]!);
      const dialog = await screen.findByRole('dialog');
      expect(within(dialog).queryByRole('button', { name: putsItIn })).toBeNull();
      expect(dialog).toHaveTextContent(/From 16:40 tomorrow this becomes/);
    },
  ],
  [
    'other-amount',
    'another amount takes two taps: nothing is sent before the second',
    async () => {
      const { user, sent } = await showSheet(due(), { answers: [due()] });
      await user.click(screen.getByRole('button', { name: 'Steps, other amount' }));
      const dialog = await screen.findByRole('dialog');
      await user.click(within(dialog).getByRole('button', { name: 'Other amount' }));
      await user.type(within(dialog).getByLabelText('How much went in?'), '50');
      await user.click(within(dialog).getByRole('button', { name: 'Continue' }));
      expect(sent).toEqual([]);
      await user.click(within(dialog).getByRole('button', { name: 'Yes, 50 g went in' }));
      await waitFor(() => expect(sent[0]?.tick).toMatchObject({ action: 'changed', amount: 50 }));
    },
  ],
  [
    'claim',
    'somebody who is adding it shows to all as {name} has it',
    async () => {
      const page = await showSheet(due({ claimedBy: 'Tom' }));
      expect(screen.getAllByText('Tom has it').length).toBeGreaterThan(0);
      page.unmount();
      await showSheet(due({ claimedBy: 'Tom' }), phone);
      expect(screen.getAllByText('Tom has it').length).toBeGreaterThan(0);
    },
  ],
  [
    'handles',
    'whoever does not handle chemicals sees no amount as an action, on a desk or a phone',
    async () => {
      for (const me of [{ handlesChemicals: false }, { role: 'viewer' as const, handlesChemicals: false }])
        for (const width of [1440, 390]) {
          const page = await showSheet(due({}, me), { width });
          expect(screen.queryByRole('button', { name: putsItIn })).toBeNull();
          expect(screen.queryByRole('checkbox', { name: /added/ })).toBeNull();
          page.unmount();
        }
      const page = await showSheet(due(), phone);
      expect(screen.getAllByRole('button', { name: putsItIn }).length).toBeGreaterThan(0);
      page.unmount();
    },
  ],
  [
    'stop-by-name',
    'while the Stop is unread its button has the person’s name; read, the caution stands without a button',
    async () => {
      const unread = await showSheet(due({ stopDue: true }), phone);
      expect(screen.getByRole('button', { name: 'Ines: I have read this and will do so' })).toBeInTheDocument();
      expect(screen.queryByRole('button', { name: putsItIn })).toBeNull();
      unread.unmount();
      await showSheet(due({ stopDue: false }), phone);
      expect(screen.queryByRole('button', { name: /I have read this/ })).toBeNull();
      expect(screen.getAllByText(/Never let two different pool products touch/).length).toBeGreaterThan(0);
    },
  ],
];

it.each(rows)('%s: %s', async (_of, _says, holds) => holds());

it('has a row for every rule that is about a drawn page', () => {
  expect(rulesOnScreen.filter((id) => !rows.some(([of]) => of === id))).toEqual([]);
  expect(Object.keys(rules)).toEqual(expect.arrayContaining([...rulesOnScreen]));
});
