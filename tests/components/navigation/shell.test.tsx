import { useQueryClient } from '@tanstack/react-query';
import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { usePathname } from 'next/navigation';
import { beforeEach, expect, it, vi } from 'vitest';
// It follows the page in a browser.
import '@/components/navigation/more-sheet';
import '@/components/ui/sheet-panel';
import { HouseholdShell } from '@/components/navigation/household-shell';
import { SignedOutShell } from '@/components/navigation/signed-out-shell';
import { situationsOptions } from '@/lib/client/situations';
import type { Situations } from '@/lib/schemas/situation';
import { aSituations } from '@/tests/support/situations';
import { renderWithWords } from '@/tests/support/with-words';

vi.mock('next/navigation', () => ({ usePathname: vi.fn(() => '/week') }));

const frame = {
  householdName: 'Alder Row',
  you: { name: 'Ines', role: 'owner' },
  people: [
    { name: 'Ines', role: 'owner' },
    { name: 'Joost', role: 'caretaker' },
    { name: 'Kit', role: 'viewer' },
  ],
} as const;

const at = (path: string) => vi.mocked(usePathname).mockReturnValue(path);
beforeEach(() => at('/week'));

/** Where every link of the page leads, without what follows a hash. */
const targets = () =>
  screen.getAllByRole('link', { hidden: true }).map((link) => link.getAttribute('href')?.split('#')[0]);

it('leads only to places that exist, and to the emergency card from bar and head', () => {
  renderWithWords(<HouseholdShell frame={frame}>the sheet</HouseholdShell>);
  expect(new Set(targets())).toEqual(
    new Set(['', '/week', '/test', '/situations', '/rounds', '/pool', '/household', '/help', '/help/emergency']),
  );
  expect(targets().filter((target) => target === '/help/emergency')).toHaveLength(2);
});

it('marks the place where one is, in the bar and in the tabs', () => {
  at('/test');
  renderWithWords(<HouseholdShell frame={frame}>the test</HouseholdShell>);
  const marked = screen.getAllByRole('link', { current: 'page' });
  expect(marked.map((link) => link.textContent)).toEqual(['Enter a test', 'Test']);
  expect(screen.getByRole('button', { name: 'More' })).not.toHaveClass('font-strong');
});

it.each(['/help', '/help/safety', '/help/emergency', '/pool/size', '/house/sheet', '/situations/accident'])(
  'keeps More marked at %s',
  (path) => {
    at(path);
    renderWithWords(<HouseholdShell frame={frame}>help</HouseholdShell>);
    expect(screen.getByRole('button', { name: 'More' })).toHaveClass('font-strong');
  },
);

it('marks the emergency card apart from Help', () => {
  at('/help/emergency');
  renderWithWords(<HouseholdShell frame={frame}>the card</HouseholdShell>);
  expect(screen.getAllByRole('link', { current: 'page' }).map((link) => link.textContent)).toEqual(['Emergency']);
});

it('opens More with trouble first, says who you are, and closes when one goes elsewhere', async () => {
  const { rerender } = renderWithWords(<HouseholdShell frame={frame}>the sheet</HouseholdShell>);
  await userEvent.click(screen.getByRole('button', { name: 'More' }));
  const more = await screen.findByRole('dialog', { name: 'More' });
  expect(within(more).getAllByRole('link')[0]).toHaveTextContent('Emergency card');
  expect(within(more).getByRole('link', { name: /^Situations/ })).toHaveAttribute('href', '/situations');
  expect(within(more).getByRole('link', { name: /^House sheet/ })).toHaveAttribute('href', '/house');
  expect(more).toHaveTextContent('You are Ines, owner');
  expect(within(more).getByRole('button', { name: 'Sign out' })).toBeInTheDocument();

  at('/help');
  rerender(<HouseholdShell frame={frame}>help</HouseholdShell>);
  await waitFor(() => expect(screen.queryByRole('dialog')).not.toBeInTheDocument());
});

it('says in words what the faces show', () => {
  renderWithWords(<HouseholdShell frame={frame}>the sheet</HouseholdShell>);
  expect(screen.getAllByRole('img', { name: '3 people in this household' })).toHaveLength(2);
  expect(screen.getAllByText('Ines, owner').length).toBeGreaterThan(0);
});

it('lets the Tab key skip the bars', async () => {
  renderWithWords(<HouseholdShell frame={frame}>the sheet</HouseholdShell>);
  await userEvent.tab();
  const skip = screen.getByRole('link', { name: 'Skip to the content' });
  expect(skip).toHaveFocus();
  expect(document.querySelector(skip.getAttribute('href') ?? '')).toBe(screen.getByRole('main'));
});

it('offers the way in to a stranger and the way back to a member', () => {
  at('/');
  const { rerender } = renderWithWords(<SignedOutShell>start</SignedOutShell>);
  expect(screen.getByRole('link', { name: 'Sign in' })).toHaveAttribute('href', '/sign-in');
  expect(screen.getByRole('link', { name: 'Start your sheet' })).toHaveAttribute('href', '/sign-up');
  rerender(<SignedOutShell signedIn>start</SignedOutShell>);
  expect(screen.getByRole('link', { name: 'To your sheet' })).toHaveAttribute('href', '/week');
  expect(screen.getByRole('button', { name: 'Sign out' })).toBeInTheDocument();
  expect(screen.queryByRole('link', { name: 'Sign in' })).not.toBeInTheDocument();
});

it('rings a one beside Situations while one is open, from what this browser knows already', () => {
  renderWithWords(<HouseholdShell frame={frame}>the sheet</HouseholdShell>);
  const place = screen.getByRole('link', { name: 'Situations' });
  expect(place).toHaveAttribute('href', '/situations');
  expect(place).toHaveTextContent(/^Situations$/);
});

it('counts the open one', () => {
  renderWithWords(
    <Known situations={aSituations({ kind: 'drain-cover' })}>
      <HouseholdShell frame={frame}>the sheet</HouseholdShell>
    </Known>,
  );
  expect(screen.getByRole('link', { name: 'Situations, 1 open' })).toBeInTheDocument();
});

function Known({ situations, children }: { situations: Situations; children: React.ReactNode }) {
  useQueryClient().setQueryData(situationsOptions().queryKey, situations);
  return children;
}
