import { screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { SignOutButton } from '@/components/navigation/sign-out-button';
import { leaveFor } from '@/lib/client/session';
import { renderWithWords } from '@/tests/support/with-words';

vi.mock('@/lib/client/session', { spy: true });

beforeEach(
  () =>
    void vi
      .mocked(leaveFor)
      .mockReset()
      .mockImplementation(() => undefined),
);
afterEach(() => vi.unstubAllGlobals());

it('signs out once and leaves for the start page', async () => {
  const answer = vi.fn<typeof fetch>(() => Promise.resolve(Response.json({ done: true })));
  vi.stubGlobal('fetch', answer);
  renderWithWords(<SignOutButton />);
  await userEvent.dblClick(screen.getByRole('button', { name: 'Sign out' }));
  await waitFor(() => expect(leaveFor).toHaveBeenCalledWith('/'));
  expect(answer).toHaveBeenCalledOnce();
});

it('stays and says so when the server does not answer', async () => {
  vi.stubGlobal('fetch', () => Promise.reject(new TypeError('Failed to fetch')));
  renderWithWords(<SignOutButton />);
  await userEvent.click(screen.getByRole('button', { name: 'Sign out' }));
  expect(await screen.findByRole('alert')).toHaveTextContent('There is no connection to Wadewell.');
  expect(leaveFor).not.toHaveBeenCalled();
});

it('says once that something is not sent yet, and goes when it is pressed again', async () => {
  localStorage.setItem('wadewell.unsent-ticks.ines', '[{"tick":1}]');
  const answer = vi.fn<typeof fetch>(() => Promise.resolve(Response.json({ done: true })));
  vi.stubGlobal('fetch', answer);
  renderWithWords(<SignOutButton />);
  await userEvent.click(screen.getByRole('button', { name: 'Sign out' }));
  expect(await screen.findByRole('alert')).toHaveTextContent('has not been sent yet');
  expect(answer).not.toHaveBeenCalled();
  await userEvent.click(screen.getByRole('button', { name: 'Sign out' }));
  await waitFor(() => expect(leaveFor).toHaveBeenCalledWith('/'));
  expect(localStorage.getItem('wadewell.unsent-ticks.ines')).toBeNull();
});
