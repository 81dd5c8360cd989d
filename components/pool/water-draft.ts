import { z } from 'zod';
import { feederIngredients, feederKinds } from '@/lib/schemas/pool';
import type { SetupState } from '@/lib/schemas/pool-profile';
import { readingMethods } from '@/lib/schemas/reading-kinds';
import { formatForInput, formatNumber } from '@/lib/units/format';
import { parseDecimal, parseQuantity } from '@/lib/units/parse';
import { toInside, type UnitSystem } from '@/lib/units/unit';
import { hourOfWallTime, wallTimeOfHour } from './hours';

type WaterAnswers = NonNullable<SetupState['profile']['water']>;

export const waterDraftSchema = z.object({
  /** Running times of the pump, hours of the wall clock; the second before the first runs over midnight. */
  pump: z.array(z.object({ from: z.number(), to: z.number() })),
  feederKind: z.enum(feederKinds).nullable(),
  ingredient: z.enum(feederIngredients).nullable(),
  capacity: z.string(),
  /** Tablets in it now, and what one of them weighs in the measures below. */
  tablets: z.string(),
  tabletMass: z.string(),
  system: z.enum(['metric', 'us']),
  calciumHardness: z.string(),
  totalAlkalinity: z.string(),
  pH: z.string(),
  methods: z.array(z.enum(readingMethods)),
});
export type WaterDraft = z.infer<typeof waterDraftSchema>;

export const tabletUnit = (system: UnitSystem) => (system === 'metric' ? 'g' : 'oz');

/** Common running time, until the person says another. */
const usualPump = { from: 8, to: 16 };

export function emptyWater(system: UnitSystem): WaterDraft {
  return {
    pump: [usualPump],
    feederKind: null,
    ingredient: null,
    capacity: '',
    tablets: '',
    tabletMass: '',
    system,
    calciumHardness: '',
    totalAlkalinity: '',
    pH: '',
    methods: [],
  };
}

export function waterDraftOf(water: WaterAnswers, system: UnitSystem, locale: string): WaterDraft {
  const { pump, feeder, fillWater, testMethods } = water;
  const text = (value: number | undefined) =>
    value === undefined ? '' : formatForInput(value, 'totalAlkalinity', 'mg/L', locale);
  return {
    ...emptyWater(system),
    pump: pump.map(({ from, to }) => ({ from: hourOfWallTime(from), to: hourOfWallTime(to, true) })),
    feederKind: feeder.kind,
    ingredient: feeder.ingredient ?? null,
    capacity: feeder.capacity === 0 ? '' : formatNumber(feeder.capacity, { decimals: 0, locale }),
    // How many tablets the mass was counted from is not kept: it comes back as one lump.
    ...(feeder.loaded > 0
      ? { tablets: '1', tabletMass: formatForInput(feeder.loaded, 'mass', tabletUnit(system), locale) }
      : {}),
    calciumHardness: text(fillWater.calciumHardness),
    totalAlkalinity: text(fillWater.totalAlkalinity),
    pH: text(fillWater.pH),
    methods: testMethods,
  };
}

export function waterInSystem(draft: WaterDraft, system: UnitSystem, locale: string): WaterDraft {
  if (draft.system === system) return draft;
  const grams = parseQuantity(draft.tabletMass, 'mass', tabletUnit(draft.system));
  const unit = tabletUnit(system);
  const fine = unit === 'g' ? 1 : 10;
  const tabletMass =
    grams === undefined
      ? draft.tabletMass
      : formatForInput(toInside(Math.round((grams / toInside(1, unit)) * fine) / fine, unit), 'mass', unit, locale);
  return { ...draft, tabletMass, system };
}

/** What the fields say, as the schema of the answers wants it; what is no number becomes NaN, which it refuses in words. */
export function waterAnswersOf(draft: WaterDraft): unknown {
  const optional = (name: 'calciumHardness' | 'totalAlkalinity' | 'pH') =>
    draft[name].trim() === '' ? {} : { [name]: parseDecimal(draft[name]) ?? Number.NaN };
  return {
    pump: draft.pump.map(({ from, to }) => ({ from: wallTimeOfHour(from), to: wallTimeOfHour(to) })),
    feeder: feederAnswers(draft),
    fillWater: { ...optional('calciumHardness'), ...optional('totalAlkalinity'), ...optional('pH') },
    testMethods: readingMethods.filter((method) => draft.methods.includes(method)),
  };
}

function feederAnswers({ feederKind, ingredient, capacity, tablets, tabletMass, system }: WaterDraft): unknown {
  if (feederKind === null || feederKind === 'none') return { kind: feederKind ?? undefined };
  const count = tablets.trim() === '' ? 0 : (parseDecimal(tablets) ?? Number.NaN);
  const mass = count === 0 ? 0 : (parseQuantity(tabletMass, 'mass', tabletUnit(system)) ?? Number.NaN);
  return {
    kind: feederKind,
    ingredient: ingredient ?? undefined,
    capacity: capacity.trim() === '' ? 0 : (parseDecimal(capacity) ?? Number.NaN),
    loaded: count * mass,
  };
}

/** Hours of a day in which the pump runs; where two running times overlap they count once. */
export function pumpHours(pump: WaterDraft['pump']): number {
  const quarters = Array.from({ length: 96 }, (_, index) => index / 4 + 0.125);
  const runs = (hour: number) =>
    pump.some(({ from, to }) => (from <= to ? hour >= from && hour < to : hour >= from || hour < to));
  return quarters.filter(runs).length / 4;
}
