import { addDays, startOfDay } from '@/lib/calendar/household-day';
import { toOffsetIso, wallToInstant } from '@/lib/calendar/wall-time';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import type { RecordedReading } from '@/lib/schemas/reading';
import type { SheetCurve, WeekSheet } from '@/lib/schemas/week-sheet';

const HOUR = 3_600_000;
const planId = '7b0f5c9e-5f0a-4f4e-9a67-0d5c1b1f3a10';

/** An id that stays the same from run to run. */
export function idOf(number: number): string {
  return `00000000-0000-4000-8000-${String(number).padStart(12, '0')}`;
}

export type WeekOptions = {
  /** First day of the sheet. */
  start?: string;
  timeZone?: string;
  /** Day and wall time of now. */
  now?: [day: string, time: string];
};

const standard = { start: '2026-07-06', timeZone: 'Europe/Paris', now: ['2026-07-08', '10:20'] } as const;

/**
 * A sheet as the server would answer, with a toy water whose numbers only have to be plausible: sun takes a share of the
 * chlorine, tablets feed some, each dose lifts it. Everything may be overridden afterwards.
 */
export function aWeekSheet(options: WeekOptions = {}, overrides: Partial<WeekSheet> = {}): WeekSheet {
  const { start, timeZone } = { ...standard, ...options };
  const [nowDay, nowTime] = options.now ?? standard.now;
  const at = (day: number, time: string) => wallToInstant(addDays(start, day), time, timeZone).instant;
  const iso = (instant: number) => toOffsetIso(instant, timeZone);
  const now = wallToInstant(nowDay, nowTime, timeZone).instant;
  const takenAt = at(-1, '19:00');
  const days = Array.from({ length: 7 }, (_, index) => aDay(addDays(start, index), timeZone, index));
  const doses = theDoses(at, iso, now);
  const water = toyWater(takenAt, 168, timeZone, doses);
  const upToNow = water.filter((hour) => hour.at <= now && hour.at >= startOfDay(start, timeZone));
  const readings = theReadings(at, iso).filter(({ takenAt: taken }) => Date.parse(taken) <= now);
  return {
    now: iso(now),
    household: { name: 'Marrow Lane', timeZone, unitSystem: 'metric', locale: 'en-GB', demo: false },
    me: { id: idOf(1), name: 'Ines', role: 'owner', handlesChemicals: true },
    pool: {
      volume: 62,
      surface: 'plaster',
      swimLimit: 4,
      swimLimitSetBy: null,
      swimHours: { from: '10:00', to: '20:00' },
      stabilizerBand: [30, 60],
      recordOnly: false,
    },
    days,
    verdict: { state: 'fine', reasons: [], until: iso(at(3, '19:30')), adviseDailyCheck: false },
    behind: upToNow.length === 0 ? null : curveOf(upToNow, iso, -0.1),
    ahead: curveOf(water, iso, 0),
    plan: {
      id: planId,
      version: 3,
      createdAt: iso(takenAt + 60_000),
      takenAt: iso(takenAt),
      endsAt: iso(takenAt + 168 * HOUR),
      stale: false,
      reasons: [
        { code: 'lowest-level-follows-stabilizer', stabilizer: 43, lowestLevel: 2.15 },
        { code: 'tablets-carry', tablets: 3, rise: 4.2, stabilizer: 4.1 },
        { code: 'fast-closes-gap', form: 'granular', evenings: 4, rise: 2.65 },
        { code: 'water-values-assumed', quantity: 'calciumHardness', value: 220 },
      ],
      cautions: [],
      broken: [],
      needs: [],
      mix: { money: 13.4, visits: 5, swing: 1.3, stabilizer: 4.1, hardness: 3, kilograms: 0.95, hoursOutside: 0 },
      alternatives: theAlternatives(),
      cost: { money: 13.4, visits: 4, shortfall: 0.2, excess: 0, stabilizer: 1.1, hardness: 0.3, pH: 0.1, total: 19.1 },
      openSwimShare: 1,
    },
    changes: null,
    planProblem: null,
    lastReading: readings.at(-1) ?? null,
    questioned: [],
    unrecorded: false,
    readings: readings.filter(({ takenAt: taken }) => Date.parse(taken) >= startOfDay(start, timeZone)),
    situation: null,
    tryOuts: [],
    events: [],
    doses,
    checks: [
      { at: iso(at(3, '19:00')), kind: 'quick', reason: 'swim-day-after-two-days', done: false },
      { at: iso(at(5, '10:00')), kind: 'quick', reason: 'swim-day-after-two-days', done: false },
      { at: iso(at(6, '19:00')), kind: 'full', reason: 'next-week', done: false },
    ],
    ...overrides,
  };
}

