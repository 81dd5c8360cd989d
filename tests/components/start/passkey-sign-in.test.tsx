import { screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { PasskeySignIn } from '@/components/start/passkey-sign-in';
import { leaveFor } from '@/lib/client/session';
import { renderWithWords } from '@/tests/support/with-words';

// Only leaving the page is replaced: jsdom cannot load another.
vi.mock('@/lib/client/session', { spy: true });

const answer = vi.fn<typeof fetch>();
const get = vi.fn<() => Promise<unknown>>();
const bytes = (text: string) => new TextEncoder().encode(text).buffer;
const signed = {
  id: 'a2V5',
  rawId: bytes('key'),
  type: 'public-key',
  response: {
    clientDataJSON: bytes('said'),
    authenticatorData: bytes('data'),
    signature: bytes('sign'),
    userHandle: bytes('ines'),
  },
  getClientExtensionResults: () => ({}),
};

beforeEach(() => {
  vi.mocked(leaveFor)
    .mockReset()
    .mockImplementation(() => undefined);
  answer.mockReset();
  get.mockReset();
  vi.stubGlobal('fetch', answer);
  vi.stubGlobal('PublicKeyCredential', function PublicKeyCredential() {});
  Object.defineProperty(navigator, 'credentials', { value: { get }, configurable: true });
  answer.mockResolvedValueOnce(
    Response.json({ rpId: 'localhost', challenge: 'YXNr', timeout: 300_000, userVerification: 'required' }),
  );
});
afterEach(() => {
  vi.unstubAllGlobals();
  Reflect.deleteProperty(navigator, 'credentials');
});

const press = () => userEvent.click(screen.getByRole('button', { name: 'Sign in with a passkey' }));

it('sends what the device signed, and goes where the server says', async () => {
  get.mockResolvedValue(signed);
  answer.mockResolvedValueOnce(Response.json({ next: '/week' }));
  renderWithWords(<PasskeySignIn />);
  await press();
  await waitFor(() => expect(leaveFor).toHaveBeenCalledWith('/week'));
  const [address, init] = answer.mock.calls[1] ?? [];
  expect(address).toBe('/api/sign-in/passkey');
  expect(JSON.parse(init?.body as string)).toEqual({
    id: 'a2V5',
    clientDataJSON: 'c2FpZA',
    authenticatorData: 'ZGF0YQ',
    signature: 'c2lnbg',
    userHandle: 'aW5lcw',
  });
});

it('says what the server says of a passkey that opens nothing', async () => {
  get.mockResolvedValue(signed);
  const message = 'This passkey does not open a sheet here. Sign in with your e-mail address and your password.';
  answer.mockResolvedValueOnce(
    Response.json({ error: { code: 'wrong-sign-in', message, problems: [] } }, { status: 401 }),
  );
  renderWithWords(<PasskeySignIn />);
  await press();
  expect(await screen.findByRole('alert')).toHaveTextContent(message);
  expect(screen.getByRole('button', { name: 'Sign in with a passkey' })).not.toHaveAttribute('aria-disabled');
  expect(leaveFor).not.toHaveBeenCalled();
});

it('says so when nothing was confirmed, and asks the server no further', async () => {
  get.mockRejectedValue(new DOMException('for developers', 'NotAllowedError'));
  renderWithWords(<PasskeySignIn />);
  await press();
  expect(await screen.findByRole('alert')).toHaveTextContent(/^Nothing was confirmed on your device/);
  expect(answer).toHaveBeenCalledOnce();
});
