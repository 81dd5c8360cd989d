import { randomUUID } from 'node:crypto';
import type { NewReading } from '@/lib/schemas/reading';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { joinHousehold } from './database';
import { Person } from './person';
import type { Server } from './server';

/** Midsummer, a Sunday evening at the pool: when this household tests its water. */
export const sundayEvening = '2026-07-05T19:00:00-04:00';

/** The pool of the engine paper's example: 75.7 m3 in the south, a feeder for slow tablets. */
const usualAnswers = {
  scope: {
    system: 'chlorine',
    kind: 'pool',
    roofed: false,
    newSurface: false,
    openToPublic: false,
    planted: false,
    ultravioletOrOzone: false,
    wellWater: false,
    copperHeater: false,
    handlesChemicals: true,
  },
  size: { how: 'entered', volume: 75.7, unit: 'm3', sure: true, meanDepth: 1.5 },
  lining: { surface: 'plaster' },
  sun: {
    latitude: 28,
    longitude: -81.5,
    timeZone: 'America/New_York',
    sunExposure: 1,
    cover: 'none',
    waterFeatures: false,
  },
  water: {
    pump: [{ from: '08:00', to: '16:00' }],
    feeder: { kind: 'inline', ingredient: 'trichlor', capacity: 8, loaded: 0 },
    fillWater: {},
    testMethods: ['drop-kit'],
  },
  shelf: undefined,
  label: { swimLimit: 4, swimHours: { from: '10:00', to: '20:00' } },
} as const;

type Answers = { [step in keyof typeof usualAnswers]?: Record<string, unknown> };

export const slowTablets = {
  id: 'tablets',
  form: 'tablet',
  substance: 'trichlor',
  strength: 90,
  tabletMass: 227,
  labelWay: 'feeder-only',
  stock: 5000,
  pricePerKg: 9,
};

export const granules = {
  id: 'granules',
  form: 'granular',
  substance: 'calcium-hypochlorite',
  strength: 65,
  labelWay: 'dissolve',
  measure: 50,
  stock: 4000,
  pricePerKg: 7.5,
};

type Step = keyof typeof usualAnswers;

/** Answers some steps of the first run without a browser. */
export async function describeSteps(person: Person, steps: readonly Step[], answers: Answers = {}): Promise<void> {
  for (const step of steps) {
    const usual = usualAnswers[step];
    await person.must('PUT', '/api/pool', {
      step,
      ...(usual === undefined ? {} : { answers: { ...usual, ...answers[step] } }),
    });
  }
}

/** A pool that is in scope, described to the end, with slow tablets and granules on the shelf. */
export async function describePool(person: Person, answers: Answers = {}): Promise<void> {
  for (const product of [slowTablets, granules])
    await person.must('POST', '/api/shelf-products', { ...product, id: randomUUID() });
  await describeSteps(person, ['scope', 'size', 'lining', 'sun', 'water', 'shelf', 'label'], answers);
}

/** A full test of good water. */
export function fullTest(takenAt: string, overrides: Partial<NewReading> = {}): NewReading {
  return {
    id: randomUUID(),
    takenAt,
    kind: 'full',
    method: 'drop-kit',
    values: {
      freeChlorine: 3,
      combinedChlorine: 0.2,
      pH: 7.5,
      totalAlkalinity: 80,
      calciumHardness: 220,
      cyanuricAcid: 50,
      temperature: 29,
    },
    look: 'clear',
    ...overrides,
  };
}

export const weekOf = (person: Person): Promise<WeekSheet> => person.must<WeekSheet>('GET', '/api/week');

/** Somebody who may only look at an owner's household. */
export async function viewerOf(server: Server, owner: Person, name: string): Promise<Person> {
  const viewer = new Person(server);
  const { email } = await viewer.signUp({ name });
  const households = await owner.must<{ id: string }[]>('GET', '/api/households');
  const householdId = households[0]?.id ?? '';
  await joinHousehold(server, { email, householdId, role: 'viewer' });
  await viewer.must('PUT', '/api/households/chosen', { householdId });
  return viewer;
}
