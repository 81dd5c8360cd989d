import { projectScenario } from '@/lib/planner';
import type { WeekPlan } from '@/lib/schemas/plan';
import type { PlannedDose } from '@/lib/schemas/dose';
import type { Scenario } from '@/lib/schemas/scenario';
import type { ShelfProduct } from '@/lib/schemas/shelf-product';
import { daylightOf } from '@/lib/sun/daylight';

/** A plan and what it was made from: all that a sentence may be held against. */
export type Told = { scenario: Scenario; plan: WeekPlan };
/** Whether the sentence of a fact is true of a plan, as somebody takes it who reads it. */
export type Sentence = WeekPlan['reasons'][number];
export type Holds = (fact: Sentence, told: Told) => boolean;

const HOUR = 3_600_000;
/** The minute of the day at which a filter is backwashed. */
const NOON = 12 * 60;
const chlorine = ['trichlor', 'dichlor', 'calcium-hypochlorite', 'sodium-hypochlorite'];

export type Quantity = 'freeChlorine' | 'pH' | 'totalAlkalinity' | 'calciumHardness' | 'cyanuricAcid';

/** Whether two figures are written alike, give or take what rounding does to either. */
export function alike(told: unknown, found: number, decimals: number): boolean {
  return typeof told === 'number' && Math.abs(told - found) <= 0.5 * 10 ** -decimals + 1e-6;
}

export function number(figure: unknown): number {
  return typeof figure === 'number' ? figure : Number.NaN;
}

/**
 * What the plan's water is when its week begins. The first row of a curve already holds what happens in that very instant:
 * where something does, the week is reckoned again without it.
 */
export function waterAtFirst(told: Told, quantity: Quantity): number {
  const { projection } = happensAtFirst(told) ? weekWithoutIt(told) : told.plan;
  return projection?.median[quantity][0] ?? Number.NaN;
}

function happensAtFirst(told: Told): boolean {
  const { scenario, plan } = told;
  const first = takenAt(told);
  const backwashed = minuteOf(first, told) === NOON && scenario.week.backwash[0]! > 0;
  return backwashed || [...scenario.given, ...plan.doses].some(({ at }) => Date.parse(at) === first);
}

function weekWithoutIt(told: Told, week: Partial<Told['scenario']['week']> = {}): WeekPlan {
  const { scenario } = told;
  const given = scenario.given.filter(({ at }) => Date.parse(at) !== takenAt(told));
  const backwash = scenario.week.backwash.map(() => 0);
  return projectScenario({ ...scenario, given, doses: [], week: { ...scenario.week, backwash, ...week } });
}

export function readingsOf({ scenario }: Told) {
  return [scenario.reading].flat();
}

/** Whether any test has told a quantity. */
export function isMeasured(told: Told, quantity: Quantity | 'combinedChlorine'): boolean {
  return readingsOf(told).some((reading) => reading[quantity] !== undefined);
}

/** The newest reading, in which everything was read that is said of now. */
export function takenAt(told: Told): number {
  return Math.max(...readingsOf(told).map((reading) => Date.parse(reading.takenAt)));
}

export function tabletDoses({ plan }: Told): PlannedDose[] {
  return plan.doses.filter(({ unit }) => unit === 'tablet');
}

export function fastDoses({ plan }: Told): PlannedDose[] {
  return plan.doses.filter(({ unit, substance }) => unit !== 'tablet' && chlorine.includes(substance));
}

export function companionDoses({ plan }: Told): PlannedDose[] {
  return plan.doses.filter(({ substance }) => !chlorine.includes(substance));
}

export function sumOf<T>(all: readonly T[], each: (one: T) => number): number {
  return all.reduce((total, one) => total + each(one), 0);
}

export function productOf({ scenario }: Told, id: unknown): ShelfProduct | undefined {
  return scenario.shelf.find((product) => product.id === id);
}

/** Whether the household would rather not use a product. */
export function isAvoided({ scenario }: Told, { id, form, substance }: ShelfProduct): boolean {
  return [id, form, substance].some((name) => scenario.preferences.avoid.includes(name));
}

export function tabletsOnShelf({ scenario }: Told): ShelfProduct[] {
  return scenario.shelf.filter(
    ({ form, substance, stock, tabletMass = 227 }) =>
      form === 'tablet' && substance === 'trichlor' && stock >= tabletMass,
  );
}

