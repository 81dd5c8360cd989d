import { screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { LookRoundButton } from '@/components/start/look-round-button';
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

it('opens the demo once, however often it is pressed, and goes to its week', async () => {
  const answer = vi.fn<typeof fetch>(() => Promise.resolve(Response.json({ done: true })));
  vi.stubGlobal('fetch', answer);
  renderWithWords(<LookRoundButton />);
  await userEvent.dblClick(screen.getByRole('button', { name: 'Look round the demo household' }));
  await waitFor(() => expect(leaveFor).toHaveBeenCalledWith('/week'));
  expect(answer).toHaveBeenCalledOnce();
  expect(answer.mock.calls[0]?.[0]).toBe('/api/look-round');
});

it('says when it is full', async () => {
  const full = { error: { code: 'too-many-requests', message: 'Full', problems: [] } };
  vi.stubGlobal('fetch', () => Promise.resolve(Response.json(full, { status: 429 })));
  renderWithWords(<LookRoundButton />);
  await userEvent.click(screen.getByRole('button'));
  expect(await screen.findByRole('alert')).toHaveTextContent('Too many tries in a short time.');
  expect(screen.getByRole('button', { name: 'Look round the demo household' })).not.toHaveAttribute('aria-disabled');
});