function aDay(day: string, timeZone: string, index: number): WeekSheet['days'][number] {
  const startsAt = startOfDay(day, timeZone);
  const endsAt = startOfDay(addDays(day, 1), timeZone);
  const sunrise = wallToInstant(day, '06:05', timeZone).instant;
  const sunset = wallToInstant(day, '20:40', timeZone).instant;
  const sky = [0.9, 0.7, 0.95, 0.85, 0.9, 0.95, 0.4][index] ?? 0.8;
  const iso = (instant: number) => toOffsetIso(instant, timeZone);
  return {
    day,
    startsAt: iso(startsAt),
    endsAt: iso(endsAt),
    sunrise: iso(sunrise),
    sunset: iso(sunset),
    sun: hoursBetween(startsAt, endsAt).map((hour) => sky * sunAt(hour + HOUR / 2, sunrise, sunset)),
    rain: index === 6 ? 4 : 0,
    swimmerHours: [4, 6, 4, 4, 8, 14, 6][index] ?? 0,
  };
}

function hoursBetween(from: number, to: number): number[] {
  return Array.from({ length: Math.round((to - from) / HOUR) }, (_, index) => from + index * HOUR);
}

function sunAt(instant: number, sunrise: number, sunset: number): number {
  const share = (instant - sunrise) / (sunset - sunrise);
  return share <= 0 || share >= 1 ? 0 : Math.sin(Math.PI * share) ** 1.6;
}

type Hour = { at: number; chlorine: number; pH: number; stabilizer: number };

function toyWater(takenAt: number, hours: number, timeZone: string, doses: readonly PlanDose[]): Hour[] {
  let chlorine = 3.1;
  return Array.from({ length: hours + 1 }, (_, index) => {
    const at = takenAt + index * HOUR;
    if (index > 0) {
      const local = (new Date(at).getTime() / HOUR + (timeZone === 'Europe/Paris' ? 2 : 0)) % 24;
      const sun = sunAt(local, 6, 20.7);
      chlorine += 0.034 - chlorine * (0.005 + 0.0285 * sun);
      for (const dose of doses) {
        const poured = Date.parse(dose.givenAt ?? dose.at);
        if (dose.form !== 'tablet' && dose.status !== 'skipped' && poured > at - HOUR && poured <= at)
          chlorine += dose.rise;
      }
    }
    return { at, chlorine, pH: 7.42 + index * 0.0011, stabilizer: 43 + index * 0.024 };
  });
}

function curveOf(hours: readonly Hour[], iso: (instant: number) => string, shift: number): SheetCurve {
  const band = (value: (hour: Hour) => number, spread: (index: number) => number) => ({
    p10: hours.map((hour, index) => value(hour) - spread(index)),
    p50: hours.map(value),
    p90: hours.map((hour, index) => value(hour) + spread(index)),
  });
  return {
    hours: hours.map(({ at }) => iso(at)),
    freeChlorine: {
      ...band(
        ({ chlorine }) => chlorine + shift,
        (index) => 0.2 + index * 0.0012,
      ),
      lowestLevel: hours.map(({ stabilizer }) => Math.max(2, stabilizer / 20)),
      swimLimit: hours.map(() => 4),
    },
    pH: band(
      ({ pH }) => pH,
      (index) => 0.05 + index * 0.0003,
    ),
    cyanuricAcid: band(
      ({ stabilizer }) => stabilizer,
      () => 2.2,
    ),
  };
}

type At = (day: number, time: string) => number;
type Iso = (instant: number) => string;

