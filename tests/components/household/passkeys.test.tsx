import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { Passkeys } from '@/components/household/passkeys';
import type { PasskeyCreation, PasskeyList } from '@/lib/schemas/passkey';
import { renderWithWords } from '@/tests/support/with-words';

const setting = {
  ...{ timeZone: 'America/New_York', locale: 'en-US', demo: false },
  ...{ mayInvite: true, mayHandOver: true, mayReadAuditTrail: true },
};
const phone = { id: 'cGhvbmU', name: 'Phone', createdAt: '2026-07-05T02:00:00Z', lastUsedAt: null };
const asked: PasskeyCreation = {
  rp: { id: 'localhost', name: 'Wadewell' },
  user: { id: 'aW5lcw', name: 'ines@pool.example', displayName: 'Ines' },
  challenge: 'Y2hhbGxlbmdl',
  pubKeyCredParams: [{ type: 'public-key', alg: -7 }],
  timeout: 300_000,
  attestation: 'none',
  excludeCredentials: [],
  authenticatorSelection: { residentKey: 'required', requireResidentKey: true, userVerification: 'required' },
};

const server = vi.fn<(method: string, path: string) => Response>();
const create = vi.fn<() => Promise<unknown>>();
let list: PasskeyList;

beforeEach(() => {
  list = { passkeys: [], obstacle: null };
  create.mockReset();
  server.mockReset().mockImplementation((method, path) => {
    if (path === '/api/passkeys/options') return Response.json(asked);
    if (method === 'DELETE') list = { ...list, passkeys: [] };
    return Response.json(list);
  });
  vi.stubGlobal('fetch', (path: string, { method = 'GET' }: RequestInit = {}) => Promise.resolve(server(method, path)));
  vi.stubGlobal('PublicKeyCredential', function PublicKeyCredential() {});
  Object.defineProperty(navigator, 'credentials', { value: { create }, configurable: true });
});
afterEach(() => {
  vi.unstubAllGlobals();
  Reflect.deleteProperty(navigator, 'credentials');
});

async function fillIn() {
  await userEvent.click(await screen.findByText('Add a passkey'));
  await userEvent.type(screen.getByLabelText('What you call it'), 'Phone');
  await userEvent.type(screen.getByLabelText('Your password'), 'larch water evening');
  await userEvent.click(screen.getByRole('button', { name: 'Add it' }));
}

describe('what stops a device', () => {
  it.each([
    ['NotAllowedError', /^Nothing was confirmed on your device/],
    ['AbortError', /^Nothing was confirmed on your device/],
    ['InvalidStateError', /^This device has a passkey for your account already/],
    ['NotSupportedError', /^This browser or this device cannot do that/],
    ['ConstraintError', /^This browser or this device cannot do that/],
    ['SecurityError', /^Passkeys do not work under the address that you opened/],
    ['UnknownError', /^Your device could not finish/],
  ])('has a sentence for %s, and nothing that was typed is lost', async (name, sentence) => {
    create.mockRejectedValue(new DOMException('for developers', name));
    renderWithWords(<Passkeys setting={setting} />);
    await fillIn();
    expect(await screen.findByText(sentence)).toBeInTheDocument();
    expect(screen.getByLabelText('What you call it')).toHaveValue('Phone');
    expect(server).not.toHaveBeenCalledWith('POST', '/api/passkeys');
  });

  it('has one for a browser that knows no passkeys', async () => {
    vi.stubGlobal('PublicKeyCredential', undefined);
    renderWithWords(<Passkeys setting={setting} />);
    await fillIn();
    expect(await screen.findByText(/^This browser or this device cannot do that/)).toBeInTheDocument();
    expect(create).not.toHaveBeenCalled();
  });
});

it('says at its field that the password is another one', async () => {
  const message = 'This is not the password you have now.';
  const error = { code: 'invalid-input', message, problems: [{ path: 'password', message }] };
  renderWithWords(<Passkeys setting={setting} />);
  await screen.findByText('Add a passkey');
  server.mockReturnValue(Response.json({ error }, { status: 422 }));
  await fillIn();
  await waitFor(() => expect(screen.getByLabelText('Your password')).toHaveAccessibleDescription(message));
  expect(create).not.toHaveBeenCalled();
});

it('asks nobody before name and password are written', async () => {
  renderWithWords(<Passkeys setting={setting} />);
  await userEvent.click(await screen.findByText('Add a passkey'));
  await userEvent.click(screen.getByRole('button', { name: 'Add it' }));
  expect(screen.getAllByText('This is still empty.')).toHaveLength(2);
  expect(server).toHaveBeenCalledOnce();
});

it('shows each by name and by the days of the household, and forgets it after asking', async () => {
  list = {
    passkeys: [phone, { ...phone, id: 'ZGVzaw', name: 'Desk', lastUsedAt: '2026-07-06T12:00:00Z' }],
    obstacle: null,
  };
  renderWithWords(<Passkeys setting={setting} />);
  const rows = await screen.findAllByRole('listitem');
  expect(rows[0]).toHaveTextContent(/Phone.*July 4, 2026.*Not used yet/);
  expect(rows[1]).toHaveTextContent(/Desk.*July 4, 2026.*July 6, 2026/);
  const forget = within(rows[0]!).getByRole('button', { name: 'Forget this passkey' });
  expect(forget).toHaveAccessibleDescription('Phone');
  await userEvent.click(forget);
  expect(server).not.toHaveBeenCalledWith('DELETE', expect.anything());
  await userEvent.click(within(await screen.findByRole('dialog')).getByRole('button', { name: 'Forget it' }));
  await waitFor(() => expect(screen.queryByRole('listitem')).not.toBeInTheDocument());
  expect(server).toHaveBeenCalledWith('DELETE', '/api/passkeys/cGhvbmU');
});

it.each([
  ['number' as const, /opened by a number and not by a name.*http:\/\/localhost/],
  ['in-the-clear' as const, /begins with http\./],
])('offers none where there can be none (%s), and says why', async (obstacle, why) => {
  list = { passkeys: [phone], obstacle };
  renderWithWords(<Passkeys setting={setting} />);
  expect(await screen.findByText(why)).toBeInTheDocument();
  expect(screen.queryByText('Add a passkey')).not.toBeInTheDocument();
  expect(screen.getByRole('button', { name: 'Forget this passkey' })).toBeInTheDocument();
});

it('offers no eleventh', async () => {
  list = { passkeys: Array.from({ length: 10 }, (_, number) => ({ ...phone, id: `key-${number}` })), obstacle: null };
  renderWithWords(<Passkeys setting={setting} />);
  expect(await screen.findByText(/^You have 10 passkeys/)).toBeInTheDocument();
  expect(screen.queryByText('Add a passkey')).not.toBeInTheDocument();
});
