import type { BrokenLimit } from '@/lib/schemas/plan';
import { isSwimHour, tabletDoses, type Told, waterAtFirst } from './told';

/** By how much an hour of a plan breaks a limit; nothing or less where it keeps it. */
type Breach = (hour: number, told: Told) => { value: number; bound: number; by: number };

const under = (value: number, bound: number) => ({ value, bound, by: bound - value });
const over = (value: number, bound: number) => ({ value, bound, by: value - bound });
const of = ({ plan }: Told) => plan.projection!;

const breaches: Record<string, Breach> = {
  'code-minimum': (hour, told) => under(of(told).freeChlorine.p10[hour]!, minimumOf(hour, told)),
  'lowest-level': (hour, told) =>
    under(of(told).freeChlorine.p50[hour]!, Math.max(minimumOf(hour, told), of(told).cyanuricAcid.p50[hour]! / 20)),
  'swim-limit': (hour, told) =>
    isSwimHour(Date.parse(told.plan.hours[hour]!), told)
      ? over(of(told).freeChlorine.p50[hour]!, told.scenario.pool.swimLimit)
      : { value: 0, bound: 0, by: 0 },
  'free-chlorine-maximum': (hour, told) => over(of(told).freeChlorine.p90[hour]!, 10),
  'pH-low': (hour, told) => under(of(told).pH.p50[hour]!, 7.2),
  'pH-high': (hour, told) => over(of(told).pH.p50[hour]!, 7.8),
};

/** Stabilized water asks for 2, other water for 1: it is so from 10 on, or once a product that brings stabilizer went in. */
function minimumOf(hour: number, told: Told): number {
  return of(told).cyanuricAcid.p50[hour]! >= 10 || usesStabilized(told) ? 2 : 1;
}

export function usesStabilized(told: Told): boolean {
  const { given, shelf, pool } = told.scenario;
  const bring = shelf.filter(({ substance }) => substance === 'trichlor' || substance === 'dichlor');
  const loaded = pool.feeder.ingredient !== 'calcium-hypochlorite' && pool.feeder.loaded > 0;
  return tabletDoses(told).length > 0 || loaded || given.some(({ product }) => bring.some(({ id }) => id === product));
}

/** Whether a plan breaks a limit as it says: then, by so much, and at no other hour by more. */
export function brokenHolds({ limit, at, value, bound }: BrokenLimit, told: Told): boolean {
  if (limit === 'stabilizer-too-high-for-swim-limit') return stabilizerCloses({ value, bound }, told);
  const breach = breaches[limit];
  const hour = told.plan.hours.indexOf(at);
  if (!breach || hour < 0) return false;
  const found = breach(hour, told);
  const worst = Math.max(...told.plan.hours.map((_, index) => breach(index, told).by));
  const same = (a: number, b: number) => Math.abs(a - b) < 1e-6;
  return found.by > 0 && same(found.value, value) && same(found.bound, bound) && found.by >= worst - 1e-6;
}

function stabilizerCloses({ value, bound }: Pick<BrokenLimit, 'value' | 'bound'>, told: Told): boolean {
  const { swimLimit } = told.scenario.pool;
  const read = waterAtFirst(told, 'cyanuricAcid');
  // At the bound the lowest level lies half a mg/L under the swim limit.
  return Math.abs(value - read) < 0.5 && value > bound && Math.abs(bound / 20 - (swimLimit - 0.5)) < 1e-6;
}

/** Limits that a plan breaks and says nothing of. */
export function silentLimits(told: Told): string[] {
  const { plan } = told;
  if (!plan.projection || plan.cost === null) return [];
  const said = new Set(plan.broken.map(({ limit }) => limit));
  return Object.entries(breaches).flatMap(([limit, breach]) =>
    !said.has(limit) && plan.hours.some((_, hour) => breach(hour, told).by > 1e-6) ? [limit] : [],
  );
}
