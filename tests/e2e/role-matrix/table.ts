/**
 * Who may what: a row for every page of the build, and for every method that a route of it answers. What the build has and
 * this table has not fails the journey by its name, and so does a row of what is gone.
 *
 * **A new page**: a row in `pageRows`: its address as the folders have it, who sees it ('anybody', or 'everyone in the
 * household': the others are sent to sign in), and `at`, a real address, where it has a gap. Where neither fits, `except`.
 *
 * **A new route**: a row in `routeRows` for each method: `call` as the folders have it, and `for`, the group to whom it is
 * allowed, written from product.md ('People and roles') and not from the code.
 * - `changes`: the table that a successful call writes to. Without it nothing at all may be written, whoever asks.
 * - `id`: the thing of the first household that stands for the gap in the address. It makes a stranger expect 404.
 * - `send`: a body that is sound for whoever may, so that a refusal is about the role and nothing else. `query` and `bytes` for
 *   what is no JSON. Things that only exist in the first household are in `World`; make a new kind of thing in `furnish`.
 * - `inBody`: the body names a thing of the first household: a stranger is refused with 404.
 * - `except`: an asker whose answer differs from the group's, with the reason beside it.
 * - `unchangedFor`: who may call it and changes nothing by it. `before`: SQL that sets the scene. `note`: tells two rows of one
 *   call apart. `tells`: the answer is meant to name the household to whoever asks.
 *
 * Each question starts from the same rows: whatever one has written is taken back before the next.
 */
import { createHmac, randomUUID } from 'node:crypto';
import { fullTest } from '../support/households';
import { serverSecret } from '../support/server';
import type { Answer, Answers, Asker, Group, Member } from './askers';
import { isCarer, isMember, password, secret, strangersWord, when, type World } from './world';

type Ask<Value> = (world: World, asker: Asker) => Value;

export type PageRow = {
  page: string;
  for: 'anybody' | 'everyone in the household';
  at?: Ask<string>;
  except?: Partial<Answers>;
  tells?: true;
  /** Of a page that stands for a fault. */
  status?: 404 | 500;
};

export type RouteRow = {
  call: `${'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE'} /api/${string}`;
  note?: string;
  for: Group;
  id?: Ask<string>;
  query?: Ask<string>;
  send?: Ask<unknown>;
  bytes?: Ask<Uint8Array<ArrayBuffer>>;
  inBody?: true;
  changes?: string;
  unchangedFor?: readonly Asker[];
  except?: Partial<Answers>;
  before?: string;
  tells?: true;
  status?: 404;
};

/** There are none: everything goes through routes. One that comes has to be written down here, by what the build calls it. */
export const actionRows: readonly string[] = [];

/** The first run is over for all of them; whoever belongs nowhere signs in first. */
const firstRunIsOver = {
  viewer: 'to /week',
  caretaker: 'to /week',
  'dosing caretaker': 'to /week',
  owner: 'to /week',
  stranger: 'to /week',
} as const;

/** A link in a mail to the viewer, as it stands in the database once `before` has put it there. */
const linkToken = 'a-link-of-the-role-matrix-and-of-nothing-00';
const mailed = (page: 'confirm' | 'reset', purpose: string) => `insert into account_links
  (token_digest, person_id, purpose, email, created_at, expires_at)
  select '${createHmac('sha256', serverSecret).update(`${page} ${linkToken}`).digest('base64url')}', id, '${purpose}', email,
    created_at, created_at + ${100 * 24 * 3_600_000} from people where name = 'Vera ${secret}'`;

/** A passkey for each of them, called after their address. */
const passkeysOfAll = `insert into passkeys (id, person_id, public_key, counter, transports, name, backed_up, created_at)
  select replace(replace(email, '@', '_'), '.', '_'), id, x'00', 0, '[]', 'Telephone', 0, created_at from people
  where email is not null`;
const passkeyOf = (world: World, asker: Member) => world.people[asker].email.replaceAll(/[@.]/g, '_');

const toMembers = <Value extends Answer>(answer: Value) => ({
  ...{ viewer: answer, caretaker: answer, 'dosing caretaker': answer },
  ...{ owner: answer, stranger: answer, 'expired member': answer },
});
/** A thing of the viewer alone. */
const toTheViewerAlone = { ...toMembers(404), viewer: 'done' } as const;
/** The server of these tests is opened by a number. */
const noPasskeysHere = toMembers(403);

