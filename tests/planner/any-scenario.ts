import fc from 'fast-check';
import { type Scenario, scenarioSchema } from '@/lib/schemas/scenario';

const PARTS = 5000;
/** Evenly spread: fast-check's own numbers like to lie at zero and at the ends, where hardly anything is planned. */
const number = (min: number, max: number) =>
  fc.noBias(fc.integer({ min: 0, max: PARTS })).map((part) => min + (part / PARTS) * (max - min));
const days = (value: fc.Arbitrary<number>) => fc.array(value, { minLength: 7, maxLength: 8 });
/** The first four times out of five. */
const mostly = <T>(usual: fc.Arbitrary<T>, rare: fc.Arbitrary<T>): fc.Arbitrary<T> =>
  fc.oneof({ weight: 4, arbitrary: usual }, rare);
const sometimes = (value: fc.Arbitrary<number>) => mostly(fc.constant(0), value);

const places = [
  { latitude: 28, longitude: -81.5, timeZone: 'America/New_York' },
  { latitude: 40.4, longitude: -3.7, timeZone: 'Europe/Madrid' },
  { latitude: -33.9, longitude: 151.2, timeZone: 'Australia/Sydney' },
  { latitude: 33.4, longitude: -112, timeZone: 'America/Phoenix' },
  { latitude: 69.6, longitude: 18.9, timeZone: 'Europe/Oslo' },
  { latitude: 27.7, longitude: 85.3, timeZone: 'Asia/Kathmandu' },
];
const swimHours = [
  { from: '10:00', to: '20:00' },
  { from: '06:30', to: '22:15' },
  { from: '17:00', to: '02:00' },
  { from: '00:00', to: '00:00' },
  { from: '09:00', to: '13:00' },
];

const pool = fc.record(
  {
    place: fc.constantFrom(...places),
    volume: fc.oneof(number(10, 150), number(1, 1000)),
    volumeEstimated: fc.boolean(),
    meanDepth: number(0.6, 3),
    surface: fc.constantFrom('plaster', 'vinyl', 'fibreglass', 'tile', 'painted'),
    sunExposure: number(0, 1),
    cover: fc.constantFrom('none', 'none', 'floating', 'opaque'),
    waterFeatures: fc.boolean(),
    fillWater: fc.record({ calciumHardness: number(0, 500), totalAlkalinity: number(20, 250), pH: number(6.5, 8.3) }),
    pump: fc.constantFrom([{ from: '08:00', to: '16:00' }], [], [{ from: '22:00', to: '06:00' }]),
    feeder: fc.record({
      kind: mostly(fc.constant('inline'), fc.constantFrom('none', 'floating')),
      ingredient: mostly(fc.constant('trichlor'), fc.constant('calcium-hypochlorite')),
      capacity: fc.integer({ min: 0, max: 12 }),
      loaded: sometimes(number(0, 1500)),
    }),
    swimHours: mostly(fc.constant(swimHours[0]!), fc.constantFrom(...swimHours)),
    swimLimit: fc.constantFrom(4, 4, 5, 10),
  },
  { requiredKeys: ['place', 'volume', 'feeder'] },
);

const reading = fc.record(
  {
    method: fc.constantFrom('strip', 'drop-kit', 'slip'),
    freeChlorine: fc.oneof(number(0, 6), number(0, 20), fc.record({ low: number(0, 2), high: number(2, 5) })),
    combinedChlorine: number(0, 2),
    pH: mostly(number(7.2, 7.8), number(6.5, 8.6)),
    totalAlkalinity: number(50, 200),
    calciumHardness: number(20, 800),
    cyanuricAcid: mostly(number(20, 70), number(0, 200)),
    temperature: number(8, 36),
  },
  { requiredKeys: ['freeChlorine', 'pH'] },
);

