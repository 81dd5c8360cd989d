import { screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { SignInForm } from '@/components/start/sign-in-form';
import { leaveFor } from '@/lib/client/session';
import { renderWithWords } from '@/tests/support/with-words';

// Only leaving the page is replaced: jsdom cannot load another.
vi.mock('@/lib/client/session', { spy: true });

const answer = vi.fn<typeof fetch>();

beforeEach(() => {
  vi.mocked(leaveFor)
    .mockReset()
    .mockImplementation(() => undefined);
  answer.mockReset();
  vi.stubGlobal('fetch', answer);
});
afterEach(() => vi.unstubAllGlobals());

async function fillIn() {
  await userEvent.type(screen.getByRole('textbox', { name: 'E-mail address' }), 'ines@pool.example');
  await userEvent.type(screen.getByLabelText('Password'), ' eleven green frogs');
}

it('signs in by keyboard alone and goes where the server says', async () => {
  answer.mockResolvedValue(Response.json({ next: '/week' }));
  renderWithWords(<SignInForm />);
  await fillIn();
  await userEvent.keyboard('{Enter}');
  await waitFor(() => expect(leaveFor).toHaveBeenCalledWith('/week'));
  const [address, init] = answer.mock.calls[0] ?? [];
  expect(address).toBe('/api/sign-in');
  // A space in a password is part of it.
  expect(init?.body).toBe('{"email":"ines@pool.example","password":" eleven green frogs"}');
});

it('says at each field what is missing, asks nobody, and goes to the first', async () => {
  renderWithWords(<SignInForm />);
  await userEvent.click(screen.getByRole('button', { name: 'Sign in' }));
  expect(screen.getByRole('alert')).toHaveTextContent('2 fields need another look.');
  const email = screen.getByRole('textbox', { name: 'E-mail address' });
  expect(email).toHaveAccessibleDescription('This is still empty.');
  expect(screen.getByLabelText('Password')).toHaveAccessibleDescription('This is still empty.');
  expect(email).toHaveFocus();
  expect(answer).not.toHaveBeenCalled();

  await userEvent.type(email, 'ines');
  expect(email).not.toHaveAttribute('aria-invalid');
});

it('keeps everything that was typed when the answer is no', async () => {
  answer.mockResolvedValue(
    Response.json({ error: { code: 'wrong-sign-in', message: 'No.', problems: [] } }, { status: 401 }),
  );
  renderWithWords(<SignInForm />);
  await fillIn();
  await userEvent.click(screen.getByRole('button', { name: 'Sign in' }));
  expect(await screen.findByRole('alert')).toHaveTextContent(
    'This e-mail address and this password do not go together.',
  );
  expect(screen.getByRole('textbox', { name: 'E-mail address' })).toHaveValue('ines@pool.example');
  expect(screen.getByLabelText('Password')).toHaveValue(' eleven green frogs');
  expect(screen.getByRole('button', { name: 'Sign in' })).not.toHaveAttribute('aria-disabled');
});

it('says when there is no connection, and works again afterwards', async () => {
  answer
    .mockRejectedValueOnce(new TypeError('Failed to fetch'))
    .mockResolvedValueOnce(Response.json({ next: '/week' }));
  renderWithWords(<SignInForm />);
  await fillIn();
  await userEvent.click(screen.getByRole('button', { name: 'Sign in' }));
  expect(await screen.findByRole('alert')).toHaveTextContent('There is no connection to Wadewell.');
  await userEvent.click(screen.getByRole('button', { name: 'Sign in' }));
  await waitFor(() => expect(leaveFor).toHaveBeenCalledWith('/week'));
});

it('asks once however often it is pressed', async () => {
  let reply = (_response: Response) => {};
  answer.mockReturnValue(new Promise((resolve) => (reply = resolve)));
  renderWithWords(<SignInForm />);
  await fillIn();
  await userEvent.dblClick(screen.getByRole('button', { name: 'Sign in' }));
  await userEvent.click(screen.getByRole('button', { name: 'Signing in' }));
  screen.getByLabelText('Password').focus();
  await userEvent.keyboard('{Enter}');
  expect(answer).toHaveBeenCalledOnce();
  reply(Response.json({ next: '/week' }));
  await waitFor(() => expect(leaveFor).toHaveBeenCalledOnce());
  // The next page is loading: a press now would sign in twice.
  await userEvent.click(screen.getByRole('button', { name: 'Signing in' }));
  expect(answer).toHaveBeenCalledOnce();
});

it('shows the password to whoever asks, without losing it', async () => {
  renderWithWords(<SignInForm />);
  await userEvent.type(screen.getByLabelText('Password'), 'frogs');
  expect(screen.getByLabelText('Password')).toHaveAttribute('type', 'password');
  await userEvent.click(screen.getByRole('button', { name: 'Show the password' }));
  expect(screen.getByLabelText('Password')).toHaveAttribute('type', 'text');
  expect(screen.getByLabelText('Password')).toHaveValue('frogs');
});