export const pageRows: readonly PageRow[] = [
  { page: '/', for: 'anybody' },
  { page: '/sign-in', for: 'anybody' },
  { page: '/sign-up', for: 'anybody' },
  // Whoever holds the link is told which household it opens.
  { page: '/invitation/[token]', for: 'anybody', at: (world) => `/invitation/${world.invitation.token}`, tells: true },
  { page: '/reset', for: 'anybody' },
  { page: '/reset/[token]', for: 'anybody', at: () => `/reset/${linkToken}` },
  { page: '/confirm/[token]', for: 'anybody', at: () => `/confirm/${linkToken}` },
  // Only where mail stays on this machine.
  { page: '/mailbox', for: 'anybody', status: 404 },
  { page: '/first-run', for: 'everyone in the household', except: firstRunIsOver },
  { page: '/first-run/[step]', for: 'everyone in the household', at: () => '/first-run/size', except: firstRunIsOver },

  { page: '/week', for: 'everyone in the household' },
  { page: '/week/print', for: 'everyone in the household' },
  { page: '/test', for: 'everyone in the household' },
  { page: '/rounds', for: 'everyone in the household' },
  { page: '/situations', for: 'everyone in the household' },
  { page: '/situations/[kind]', for: 'everyone in the household', at: () => '/situations/away' },
  { page: '/house', for: 'everyone in the household' },
  { page: '/house/sheet', for: 'everyone in the household' },
  { page: '/pool', for: 'everyone in the household' },
  { page: '/pool/[step]', for: 'everyone in the household', at: () => '/pool/size' },
  { page: '/household', for: 'everyone in the household' },

  // What saves somebody is asked of nobody's account, nor how a number is worked out.
  { page: '/help', for: 'anybody' },
  { page: '/help/emergency', for: 'anybody' },
  { page: '/help/safety', for: 'anybody' },
  { page: '/help/privacy', for: 'anybody' },
  { page: '/help/how', for: 'anybody' },
  { page: '/help/how/[page]', for: 'anybody', at: () => '/help/how/free-chlorine' },
  { page: '/help/how/constants', for: 'anybody' },
  { page: '/help/how/unknown', for: 'anybody' },

  { page: '/_not-found', for: 'anybody', at: () => '/nothing-is-here', status: 404 },
  // Next.js draws its own in place of a page that failed, also at this address.
  { page: '/_global-error', for: 'anybody', status: 500 },
];

/** Of somebody's own where there is one, else the owner's: a stranger asks about that, too. */
const ofOneself = (of: 'readings' | 'photos') => (world: World, asker: Asker) =>
  world[of][isCarer(asker) ? asker : 'owner'];
/** Of somebody else in the household. */
const ofAnother = (of: 'readings' | 'photos') => (world: World, asker: Asker) =>
  world[of][asker === 'caretaker' ? 'dosing caretaker' : 'caretaker'];

const corrected = (id: string, takenAt = when) => ({ ...fullTest(takenAt), id, note: `${secret}, corrected` });
const aWhileAgo = 3 * 24 * 3_600_000;
const daysBefore = (instant: string, milliseconds: number) =>
  new Date(Date.parse(instant) - milliseconds - 60_000).toISOString();

const account = (name: string) => ({ name, email: 'new@pool.example', password, locale: 'en-US' });
const emailOf = (world: World, asker: Asker) => world.people[isMember(asker) ? asker : 'viewer'].email;
const membershipOf = (world: World, asker: Asker) => world.memberships[isMember(asker) ? asker : 'viewer'];

