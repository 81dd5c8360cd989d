import type { SetupAnswer } from '@/lib/schemas/pool-profile';

type AnswersOf<Step extends SetupAnswer['step']> = Extract<SetupAnswer, { step: Step; answers: unknown }>['answers'];

export const scopeAnswers: AnswersOf<'scope'> = {
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
};

export const enteredSize: AnswersOf<'size'> = {
  how: 'entered',
  volume: 20_000,
  unit: 'us-gal',
  sure: true,
  unitConfirmed: false,
  meanDepth: 1.5,
};

export const sunAnswers: AnswersOf<'sun'> = {
  placeName: 'Kissimmee',
  latitude: 28.2919,
  longitude: -81.4076,
  timeZone: 'America/New_York',
  sunExposure: 0.9,
  cover: 'none',
  waterFeatures: true,
};

export const waterAnswers: AnswersOf<'water'> = {
  pump: [{ from: '22:00', to: '06:00' }],
  feeder: { kind: 'inline', ingredient: 'trichlor', capacity: 8, loaded: 0 },
  fillWater: { calciumHardness: 120 },
  testMethods: ['strip', 'drop-kit'],
};

/** Every part of the first run, in its order, for a pool that is in scope. */
export const setupAnswers: readonly SetupAnswer[] = [
  { step: 'scope', answers: scopeAnswers },
  { step: 'size', answers: enteredSize },
  { step: 'lining', answers: { surface: 'unsure' } },
  { step: 'sun', answers: sunAnswers },
  { step: 'water', answers: waterAnswers },
  { step: 'shelf' },
  { step: 'label', answers: { swimLimit: 'not-said', swimHours: { from: '10:00', to: '20:00' } } },
];
