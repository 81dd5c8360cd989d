import { addDays, type CalendarDay, daysBetween } from '@/lib/calendar/household-day';
import type { HandOver } from '@/lib/schemas/hand-over';

/** A stretch of the strip: the usual people, the same again after a hand-over, or whoever stands in. */
export type DutySegment = { day: CalendarDay; days: number } & (
  { kind: 'usual' | 'again' } | { kind: 'standIn'; handOver: HandOver }
);

export type DutyStripDays = {
  first: CalendarDay;
  last: CalendarDay;
  /** Of the whole strip. */
  days: number;
  segments: DutySegment[];
  ticks: { day: CalendarDay; /** From the left, 0 to 1. */ at: number; handOver: boolean }[];
};

const usualDays = 28;
/** What is seen of the time after a hand-over, and before one that begins only later. */
const daysAround = 7;

/** The days that the strip shows: four weeks from today; longer, or further ahead, where the next hand-over asks for it. */
export function dutyStripDays(today: CalendarDay, handOvers: readonly HandOver[]): DutyStripDays {
  const next = handOvers[0];
  const isFar = next !== undefined && daysBetween(today, next.fromDay) > usualDays - daysAround;
  const first = isFar ? addDays(next.fromDay, -daysAround) : today;
  const wanted = next === undefined ? 0 : daysBetween(first, next.untilDay) + 1 + daysAround;
  const days = Math.max(usualDays, wanted);
  const end = addDays(first, days);
  const segments: DutySegment[] = [];
  let day = first;
  let kind: 'usual' | 'again' = 'usual';
  for (const handOver of handOvers) {
    const from = later(handOver.fromDay, first);
    const until = earlier(addDays(handOver.untilDay, 1), end);
    if (from >= until) continue;
    if (day < from) segments.push({ kind, day, days: daysBetween(day, from) });
    segments.push({ kind: 'standIn', handOver, day: from, days: daysBetween(from, until) });
    day = until;
    kind = 'again';
  }
  if (day < end) segments.push({ kind, day, days: daysBetween(day, end) });
  return { first, last: addDays(end, -1), days, segments, ticks: ticksOf(first, days, segments) };
}

/** A label of a tick has this share of a phone's width, also at the right edge. */
const labelShare = 0.24;

/** Where hand-overs begin and end first, then every week as far as there is room. */
function ticksOf(first: CalendarDay, days: number, segments: readonly DutySegment[]): DutyStripDays['ticks'] {
  const turns = segments.filter(({ kind }, index) => kind === 'standIn' || index > 0).map(({ day }) => day);
  const weeks = Array.from({ length: Math.ceil(days / 7) }, (_, week) => addDays(first, week * 7));
  const ticks: DutyStripDays['ticks'] = [];
  for (const day of [...turns, ...weeks]) {
    const at = daysBetween(first, day) / days;
    const hasRoom = at <= 1 - labelShare && ticks.every((tick) => Math.abs(tick.at - at) >= labelShare);
    if (hasRoom) ticks.push({ day, at, handOver: turns.includes(day) });
  }
  return ticks.toSorted((one, other) => one.at - other.at);
}

const later = (one: CalendarDay, other: CalendarDay) => (one > other ? one : other);
const earlier = (one: CalendarDay, other: CalendarDay) => (one < other ? one : other);
