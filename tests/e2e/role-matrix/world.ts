import { createClient } from '@libsql/client';
import { randomBytes, randomUUID } from 'node:crypto';
import sharp from 'sharp';
import type { HouseholdPeople, SentInvitation } from '@/lib/schemas/member';
import type { Situation, Situations } from '@/lib/schemas/situation';
import type { HouseholdProduct } from '@/lib/schemas/household-product';
import type { TryOutStart } from '@/lib/schemas/try-out';
import { nextDose, whenDue } from '../support/doses';
import { describePool, fullTest, sundayEvening, weekOf } from '../support/households';
import { Person } from '../support/person';
import type { Server } from '../support/server';
import { type Asker, askers, type Member } from './askers';

/** In every name and note of the first household, and nowhere else: who may not see it must not be told this word. */
export const secret = 'Vetiver';
/** The same for the household of the stranger. */
export const strangersWord = 'Tansy';

export const password = 'four words in a row';

/** The carers of the first household: each has a test and a photo of their own there. */
export type Carer = 'caretaker' | 'dosing caretaker' | 'owner';
type OfCarers = Record<Carer, string>;

/** Things of the first household, by their ids, and what it takes to ask about them. */
export type World = {
  householdId: string;
  readings: OfCarers;
  photos: OfCarers;
  dose: { id: string; planVersion: number };
  /** Its Stop has not been confirmed by anybody. */
  stopDoseId: string;
  situation: { id: string; situation: Situation; step: string };
  eventId: string;
  roundId: string;
  visitId: string;
  productId: string;
  tryOutId: string;
  planId: string;
  invitation: { id: string; token: string };
  /** The viewer is asked to look after the pool. */
  handOver: { id: string; memberId: string; fromDay: string; untilDay: string; chemicalsAllowed: boolean };
  /** Memberships; the stranger's in a household of their own. */
  memberships: Record<Member, string>;
  people: Record<Member, { email: string }>;
  /** Where each is signed in, by what the list of devices calls it. */
  devices: Record<Member, string>;
  picture: string;
};

/** How a picture is sent, instead of a body. */
export const sentAsPicture = (bytes: Uint8Array<ArrayBuffer>) => ({ bytes, headers: { 'content-type': 'image/png' } });

export type Cookies = Record<Asker, string>;

const uuid = /[0-9a-f]{8}(?:-[0-9a-f]{4}){3}-[0-9a-f]{12}/g;
const leavingOn = '2026-08-01';
const partyOn = '2026-07-11';
export const when = sundayEvening;