export const routeRows: readonly RouteRow[] = [
  // Anybody, and whoever is signed in
  { call: 'GET /api/health', for: 'anybody' },
  ...(['GET', 'POST', 'PUT', 'PATCH', 'DELETE'] as const).map(
    (method) => ({ call: `${method} /api/[...path]`, for: 'anybody', id: () => 'nothing/here', status: 404 }) as const,
  ),
  {
    call: 'POST /api/sign-up',
    for: 'anybody',
    send: () => ({
      ...account('Nora'),
      householdName: 'Fern pool',
      timeZone: 'America/New_York',
      unitSystem: 'metric',
    }),
    changes: 'households',
  },
  {
    call: 'POST /api/sign-in',
    for: 'anybody',
    send: (world, asker) => ({ email: emailOf(world, asker), password }),
    changes: 'sessions',
  },
  { call: 'POST /api/sign-out', for: 'anybody', changes: 'sessions', unchangedFor: ['nobody'] },
  { call: 'POST /api/look-round', for: 'anybody', changes: 'households' },
  {
    call: 'PUT /api/language',
    for: 'anybody',
    send: () => ({ language: 'es' }),
    changes: 'people',
    unchangedFor: ['nobody'],
  },
  {
    call: 'PUT /api/tour',
    for: 'anybody signed in',
    send: () => ({ closed: true }),
    before: 'update people set tour_closed_at = null',
    changes: 'people',
  },
  {
    call: 'PUT /api/account/password',
    for: 'anybody signed in',
    send: () => ({ current: password, password: 'five other words in a row' }),
    changes: 'people',
  },
  { call: 'GET /api/sessions', for: 'anybody signed in' },
  { call: 'DELETE /api/sessions', for: 'anybody signed in', changes: 'sessions' },
  {
    call: 'DELETE /api/sessions/[id]',
    note: 'of oneself',
    for: 'anybody signed in',
    id: ({ devices }, asker) => devices[isMember(asker) ? asker : 'viewer'],
    changes: 'sessions',
  },
  {
    call: 'DELETE /api/sessions/[id]',
    note: 'of the viewer',
    for: 'anybody signed in',
    id: ({ devices }) => devices.viewer,
    changes: 'sessions',
    except: toTheViewerAlone,
  },
  { call: 'GET /api/account', for: 'anybody signed in' },
  {
    call: 'PUT /api/account/email',
    for: 'anybody signed in',
    send: () => ({ current: password, email: 'new@pool.example' }),
    changes: 'people',
  },
  // No mail leaves the server of these tests: journey 'mail' reads what leaves one that sends it.
  { call: 'POST /api/account/confirmation', for: 'anybody signed in' },
  {
    call: 'POST /api/email-confirmations',
    for: 'anybody',
    send: () => ({ token: linkToken }),
    before: mailed('confirm', 'confirm-email'),
    changes: 'people',
  },
  {
    call: 'POST /api/password-resets',
    for: 'anybody',
    send: (world, asker) => ({ email: emailOf(world, asker) }),
    except: { ...toMembers(403), nobody: 403 },
  },
  {
    call: 'PUT /api/password-resets',
    for: 'anybody',
    send: () => ({ token: linkToken, password: 'five other words in a row' }),
    before: mailed('reset', 'reset-password'),
    changes: 'people',
  },
  { call: 'GET /api/account/deletion', for: 'anybody signed in' },
  {
    call: 'DELETE /api/account',
    for: 'anybody signed in',
    send: () => ({ password, deletes: [] }),
    changes: 'people',
    // The last owner of others; and somebody who was not told that their household goes with them.
    except: { owner: 409, stranger: 409 },
  },
  { call: 'GET /api/passkeys', for: 'anybody signed in' },
  {
    call: 'POST /api/passkeys/options',
    for: 'anybody signed in',
    send: () => ({ password }),
    except: noPasskeysHere,
  },
  {
    call: 'POST /api/passkeys',
    for: 'anybody signed in',
    send: () => ({
      ...{ name: 'Telephone', id: 'aWQ', clientDataJSON: 'e30', attestationObject: 'oA', transports: [] },
    }),
    except: noPasskeysHere,
  },
  {
    call: 'DELETE /api/passkeys/[id]',
    note: 'of oneself',
    for: 'anybody signed in',
    id: (world, asker) => passkeyOf(world, isMember(asker) ? asker : 'viewer'),
    before: passkeysOfAll,
    changes: 'passkeys',
  },
  {
    call: 'DELETE /api/passkeys/[id]',
    note: 'of the viewer',
    for: 'anybody signed in',
    id: (world) => passkeyOf(world, 'viewer'),
    before: passkeysOfAll,
    changes: 'passkeys',
    except: toTheViewerAlone,
  },
  { call: 'POST /api/sign-in/passkey/options', for: 'anybody', except: { ...noPasskeysHere, nobody: 403 } },
  {
    call: 'POST /api/sign-in/passkey',
    for: 'anybody',
    send: () => ({ ...{ id: 'aWQ', clientDataJSON: 'e30', authenticatorData: 'oA', signature: 'oA', userHandle: '' } }),
    except: { ...noPasskeysHere, nobody: 403 },
  },
  {
    call: 'POST /api/invitations/accept',
    for: 'anybody signed in',
    send: ({ invitation: { token } }) => ({ token }),
    changes: 'memberships',
    // They belong to the household already.
    except: { viewer: 409, caretaker: 409, 'dosing caretaker': 409, owner: 409 },
  },
  {
    call: 'POST /api/invitations/sign-up',
    for: 'anybody',
    send: ({ invitation: { token } }) => ({ ...account('Nora'), token }),
    changes: 'memberships',
  },

  // The household and its people
  { call: 'GET /api/households', for: 'anybody signed in', except: { stranger: 'own' } },
  {
    call: 'POST /api/households',
    for: 'anybody signed in',
    send: () => ({ name: 'Fern pool', timeZone: 'America/New_York', unitSystem: 'metric', locale: 'en-US' }),
    changes: 'households',
  },
  {
    call: 'DELETE /api/households/current',
    for: 'owners',
    send: (_, asker) => ({ password, name: `${asker === 'stranger' ? strangersWord : secret} pool` }),
    changes: 'households',
  },
  { call: 'GET /api/audit-trail', for: 'owners' },
  {
    call: 'PUT /api/households/chosen',
    for: 'everyone in the household',
    send: ({ householdId }) => ({ householdId }),
    before: 'update sessions set household_id = null',
    changes: 'sessions',
    // To belong there is the right that is asked for; one that does not exist is refused in the same words.
    except: { stranger: 403 },
  },
  {
    call: 'PATCH /api/households',
    for: 'owners',
    send: () => ({ name: `${secret} pond` }),
    changes: 'households',
    except: { stranger: 'own' },
  },
  { call: 'GET /api/members', for: 'everyone in the household' },
  {
    call: 'PUT /api/members/[id]',
    for: 'owners',
    id: ({ memberships }) => memberships.caretaker,
    send: () => ({ role: 'viewer', chemicalsAllowed: false }),
    changes: 'memberships',
  },
  {
    call: 'PUT /api/members/[id]',
    note: 'oneself, to be an owner who handles chemicals',
    for: 'owners',
    id: membershipOf,
    send: () => ({ role: 'owner', chemicalsAllowed: true }),
    changes: 'audit_trail',
    except: { stranger: 'own' },
  },
  {
    call: 'DELETE /api/members/[id]',
    note: 'somebody else',
    for: 'owners',
    id: ({ memberships }, asker) => memberships[asker === 'caretaker' ? 'viewer' : 'caretaker'],
    changes: 'memberships',
  },
  {
    call: 'DELETE /api/members/[id]',
    note: 'oneself, to leave',
    for: 'everyone in the household',
    id: membershipOf,
    changes: 'memberships',
    // The last owner cannot leave.
    except: { owner: 409, stranger: 409 },
  },
  {
    call: 'POST /api/invitations',
    for: 'owners',
    send: () => ({ id: randomUUID(), name: 'Nora', role: 'owner', chemicalsAllowed: true }),
    changes: 'invitations',
  },
  { call: 'PUT /api/invitations/[id]', for: 'owners', id: ({ invitation }) => invitation.id, changes: 'invitations' },
  {
    call: 'DELETE /api/invitations/[id]',
    for: 'owners',
    id: ({ invitation }) => invitation.id,
    changes: 'invitations',
  },
  { call: 'GET /api/hand-overs', for: 'everyone in the household' },
  {
    call: 'POST /api/hand-overs',
    for: 'owners',
    send: ({ handOver }) => ({ ...handOver, id: randomUUID(), fromDay: '2026-10-01', untilDay: '2026-10-03' }),
    inBody: true,
    changes: 'hand_overs',
  },
  {
    call: 'DELETE /api/hand-overs/[id]',
    for: 'owners',
    id: ({ handOver }) => handOver.id,
    changes: 'hand_overs',
    // It is they who are asked, and may decline.
    except: { viewer: 'done' },
  },
  {
    call: 'PUT /api/hand-overs/[id]/agreement',
    for: 'everyone in the household',
    id: ({ handOver }) => handOver.id,
    send: () => ({ cardRead: false }),
    changes: 'hand_overs',
    except: { caretaker: 403, 'dosing caretaker': 403, owner: 403 },
  },
  {
    call: 'POST /api/safety-card',
    // An owner says of a carer that they are an adult who may.
    for: 'chemical handlers',
    send: () => ({ adult: true, read: true }),
    changes: 'memberships',
  },

  // The week
  { call: 'GET /api/week', for: 'everyone in the household' },
  {
    call: 'POST /api/doses/[id]/ticks',
    for: 'chemical handlers',
    id: ({ dose }) => dose.id,
    send: ({ dose: { planVersion } }) => ({ id: randomUUID(), action: 'given', planVersion }),
    changes: 'dose_events',
  },
  {
    call: 'POST /api/stop-confirmations',
    for: 'chemical handlers',
    send: ({ stopDoseId }) => ({ id: randomUUID(), doseId: stopDoseId }),
    inBody: true,
    changes: 'stop_confirmations',
  },
  { call: 'GET /api/try-outs', for: 'everyone in the household' },
  {
    call: 'POST /api/try-outs',
    for: 'carers',
    send: ({ planId }) => ({ id: randomUUID(), planId, swimmers: [{ day: '2026-07-10', swimmerHours: 2 }] }),
    changes: 'try_outs',
    // A plan that is not, or no longer, theirs: they are asked to look at the newest.
    except: { stranger: 409 },
  },
  { call: 'DELETE /api/try-outs/[id]', for: 'carers', id: ({ tryOutId }) => tryOutId, changes: 'try_outs' },
  {
    call: 'POST /api/pool-events',
    for: 'carers',
    send: () => ({ id: randomUUID(), kind: 'storm', happenedAt: when }),
    changes: 'pool_events',
  },
  { call: 'DELETE /api/pool-events/[id]', for: 'carers', id: ({ eventId }) => eventId, changes: 'pool_events' },

  // Tests
  { call: 'GET /api/readings', for: 'everyone in the household' },
  { call: 'POST /api/readings', for: 'carers', send: () => fullTest(when), changes: 'readings' },
  {
    call: 'PUT /api/readings/[id]',
    note: 'of oneself',
    for: 'carers',
    id: ofOneself('readings'),
    send: (world, asker) => corrected(ofOneself('readings')(world, asker)),
    changes: 'reading_versions',
  },
  {
    call: 'PUT /api/readings/[id]',
    note: 'of somebody else',
    for: 'owners',
    id: ofAnother('readings'),
    send: (world, asker) => corrected(ofAnother('readings')(world, asker)),
    changes: 'reading_versions',
  },
  {
    call: 'PUT /api/readings/[id]',
    note: 'of oneself, after 48 hours',
    for: 'owners',
    id: ofOneself('readings'),
    send: (world, asker) => corrected(ofOneself('readings')(world, asker), daysBefore(when, aWhileAgo)),
    before: `update readings set taken_at = taken_at - ${aWhileAgo}, created_at = created_at - ${aWhileAgo}`,
    changes: 'reading_versions',
  },
  {
    call: 'DELETE /api/readings/[id]',
    note: 'of oneself',
    for: 'carers',
    id: ofOneself('readings'),
    changes: 'readings',
  },
  {
    call: 'DELETE /api/readings/[id]',
    note: 'of somebody else',
    for: 'owners',
    id: ofAnother('readings'),
    changes: 'readings',
  },

  // Shelf and pool
  { call: 'GET /api/shelf-products', for: 'everyone in the household' },
  {
    call: 'POST /api/shelf-products',
    for: 'owners',
    send: () => ({ id: randomUUID(), form: 'granular', substance: 'sodium-bicarbonate', stock: 500 }),
    changes: 'shelf_products',
  },
  {
    call: 'DELETE /api/shelf-products/[productId]',
    for: 'owners',
    id: ({ productId }) => productId,
    changes: 'shelf_products',
  },
  {
    call: 'PUT /api/shelf-products/[productId]/stock',
    for: 'carers',
    id: ({ productId }) => productId,
    send: () => ({ stock: 4200 }),
    changes: 'shelf_products',
  },
  { call: 'GET /api/pool', for: 'everyone in the household' },
  {
    call: 'PUT /api/pool',
    for: 'owners',
    send: () => ({ step: 'size', answers: { how: 'entered', volume: 74, unit: 'm3', sure: true, meanDepth: 1.5 } }),
    changes: 'pools',
  },
  { call: 'GET /api/learnt', for: 'everyone in the household' },
  { call: 'DELETE /api/learnt', for: 'owners', changes: 'pools' },

  // Photos
  { call: 'GET /api/photos', for: 'everyone in the household' },
  {
    call: 'POST /api/photos',
    for: 'carers',
    query: ({ readings }) => `id=${randomUUID()}&kind=strip&about=${readings.owner}`,
    bytes: ({ picture }) => new Uint8Array(Buffer.from(picture, 'base64')),
    inBody: true,
    changes: 'photos',
  },
  {
    call: 'GET /api/photos/[id]',
    for: 'everyone in the household',
    id: ({ photos }) => photos.owner,
    query: () => 'size=small',
  },
  { call: 'DELETE /api/photos/[id]', note: 'of oneself', for: 'carers', id: ofOneself('photos'), changes: 'photos' },
  { call: 'DELETE /api/photos/[id]', note: 'of others', for: 'owners', id: ofAnother('photos'), changes: 'photos' },

  // Rounds, the house, situations
  { call: 'GET /api/rounds', for: 'everyone in the household' },
  {
    call: 'POST /api/rounds',
    for: 'carers',
    send: () => ({ id: randomUUID(), doneAt: when, exceptions: [] }),
    changes: 'rounds',
  },
  { call: 'GET /api/house-notes', for: 'everyone in the household' },
  { call: 'PUT /api/house-notes', for: 'carers', send: () => ({ gate: 'at the back' }), changes: 'house_notes' },
  { call: 'GET /api/visits', for: 'everyone in the household' },
  {
    call: 'POST /api/visits',
    for: 'carers',
    send: () => ({ id: randomUUID(), visitedOn: '2026-07-02' }),
    changes: 'visits',
  },
  { call: 'GET /api/situations', for: 'everyone in the household' },
  {
    call: 'POST /api/situations',
    for: 'carers',
    send: ({ situation }) => ({
      id: randomUUID(),
      situation: { kind: 'cover', answers: { covered: 'days', floaterUnder: 'no' } },
      setAside: situation.id,
    }),
    changes: 'situations',
  },
  {
    call: 'PUT /api/situations/[id]',
    for: 'carers',
    id: ({ situation }) => situation.id,
    send: () => ({
      situation: { kind: 'away', answers: { leavesOn: '2026-08-02', backOn: '2026-08-03', care: 'nobody' } },
    }),
    changes: 'situations',
  },
  {
    call: 'POST /api/situations/[id]/ticks',
    for: 'carers',
    id: ({ situation }) => situation.id,
    send: ({ situation: { step } }) => ({ step, done: true }),
    changes: 'situation_ticks',
  },
  {
    call: 'POST /api/situations/[id]/end',
    for: 'carers',
    id: ({ situation }) => situation.id,
    send: () => ({ ending: 'mistake' }),
    changes: 'situations',
  },
];