/** Most grams of tablets that the water takes in a week: one of 230 g for 18 m3, and 6 mg/L of stabilizer. */
export function mostTabletGrams({ scenario }: Told, strength: number): number {
  const { volume } = scenario.pool;
  return Math.min((volume / 18) * 230, (6 * volume) / stabilizerShare(strength));
}

/** Stabilizer in a gram of trichlor, by molar masses: 129.08 of 3 times 70.91 of available chlorine [g/g]. */
export function stabilizerShare(strength: number): number {
  return ((strength / 100) * 129.08) / (3 * 70.91);
}

/** The household's day of an instant, from the machine's own zone database. */
export function dayAt(at: string, { scenario }: Told): string {
  return new Intl.DateTimeFormat('en-CA', { timeZone: scenario.pool.timeZone }).format(Date.parse(at));
}

/** Minutes after midnight by the household's clock, from the machine's own zone database. */
export function minuteOf(instant: number, { scenario }: Told): number {
  const clock = new Intl.DateTimeFormat('en-GB', {
    timeZone: scenario.pool.timeZone,
    hour: '2-digit',
    minute: '2-digit',
    hourCycle: 'h23',
  });
  return minutes(clock.format(instant));
}

function minutes(wall: string): number {
  return Number(wall.slice(0, 2)) * 60 + Number(wall.slice(3));
}

export function isSwimHour(instant: number, told: Told): boolean {
  const { swimHours } = told.scenario.pool;
  const [minute, from, to] = [minuteOf(instant, told), minutes(swimHours.from), minutes(swimHours.to)];
  return from < to ? minute >= from && minute < to : minute >= from || minute < to;
}

/** Hours from a dose to the sunset nearest to it; undefined where the sun does not set. */
export function hoursToSunset(dose: PlannedDose, told: Told): number | undefined {
  const away = awayFrom('sunset', dose, told);
  return away === undefined ? undefined : -away;
}

export function hoursFromSunrise(dose: PlannedDose, told: Told): number | undefined {
  return awayFrom('sunrise', dose, told);
}

/** Whether a dose goes in between a sunset and the next sunrise. */
export function isDark(dose: PlannedDose, told: Told): boolean {
  const [toSunset, fromSunrise] = [hoursToSunset(dose, told), hoursFromSunrise(dose, told)];
  if (toSunset === undefined || fromSunrise === undefined) return false;
  // The nearer of the two tells: just after a sunset, or just before a sunrise.
  return Math.abs(toSunset) < Math.abs(fromSunrise) ? toSunset < 0 : fromSunrise < 0;
}

function awayFrom(which: 'sunset' | 'sunrise', { at }: PlannedDose, { scenario: { pool } }: Told): number | undefined {
  const dose = Date.parse(at);
  const away = [-24, 0, 24].flatMap((hours) => {
    const instant = daylightOf(dose + hours * HOUR, pool.latitude, pool.longitude)[which];
    return instant === null ? [] : [(dose - instant) / HOUR];
  });
  return away.toSorted((a, b) => Math.abs(a) - Math.abs(b))[0];
}

/** pH in water as warm as it was read: the week's own warmth moves the curve's first pH. */
export function pHAsRead(told: Told): number {
  return weekWithoutIt(told, { waterTemperature: undefined }).projection?.median.pH[0] ?? Number.NaN;
}

/** The place of an instant among the plan's hours: the hour that has begun. */
export function hourAt(at: string, told: Told): number {
  return Math.floor((Date.parse(at) - takenAt(told)) / HOUR);
}

/** Free chlorine that the plan expects over an hour in which something goes in, before it does. */
export function levelBefore({ at }: PlannedDose, told: Told): number {
  return told.plan.projection?.freeChlorine.p50[Math.max(0, hourAt(at, told))] ?? Number.NaN;
}

/**
 * Whether a pH is that of the newest reading. What was read beside more chlorine than 10 counts for nothing; then it is
 * the one before, carried on.
 */
export function isPHNow(said: unknown, told: Told): boolean {
  const newest = readingsOf(told).find(({ takenAt: at }) => Date.parse(at) === takenAt(told));
  const middle = (value: number | { low: number; high: number }) =>
    typeof value === 'number' ? value : (value.low + value.high) / 2;
  const low = (value: number | { low: number }) => (typeof value === 'number' ? value : value.low);
  if (newest?.pH === undefined || low(newest.freeChlorine ?? 0) > 10) return alike(said, pHAsRead(told), 2);
  return alike(said, middle(newest.pH), 1);
}
