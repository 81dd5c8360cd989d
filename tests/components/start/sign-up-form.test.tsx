import { fireEvent, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { SignUpForm } from '@/components/start/sign-up-form';
import { leaveFor } from '@/lib/client/session';
import { signUpSchema } from '@/lib/schemas/account';
import { renderWithWords } from '@/tests/support/with-words';

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

const field = (name: string) => screen.getByRole('textbox', { name });

async function fillIn() {
  await userEvent.type(field('Your name'), 'Ines');
  await userEvent.type(field('E-mail address'), 'ines@pool.example');
  await userEvent.type(screen.getByLabelText('Password'), 'eleven green frogs');
  await userEvent.type(field('Name of the pool'), 'Alder Row');
}

const press = () => userEvent.click(screen.getByRole('button', { name: 'Start your sheet' }));

it('sends what the schema of the route takes, with the zone and the language of this browser', async () => {
  answer.mockResolvedValue(Response.json({ next: '/first-run' }));
  renderWithWords(<SignUpForm likelyUnits="metric" shortestPassword={10} />);
  await fillIn();
  await userEvent.click(screen.getByText('US'));
  await press();
  await waitFor(() => expect(leaveFor).toHaveBeenCalledWith('/first-run'));
  const body: unknown = JSON.parse(String(answer.mock.calls[0]?.[1]?.body));
  expect(signUpSchema.parse(body)).toEqual({
    name: 'Ines',
    email: 'ines@pool.example',
    password: 'eleven green frogs',
    householdName: 'Alder Row',
    timeZone: expect.stringMatching(/^Asia\/Kath?mandu$/),
    unitSystem: 'us',
    locale: 'en-US',
  });
});

it('puts each refusal of the server at its field, goes to the first, and keeps the rest', async () => {
  const problems = [
    { path: 'password', message: 'This password is one of those that are tried first. Choose another.' },
    { path: 'email', message: 'There is an account with this e-mail already. Sign in instead.' },
  ];
  answer.mockResolvedValue(
    Response.json({ error: { code: 'invalid-input', message: 'Look.', problems } }, { status: 422 }),
  );
  renderWithWords(<SignUpForm likelyUnits="us" shortestPassword={10} />);
  await fillIn();
  await press();
  expect(await screen.findByRole('alert')).toHaveTextContent('2 fields need another look.');
  expect(field('E-mail address')).toHaveAccessibleDescription(problems[1]?.message);
  expect(field('E-mail address')).toHaveFocus();
  expect(screen.getByLabelText('Password')).toHaveAccessibleDescription(problems[0]?.message);
  expect(field('Your name')).toHaveValue('Ines');
  expect(field('Name of the pool')).toHaveValue('Alder Row');
  expect(screen.getByRole('radio', { name: /^US/ })).toBeChecked();
});

it('names an address that cannot be one before anyone is asked', async () => {
  renderWithWords(<SignUpForm likelyUnits="us" shortestPassword={10} />);
  await fillIn();
  await userEvent.clear(field('E-mail address'));
  await userEvent.type(field('E-mail address'), 'ines at pool');
  await press();
  expect(field('E-mail address')).toHaveAccessibleDescription('An e-mail address looks like name@example.org.');
  expect(answer).not.toHaveBeenCalled();
});

it('says how long a password has to be, and once somebody begins, in which zone hours are told', async () => {
  renderWithWords(<SignUpForm likelyUnits="us" shortestPassword={10} />);
  expect(screen.getByLabelText('Password')).toHaveAccessibleDescription(/^At least 10 characters\./);
  const measures = screen.getByRole('group', { name: 'Measures' });
  expect(measures).not.toHaveAccessibleDescription();
  fireEvent.pointerDown(document.body);
  await waitFor(() => expect(measures).toHaveAccessibleDescription(/^Hours are told in Asia\/Kath?mandu\.$/));
});