/** A dose of granules one evening, planned; everything may be overridden. */
function aDose(number: number, at: number, iso: Iso, overrides: Partial<PlanDose> = {}): PlanDose {
  return {
    id: idOf(100 + number),
    planId,
    planVersion: 3,
    at: iso(at),
    product: 'granules',
    productName: 'Granules',
    toBuy: false,
    substance: 'calcium-hypochlorite',
    form: 'granular',
    amount: 95,
    unit: 'g',
    rise: 0.9,
    reason: 'closes-gap',
    labelWay: 'dissolve',
    measure: null,
    steps: 'granules-dissolve',
    status: 'planned',
    tickFrom: iso(at - 3 * HOUR),
    pumpUntil: iso(at + 4 * HOUR),
    waitUntil: iso(at + 4 * HOUR),
    givenAt: null,
    givenAmount: null,
    doneBy: null,
    recordedBy: null,
    tabletsLeft: null,
    claimedBy: null,
    undoUntil: null,
    doubtful: false,
    stopDue: false,
    ...overrides,
  };
}

function theDoses(at: At, iso: Iso, now: number): PlanDose[] {
  const given = (number: number, instant: number, by: string, overrides: Partial<PlanDose>): PlanDose =>
    instant > now
      ? aDose(number, instant, iso, overrides)
      : aDose(number, instant, iso, {
          status: 'given',
          givenAt: iso(instant + 2 * 60_000),
          givenAmount: overrides.amount ?? 95,
          doneBy: by,
          recordedBy: by,
          ...overrides,
        });
  const tablets: Partial<PlanDose> = {
    product: 'tablets',
    productName: 'Slow tablets',
    substance: 'trichlor',
    form: 'tablet',
    amount: 3,
    unit: 'tablet',
    rise: 4.2,
    reason: 'slow-supply',
    labelWay: 'feeder-only',
    steps: 'tablets-inline',
    pumpUntil: null,
  };
  return [
    given(1, at(0, '08:45'), 'Tom', tablets),
    given(2, at(0, '19:40'), 'Ines', { amount: 60, rise: 0.6 }),
    given(3, at(3, '19:40'), 'Ines', { amount: 95, rise: 0.9 }),
    given(4, at(4, '19:40'), 'Ines', { amount: 50, rise: 0.5 }),
    given(5, at(5, '19:40'), 'Ines', { amount: 65, rise: 0.65 }),
  ];
}

function theReadings(at: At, iso: Iso): RecordedReading[] {
  const reading = (number: number, instant: number, rest: Partial<RecordedReading>): RecordedReading => ({
    id: idOf(200 + number),
    takenAt: iso(instant),
    createdAt: iso(instant + 60_000),
    kind: 'quick',
    method: 'drop-kit',
    values: { freeChlorine: 3, pH: 7.5 },
    look: 'clear',
    zeroAnswer: null,
    note: null,
    doneBy: 'Tom',
    recordedBy: 'Tom',
    ...rest,
  });
  return [
    reading(1, at(-1, '19:00'), { kind: 'full', values: { freeChlorine: 3.1, pH: 7.4, cyanuricAcid: 43 } }),
    reading(2, at(0, '08:30'), { method: 'strip', values: { freeChlorine: { low: 1, high: 3 } } }),
    reading(3, at(1, '19:15'), { values: { freeChlorine: 3.3, pH: 7.5 } }),
  ];
}

function theAlternatives(): NonNullable<WeekSheet['plan']>['alternatives'] {
  const base = { feasible: true, doses: [], hoursOutside: 0, total: 20 };
  return [
    { ...base, kind: 'tablets', money: 15.2, visits: 1, swing: 0.7, stabilizer: 6, hardness: 0, kilograms: 1.2 },
    { ...base, kind: 'granular', money: 12.1, visits: 7, swing: 2, stabilizer: -0.9, hardness: 11, kilograms: 1.6 },
    { ...base, kind: 'liquid', money: 20.7, visits: 7, swing: 1.9, stabilizer: -0.9, hardness: 0, kilograms: 13.6 },
  ];
}