/** Two households with something of everything, made as their people would. The server's clock goes on to the hour of a dose. */
export async function makeWorld(server: Server): Promise<{ world: World; cookies: Cookies }> {
  const owner = await newOwner(server, secret);
  await describePool(owner.person);
  const stranger = await newOwner(server, strangersWord);
  await describePool(stranger.person);
  await stranger.person.must('POST', '/api/readings', fullTest(when));

  const invited = (name: string, role: 'caretaker' | 'viewer', chemicalsAllowed: boolean) =>
    join(server, owner.person, { name: `${name} ${secret}`, role, chemicalsAllowed });
  const viewer = await invited('Vera', 'viewer', false);
  const caretaker = await invited('Cora', 'caretaker', false);
  const dosing = await invited('Dora', 'caretaker', true);
  await dosing.person.must('POST', '/api/safety-card', { adult: true, read: true });
  const expired = await invited('Edda', 'caretaker', true);
  await expired.person.must('POST', '/api/safety-card', { adult: true, read: true });

  const carers = { caretaker: caretaker.person, 'dosing caretaker': dosing.person, owner: owner.person };
  const things = await furnish(carers);
  const memberOf = (people: HouseholdPeople, name: string) =>
    people.members.find((member) => member.name.startsWith(name))?.id ?? '';
  const people = await owner.person.must<HouseholdPeople>('GET', '/api/members');
  const memberships = {
    viewer: memberOf(people, 'Vera'),
    caretaker: memberOf(people, 'Cora'),
    'dosing caretaker': memberOf(people, 'Dora'),
    owner: memberOf(people, 'Olga'),
    'expired member': memberOf(people, 'Edda'),
    stranger: memberOf(await stranger.person.must('GET', '/api/members'), 'Olga'),
  };
  await endByTime(server, memberships['expired member']);
  const handOver = {
    ...{ id: randomUUID(), memberId: memberships.viewer, chemicalsAllowed: false },
    ...{ fromDay: '2026-09-01', untilDay: '2026-09-05' },
  };
  await owner.person.must('POST', '/api/hand-overs', handOver);

  const dose = await waitForADose(server, owner.person);
  // What is worked out when it is looked at, such as what a pool has taught, is worked out before anything is compared.
  for (const { person } of [owner, stranger])
    for (const address of ['week', 'learnt', 'try-outs', 'situations']) await person.must('GET', `/api/${address}`);
  await new Person(server).must('POST', '/api/look-round');

  const { planId } = await owner.person.must<TryOutStart>('GET', '/api/try-outs');
  const [household] = await owner.person.must<{ id: string }[]>('GET', '/api/households');
  const [product] = await owner.person.must<HouseholdProduct[]>('GET', '/api/shelf-products');
  const world = {
    ...things,
    ...{ householdId: household?.id ?? '', productId: product?.id ?? '', planId, memberships, handOver },
    ...{ dose: { id: dose.id, planVersion: dose.planVersion }, stopDoseId: dose.id },
    people: {
      viewer: { email: viewer.email },
      caretaker: { email: caretaker.email },
      'dosing caretaker': { email: dosing.email },
      owner: { email: owner.email },
      stranger: { email: stranger.email },
      'expired member': { email: expired.email },
    },
    devices: {
      viewer: await deviceOf(viewer.person),
      caretaker: await deviceOf(caretaker.person),
      'dosing caretaker': await deviceOf(dosing.person),
      owner: await deviceOf(owner.person),
      stranger: await deviceOf(stranger.person),
      'expired member': await deviceOf(expired.person),
    },
  };
  const cookies = {
    nobody: '',
    viewer: viewer.person.cookie,
    caretaker: caretaker.person.cookie,
    'dosing caretaker': dosing.person.cookie,
    owner: owner.person.cookie,
    stranger: stranger.person.cookie,
    'expired member': expired.person.cookie,
  };
  return { world, cookies };
}

/** The same with ids that nothing has: what is not there has to be answered like what belongs to others. */
export function worldOfNothing(world: World): World {
  const others = new Map<string, string>();
  const other = (id: string) => {
    const made = others.get(id) ?? randomUUID();
    others.set(id, made);
    return made;
  };
  const made = JSON.parse(JSON.stringify(world).replace(uuid, other)) as World;
  const { picture, people, devices } = world;
  return {
    ...made,
    picture,
    people,
    devices,
    invitation: { ...made.invitation, token: randomBytes(32).toString('base64url') },
  };
}

/** Every id of the first household that a refused answer, or a row written elsewhere, must not hold. */
export function idsOf({
  people: _people,
  picture: _picture,
  devices: _devices,
  memberships,
  ...things
}: World): string[] {
  const { stranger: _stranger, ...ofTheHousehold } = memberships;
  return [...new Set(JSON.stringify({ things, ofTheHousehold }).match(uuid))];
}

async function deviceOf(person: Person): Promise<string> {
  const [device] = await person.must<{ id: string }[]>('GET', '/api/sessions');
  return device?.id ?? '';
}

export const isCarer = (asker: Asker): asker is Carer => ['caretaker', 'dosing caretaker', 'owner'].includes(asker);
export const isMember = (asker: Asker): asker is Member => asker !== askers[0];

async function newOwner(server: Server, word: string): Promise<{ person: Person; email: string }> {
  const person = new Person(server);
  const { email } = await person.signUp({ name: `Olga ${word}`, householdName: `${word} pool` });
  return { person, email };
}

