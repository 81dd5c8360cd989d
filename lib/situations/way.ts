import type { MeasuredQuantity } from '@/lib/schemas/measured-range';
import type { Fact } from '@/lib/schemas/plan';
import type { Treatment } from '@/lib/schemas/treatment';
import { addDays, dayOf } from '@/lib/calendar/household-day';
import { wallToInstant } from '@/lib/calendar/wall-time';
import type { Call, Caution, Ending, Headline, Reason, StepCode } from './codes';
import type { SituationRecord } from './record';

/** A step before anybody has done it. A test is done by a reading since an instant that has what it wants. */
export type Asked = {
  id: string;
  code: StepCode;
  /** When it is to be done [ms]. */
  at: number;
  figures?: Record<string, number | string>;
} & ({ kind: 'tick' } | { kind: 'test'; since: number; wants: readonly MeasuredQuantity[] });

/** Where a procedure stands: what leads the plan, what is to be done, and whether its rule for the end is met. */
export type Way = {
  branch: string;
  /** Its own doses, no dose, or the plan as usual. */
  lead: { kind: 'treat'; treatment: Treatment } | { kind: 'hold' } | { kind: 'follow' };
  stayOut: boolean;
  headline: Headline;
  cautions: readonly Caution[];
  reasons: readonly (Fact & { code: Reason })[];
  steps: readonly Asked[];
  doneWhen: Ending;
  done: boolean;
  callWhen: readonly Call[];
  callNow: boolean;
};

export const hold: Way['lead'] = { kind: 'hold' };
export const follow: Way['lead'] = { kind: 'follow' };

/** Quick check: what one minute reads. */
export const quick: readonly MeasuredQuantity[] = ['freeChlorine', 'pH'];

/** The instant of a wall time so many days after the opening; of the day itself no earlier than the opening. */
export function dayAt({ openedAt, pool }: SituationRecord, days: number, time = '08:00'): number {
  const day = addDays(dayOf(openedAt, pool.timeZone), days);
  return Math.max(openedAt, wallToInstant(day, time, pool.timeZone).instant);
}

/** Steps to tick at once, in the order in which they protect. */
export function ticksNow({ openedAt }: SituationRecord, codes: readonly StepCode[]): Asked[] {
  return codes.map((code) => ({ id: code, code, at: openedAt, kind: 'tick' }));
}

export function tick(code: StepCode, at: number, figures?: Asked['figures'], id: string = code): Asked {
  return { id, code, at, kind: 'tick', ...(figures ? { figures } : {}) };
}

/** A test that counts from an instant on; it is asked for at `at`. */
export function test(code: StepCode, at: number, wants = quick, from = at, id: string = code): Asked {
  return { id, code, at, kind: 'test', since: from, wants };
}

/** Whether all of the steps are ticked. */
export function allTicked({ ticks }: SituationRecord, steps: readonly Asked[]): boolean {
  return steps.every(({ kind, id }) => kind !== 'tick' || ticks.has(id));
}
