import 'server-only';
import type { StoredDose } from '@/db/queries/plan-doses';
import type { StoredPlan } from '@/db/queries/plans';
import type { StoredPoolEvent } from '@/db/queries/pool-events';
import type { StoredReading } from '@/db/queries/readings';
import type { WeekDayRow } from '@/db/queries/week-days';
import { addDays, dayOf, startOfDay } from '@/lib/calendar/household-day';
import { intervalsOfDay, toOffsetIso } from '@/lib/calendar/wall-time';
import { middleOf } from '@/lib/projection/reading-error';
import type { MeasuredQuantity } from '@/lib/schemas/measured-range';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import type { Pool } from '@/lib/schemas/pool';
import type { PoolEventKind } from '@/lib/schemas/pool-event';
import type { Situation, SituationKind } from '@/lib/schemas/situation';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { codeMinimum, limits, lowestLevel } from '@/lib/standards/limits';
import { type MeasuredValue, type SpreadAmount, swimVerdict, type SwimVerdictInput } from '@/lib/verdict';
import type { ZeroDoubt } from './false-zero';

/** All that the verdict of a household stands on, as it is known at one moment. */
export type VerdictGround = {
  now: number;
  pool: Pool;
  /** Newest first. */
  readings: readonly StoredReading[];
  zeroDoubt: ZeroDoubt;
  /** The newest plan; null when it does not know all that is known. */
  plan: StoredPlan | null;
  /** The doses that count, in both forms. */
  doses: readonly { stored: StoredDose; shown: PlanDose }[];
  /** What was said of the days from that of the reading on. */
  days: readonly WeekDayRow[];
  /** What nobody has said to be over. */
  events: readonly StoredPoolEvent[];
  /** One person skipped a dose since the test that another one added. */
  tickInDoubt: boolean;
  /** The open situation, when it keeps everybody out. */
  staysOut: Situation | null;
  /** When a situation was last ended before its rule was met [ms]. */
  endedEarlyAt: number | null;
};

/** The swim verdict of this moment, as the sheet shows it. */
export function sheetVerdict(ground: VerdictGround): WeekSheet['verdict'] {
  const { timeZone } = ground.pool;
  const { state, reasons, until, adviseDailyCheck } = swimVerdict(verdictInputOf(ground));
  const iso = (instant: number) => toOffsetIso(instant, timeZone);
  return {
    state,
    reasons: reasons.map(({ until: end, ...reason }) => ({
      ...reason,
      // How much too much it is was never read.
      ...(ground.zeroDoubt === 'bleached' && reason.measured ? { measured: false } : {}),
      ...(end === undefined ? {} : { until: iso(end) }),
    })),
    until: until === undefined ? null : iso(until),
    adviseDailyCheck,
  };
}

/** Situations that keep people out by a reason of their own. */
const named: readonly SituationKind[] = ['accident', 'clearing', 'drain-cover'];

function verdictInputOf(ground: VerdictGround): SwimVerdictInput {
  const { now, pool, readings, zeroDoubt, plan, doses, events, staysOut, endedEarlyAt } = ground;
  const freeChlorine = newest(readings, 'freeChlorine');
  const pH = newest(readings, 'pH');
  const combinedChlorine = newest(readings, 'combinedChlorine');
  const since = Math.min(freeChlorine?.takenAt ?? now, pH?.takenAt ?? now);
  const happened = (kind: PoolEventKind) => events.some((event) => event.kind === kind);
  const open = doses.filter(
    ({ stored }) => stored.status === 'planned' && stored.at.getTime() <= now && stored.at.getTime() > since,
  );
  const { swimming, rain } = spreadDays(ground, since);
  const clearing = staysOut?.kind === 'clearing' ? staysOut.answers.look : null;
  const electric =
    staysOut?.kind === 'storm' && (staysOut.answers.shock === 'yes' || staysOut.answers.pumpRoom === 'wet');
  const past = swimming.filter(({ until }) => until <= now);
  return {
    now,
    volume: pool.volume,
    swimDay: isSwimDay(ground),
    limits: limitsNow(ground),
    readings: {
      ...(freeChlorine ? countedChlorine(freeChlorine, zeroDoubt) : {}),
      ...(pH ? { pH } : {}),
      ...(combinedChlorine ? { combinedChlorine } : {}),
    },
    ...(plan?.result.projection
      ? { projection: { ...plan.result.projection, hours: plan.result.hours.map((hour) => Date.parse(hour)) } }
      : {}),
    waits: doses
      .filter(({ stored }) => stored.status !== 'skipped')
      .map(({ stored, shown }) => ({
        from: (stored.givenAt ?? stored.at).getTime(),
        until: Date.parse(shown.waitUntil),
      })),
    sinceReading: {
      rainMillimetres: rain.reduce((sum, day) => sum + day.amount * shareBefore(day, now), 0),
      storm: happened('storm'),
      swimmerHoursInADay: Math.max(0, ...past.map(({ amount }) => amount)),
      pumpFailure: happened('pump-failure'),
      dueDoseOpen: open.length > 0,
      doubtfulTick: ground.tickInDoubt,
      coverOffAfterAWeek: happened('cover-off'),
      situationEndedEarly: endedEarlyAt !== null && endedEarlyAt > since,
    },
    open: {
      cloudy: readings[0]?.look === 'cloudy' || (clearing !== null && clearing !== 'green'),
      green: readings[0]?.look === 'green' || clearing === 'green',
      accident: staysOut?.kind === 'accident',
      drainCoverBroken: happened('drain-cover') || staysOut?.kind === 'drain-cover',
      electricitySuspected: electric,
      situationOpen: staysOut !== null && !electric && !named.includes(staysOut.kind),
      suspectedDoubleDose: doses.some(({ shown }) => shown.doubtful),
      falseZero: zeroDoubt === 'open',
    },
    ahead: { rain, swimmerHours: swimming.filter(({ until }) => until > now) },
  };
}