/**
 * Ids are made on the device. Sent by a stranger for a thing of their own, one of the first household's is refused (409): it
 * neither takes the thing over nor tells what it is. A route that takes an id of the device has a line here, too.
 */
export const takenIds: readonly Pick<RouteRow, 'call' | 'query' | 'send' | 'bytes'>[] = [
  { call: 'POST /api/readings', send: ({ readings }) => fullTest(when, { id: readings.owner }) },
  {
    call: 'POST /api/photos',
    query: ({ photos }) => `id=${photos.owner}&kind=equipment`,
    bytes: ({ picture }) => new Uint8Array(Buffer.from(picture, 'base64')),
  },
  { call: 'POST /api/pool-events', send: ({ eventId }) => ({ id: eventId, kind: 'storm', happenedAt: when }) },
  { call: 'POST /api/rounds', send: ({ roundId }) => ({ id: roundId, doneAt: when, exceptions: [] }) },
  { call: 'POST /api/visits', send: ({ visitId }) => ({ id: visitId, visitedOn: '2026-07-02' }) },
  { call: 'POST /api/situations', send: ({ situation: { id, situation } }) => ({ id, situation }) },
  {
    call: 'POST /api/invitations',
    send: ({ invitation: { id } }) => ({ id, name: 'Nora', role: 'owner', chemicalsAllowed: true }),
  },
  {
    call: 'POST /api/hand-overs',
    send: ({ handOver, memberships }) => ({ ...handOver, memberId: memberships.stranger }),
  },
];