async function join(
  server: Server,
  owner: Person,
  invitation: { name: string; role: 'caretaker' | 'viewer'; chemicalsAllowed: boolean },
): Promise<{ person: Person; email: string }> {
  const { token } = await invite(owner, invitation);
  const person = new Person(server);
  const email = `${randomUUID()}@pool.example`;
  const account = { name: invitation.name, email, password, locale: 'en-US' };
  await person.must('POST', '/api/invitations/sign-up', { ...account, token });
  return { person, email };
}

async function invite(
  owner: Person,
  invitation: { name: string; role: string; chemicalsAllowed: boolean },
): Promise<{ id: string; token: string }> {
  const id = randomUUID();
  const { link } = await owner.must<SentInvitation>('POST', '/api/invitations', { id, ...invitation });
  return { id, token: link?.split('/').at(-1) ?? '' };
}

/** Something of everything, in the first household. */
async function furnish(carers: Record<Carer, Person>) {
  const { owner } = carers;
  const picture = await sharp({ create: { width: 40, height: 30, channels: 3, background: 'teal' } })
    .png()
    .toBuffer();
  const readings = { caretaker: '', 'dosing caretaker': '', owner: '' };
  const photos = { caretaker: '', 'dosing caretaker': '', owner: '' };
  for (const carer of ['caretaker', 'dosing caretaker', 'owner'] as const) {
    const reading = fullTest(when, { note: secret });
    readings[carer] = reading.id;
    await carers[carer].must('POST', '/api/readings', reading);
    photos[carer] = randomUUID();
    const query = `id=${photos[carer]}&kind=equipment&caption=${secret}`;
    const added = await carers[carer].send('POST', `/api/photos?${query}`, undefined, sentAsPicture(picture));
    if (added.status !== 200) throw new Error(`The photo was answered ${added.status}: ${added.text}`);
  }
  await owner.must('PUT', '/api/house-notes', { gate: `${secret} gate` });
  const [visitId, roundId] = [randomUUID(), randomUUID()];
  await owner.must('POST', '/api/visits', { id: visitId, visitedOn: '2026-07-01', note: secret });
  await owner.must('POST', '/api/rounds', { id: roundId, doneAt: when, exceptions: [] });
  const eventId = randomUUID();
  await owner.must('POST', '/api/pool-events', { id: eventId, kind: 'cover-off', happenedAt: when });
  const situationId = randomUUID();
  const situation: Situation = {
    kind: 'away',
    answers: { leavesOn: leavingOn, backOn: leavingOn, care: 'nobody' },
  };
  const situations = await owner.must<Situations>('POST', '/api/situations', { id: situationId, situation });
  const step = situations.open?.procedure.steps.find(({ kind }) => kind === 'tick')?.id ?? '';
  const { planId } = await owner.must<TryOutStart>('GET', '/api/try-outs');
  const tryOutId = randomUUID();
  const swimmers = [{ day: partyOn, swimmerHours: 3 }];
  await owner.must('POST', '/api/try-outs', { id: tryOutId, planId, swimmers });
  const invitation = await invite(owner, { name: `Ida ${secret}`, role: 'viewer', chemicalsAllowed: false });
  const open = { id: situationId, situation, step };
  return {
    readings,
    photos,
    eventId,
    visitId,
    roundId,
    situation: open,
    tryOutId,
    invitation,
    picture: picture.toString('base64'),
  };
}

/** As if it had been for some time only: it was over a while ago. */
async function endByTime(server: Server, membershipId: string): Promise<void> {
  const client = createClient({ url: `file:${server.databaseFile}` });
  try {
    await client.execute({
      sql: 'update memberships set valid_from = valid_from - 7200000, valid_until = valid_from - 3600000 where id = ?',
      args: [membershipId],
    });
  } finally {
    client.close();
  }
}

/** Goes on to the hour in which the next dose may be ticked. */
async function waitForADose(server: Server, owner: Person) {
  const week = await weekOf(owner);
  const dose = nextDose(week);
  if (!dose) throw new Error('No dose is planned.');
  if (dose.tickFrom > week.now) await server.restart(whenDue(dose, week));
  return dose;
}
