import { createClient } from '@libsql/client';
import { randomUUID } from 'node:crypto';
import type { NewReading } from '@/lib/schemas/reading';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { describeSteps, fullTest, granules, slowTablets, weekOf } from './households';
import { Person } from './person';
import type { Server } from './server';

/** A Wednesday in the middle of a week that is an hour short in Europe and an hour long in New Zealand. */
export const midweek = '2026-04-01T12:00:00Z';

const HOUR = 3_600_000;
const ago = (hours: number) => new Date(Date.parse(midweek) - hours * HOUR).toISOString();

const liquid = {
  id: 'liquid',
  form: 'liquid',
  substance: 'sodium-hypochlorite',
  strength: 12.5,
  measure: 250,
  stock: 20_000,
  pricePerLitre: 1.4,
  boughtOn: '2026-03-20',
};

type Values = NewReading['values'];
type Test = { hoursAgo: number; values: Values; quick?: true; method?: NewReading['method'] };

export type Household = {
  name: string;
  /** Its zone, language and units. */
  account?: Record<string, unknown>;
  answers?: Record<'sun' | 'size' | 'label', Record<string, unknown>> | Record<string, Record<string, unknown>>;
  shelf: readonly Record<string, unknown>[];
  visits?: number;
  tests: readonly Test[];
  /** How many doses whose hour is over were given. */
  ticks?: number;
};

const good: Values = {
  ...{ freeChlorine: 3, combinedChlorine: 0.2, pH: 7.5, totalAlkalinity: 80, calciumHardness: 220 },
  ...{ cyanuricAcid: 50, temperature: 29 },
};

const madrid = { timeZone: 'Europe/Madrid', locale: 'en-US', unitSystem: 'metric' };
const auckland = { timeZone: 'Pacific/Auckland', locale: 'en-GB', unitSystem: 'metric' };

/** Ten pools whose sheets have little in common. */
export const tenHouseholds: readonly Household[] = [
  { name: 'three evenings', shelf: [slowTablets, granules], tests: [{ hoursAgo: 61, values: good }], ticks: 2 },
  {
    name: 'neighbouring evenings, US',
    account: { unitSystem: 'us' },
    shelf: [granules],
    visits: 7,
    tests: [{ hoursAgo: 37, values: { ...good, cyanuricAcid: 35 } }],
    ticks: 1,
  },
  {
    name: 'liquid each evening, clocks forward',
    account: madrid,
    answers: { sun: { latitude: 37.4, longitude: -6 } },
    shelf: [liquid],
    visits: 7,
    tests: [{ hoursAgo: 66, values: { ...good, cyanuricAcid: 30 } }],
    ticks: 3,
  },
  {
    name: 'slow tablets, clocks back',
    account: auckland,
    answers: { sun: { latitude: -36.8, longitude: 174.8 } },
    shelf: [slowTablets],
    tests: [{ hoursAgo: 76, values: { ...good, cyanuricAcid: 32, freeChlorine: 3.4 } }],
    ticks: 1,
  },
  {
    name: 'strip and drop kit',
    account: { unitSystem: 'us' },
    shelf: [slowTablets, granules, liquid],
    visits: 5,
    tests: [
      { hoursAgo: 62, values: good },
      { hoursAgo: 40, quick: true, method: 'strip', values: { freeChlorine: { low: 1, high: 3 } } },
      { hoursAgo: 15, quick: true, values: { freeChlorine: 2.6, pH: 7.6 } },
      { hoursAgo: 3, quick: true, method: 'strip', values: { freeChlorine: { low: 3, high: 5 } } },
    ],
    ticks: 2,
  },
  {
    name: 'high stabilizer',
    shelf: [granules, liquid],
    visits: 6,
    tests: [{ hoursAgo: 37, values: { ...good, freeChlorine: 3.7, cyanuricAcid: 72 } }],
    ticks: 1,
  },
  {
    name: 'a swim limit of 5',
    answers: { label: { swimLimit: 5 } },
    shelf: [granules],
    visits: 5,
    tests: [{ hoursAgo: 13, values: { ...good, freeChlorine: 4.2, cyanuricAcid: 45 } }],
  },
  {
    name: 'no stabilizer',
    shelf: [liquid],
    visits: 7,
    tests: [{ hoursAgo: 13, values: { ...good, cyanuricAcid: 0 } }],
  },
  { name: 'a stale plan', shelf: [granules], tests: [{ hoursAgo: 206, values: good }], ticks: 1 },
  {
    name: 'no doses, and a plan that ends in the week',
    answers: { sun: { sunExposure: 0 } },
    shelf: [granules],
    tests: [{ hoursAgo: 109, values: { ...good, freeChlorine: 3.9, temperature: 8 } }],
  },
];

/** Signs a household up, describes its pool and its tests, and ticks what is behind it: without a browser. */
export async function settle(server: Server, household: Household): Promise<{ person: Person; sheet: WeekSheet }> {
  const { account, answers, shelf, visits, tests, ticks = 0 } = household;
  const person = new Person(server);
  await person.signUp(account);
  for (const product of shelf) await person.must('POST', '/api/shelf-products', { ...product, id: randomUUID() });
  if (visits !== undefined) await wish(server, person, visits);
  const timeZone = account?.timeZone ?? 'America/New_York';
  await describeSteps(person, ['scope', 'size', 'lining', 'sun', 'water', 'shelf', 'label'], {
    ...answers,
    sun: { timeZone, ...answers?.sun },
  });
  for (const { hoursAgo, values, quick, method = 'drop-kit' } of tests)
    await person.must(
      'POST',
      '/api/readings',
      fullTest(ago(hoursAgo), { values, method, ...(quick ? { kind: 'quick' } : {}) }),
    );
  for (let tick = 0; tick < ticks; tick += 1) {
    const dose = (await weekOf(person)).doses.find(
      ({ status, at }) => status === 'planned' && Date.parse(at) < Date.parse(midweek),
    );
    if (dose === undefined) break;
    const given = { action: 'given', id: randomUUID(), planVersion: dose.planVersion, at: dose.at };
    await person.must('POST', `/api/doses/${dose.id}/ticks`, given);
  }
  return { person, sheet: await weekOf(person) };
}

/** On how many evenings a household would dose. */
async function wish(server: Server, person: Person, visits: number): Promise<void> {
  const [household] = await person.must<{ id: string }[]>('GET', '/api/households');
  const client = createClient({ url: `file:${server.databaseFile}` });
  try {
    await client.execute({
      sql: `insert or replace into preferences (household_id, visits, money, evenings, steadiness, avoid)
            values (?, ?, 1, 1, 1, '[]')`,
      args: [household?.id ?? '', visits],
    });
  } finally {
    client.close();
  }
}