function newest(readings: readonly StoredReading[], quantity: MeasuredQuantity): MeasuredValue | undefined {
  const reading = readings.find(({ values }) => values[quantity] !== undefined);
  const value = reading?.values[quantity];
  return reading && value !== undefined ? { value: middleOf(value), takenAt: reading.takenAt.getTime() } : undefined;
}

/** A zero that may be far too much counts for nothing until it is answered; when the colour flashed it is too much. */
function countedChlorine(reading: MeasuredValue, doubt: ZeroDoubt): { freeChlorine?: MeasuredValue } {
  if (doubt === 'open') return {};
  if (doubt !== 'bleached') return { freeChlorine: reading };
  return { freeChlorine: { ...reading, value: Math.max(reading.value, 2 * limits.freeChlorineMaximum.value) } };
}

/** Where stabilizer was never measured the higher minimum holds: nobody knows that the water is free of it. */
function limitsNow({ pool, readings, doses }: VerdictGround): SwimVerdictInput['limits'] {
  const stabilizer = newest(readings, 'cyanuricAcid');
  const used =
    stabilizer === undefined ||
    pool.feeder.ingredient === 'trichlor' ||
    doses.some(({ stored }) => stored.substance === 'trichlor' || stored.substance === 'dichlor');
  const value = stabilizer?.value ?? 0;
  return { codeMinimum: codeMinimum(value, used), lowestLevel: lowestLevel(value, used), swimLimit: pool.swimLimit };
}

/** A day of which nothing was said may be one on which somebody swims. */
function isSwimDay({ now, pool, days }: VerdictGround): boolean {
  const today = dayOf(now, pool.timeZone);
  const said = days.find(({ day }) => day === today)?.swimmerHours;
  return said === undefined || said === null || said > 0;
}

/** Rain and swimmers of each day, spread over the part of it that lies after the reading. */
function spreadDays({ pool, days }: VerdictGround, since: number): { swimming: SpreadAmount[]; rain: SpreadAmount[] } {
  const swimming: SpreadAmount[] = [];
  const rain: SpreadAmount[] = [];
  for (const { day, swimmerHours, rainMillimetres } of days) {
    const whole = { from: startOfDay(day, pool.timeZone), until: startOfDay(addDays(day, 1), pool.timeZone) };
    rain.push(...after({ ...whole, amount: rainMillimetres ?? 0 }, since));
    const [swim] = intervalsOfDay([pool.swimHours], day, pool.timeZone);
    if (swim) swimming.push(...after({ from: swim.from, until: swim.to, amount: swimmerHours ?? 0 }, since));
  }
  return { swimming, rain };
}

function after({ from, until, amount }: SpreadAmount, since: number): SpreadAmount[] {
  if (amount === 0 || until <= since) return [];
  const start = Math.max(from, since);
  return [{ from: start, until, amount: (amount * (until - start)) / (until - from) }];
}

function shareBefore({ from, until }: SpreadAmount, instant: number): number {
  return Math.min(1, Math.max(0, (instant - from) / (until - from)));
}