const shelf = fc
  .tuple(
    fc.record(
      {
        strength: number(80, 91.5),
        tabletMass: fc.constantFrom(20, 200, 227, 250),
        pricePerKg: number(0, 30),
        stock: number(0, 6000),
      },
      { requiredKeys: ['stock'] },
    ),
    fc.record(
      {
        strength: number(45, 78),
        labelWay: fc.constantFrom('dissolve', 'dissolve', 'broadcast', 'feeder-only', 'unknown'),
        measure: number(5, 300),
        alkali: number(0, 5),
        pricePerKg: number(0, 30),
        stock: number(0, 5000),
      },
      { requiredKeys: ['stock'] },
    ),
    fc.record(
      {
        strength: number(3, 15),
        boughtOn: fc.constantFrom('2026-06-20', '2026-01-10', '2025-07-01'),
        storedAt: number(5, 38),
        measure: number(20, 1000),
        pricePerLitre: number(0, 5),
        stock: number(0, 30000),
      },
      { requiredKeys: ['stock'] },
    ),
    mostly(fc.constant<string[]>(['tabs', 'gran', 'liq']), fc.subarray<string>(['tabs', 'gran', 'liq'])),
  )
  .map(([tabs, gran, liq, kept]) =>
    [
      { id: 'tabs', form: 'tablet', substance: 'trichlor', ...tabs },
      { id: 'gran', form: 'granular', substance: 'calcium-hypochlorite', ...gran },
      { id: 'liq', form: 'liquid', substance: 'sodium-hypochlorite', ...liq },
    ].filter(({ id }) => kept.includes(id)),
  );

/** Hours before or after the reading at which something went in, what, and how much for each m3. */
const given = fc.array(
  fc.record({
    hours: number(-200, 60),
    what: fc.constantFrom('tabs', 'gran', 'liq'),
    perCubicMetre: number(0.5, 6),
  }),
  { maxLength: 3 },
);

/** Scenarios as a household might send them and somewhat beyond: most of them plausible, some of them far out. */
export const anyScenario: fc.Arbitrary<Scenario> = fc
  .record({
    pool,
    reading,
    earlier: fc.option(reading, { nil: undefined }),
    shelf,
    given,
    takenAt: mostly(
      fc.constantFrom('2026-07-05T19:00:00-04:00', '2026-06-21T08:13:00-04:00'),
      fc.constantFrom('2026-12-20T12:00:00-05:00', '2026-03-06T20:00:00-05:00', '2026-10-23T18:30:00+02:00'),
    ),
    nowAfter: mostly(fc.constant(undefined), fc.oneof(number(0, 100), number(0, 320))),
    week: fc.record(
      {
        sky: days(number(0, 1)),
        rain: days(sometimes(number(0, 80))),
        swimmerHours: days(sometimes(number(0, 60))),
        waterTemperature: days(number(8, 36)),
        evaporation: days(number(0, 12)),
        backwash: days(sometimes(number(0, 20))),
      },
      { requiredKeys: [] },
    ),
    preferences: fc.record(
      {
        visits: fc.integer({ min: 1, max: 7 }),
        money: number(0, 3),
        evenings: number(0, 3),
        steadiness: number(0, 3),
        avoid: mostly(fc.constant<string[]>([]), fc.subarray<string>(['tablet', 'calcium-hypochlorite', 'liq'])),
      },
      { requiredKeys: [] },
    ),
  })
  .map(({ pool: { place, ...rest }, reading: newest, earlier, nowAfter, takenAt, shelf: products, ...scenario }) => {
    const at = (hours: number) => new Date(Date.parse(takenAt) + hours * 3_600_000).toISOString();
    const doses = scenario.given.flatMap(({ hours, what, perCubicMetre }) => {
      const product = products.find(({ id }) => id === what);
      if (!product) return [];
      const unit = what === 'tabs' ? 'tablet' : what === 'gran' ? 'g' : 'mL';
      const amount = perCubicMetre * rest.volume * (what === 'liq' ? 5 : 1);
      return [{ at: at(hours), product: what, amount: what === 'tabs' ? Math.ceil(amount / 200) : amount, unit }];
    });
    return scenarioSchema.parse({
      ...scenario,
      pool: { ...rest, ...place },
      shelf: products,
      given: doses,
      reading: [...(earlier ? [{ ...earlier, takenAt: at(-150) }] : []), { ...newest, takenAt }],
      ...(nowAfter === undefined ? {} : { now: at(nowAfter) }),
    });
  });
