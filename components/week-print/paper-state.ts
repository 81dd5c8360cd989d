import { instantOf } from '@/components/week-sheet/sheet-times';
import type { PrintedWeek } from '@/lib/schemas/printed-week';
import { type PaperEnd, paperEnd } from './paper-end';

/** Why nothing may be added from a page; `past` where nothing on it is still to be done. */
export type PaperBar =
  'past' | 'recordOnly' | 'doubtful' | 'untested' | 'noPlan' | 'needs' | 'dose' | Exclude<PaperEnd['why'], 'plan'>;

/** Good until something ends it, or not good at all. */
export type PaperState = { end: PaperEnd } | { bar: PaperBar };

/** Whether a page may be dosed by, and until when: worked out at the moment it is made, the gravest bar first. */
export function paperStateOf({ week, openDoses }: PrintedWeek): PaperState {
  const { plan, planProblem, doses, pool, lastReading, checks, days } = week;
  const now = instantOf(week.now);
  if (instantOf(days.at(-1)?.endsAt ?? week.now) <= now) return { bar: 'past' };
  if (pool.recordOnly) return { bar: 'recordOnly' };
  if (doses.some(({ doubtful }) => doubtful)) return { bar: 'doubtful' };
  if (lastReading === null) return { bar: 'untested' };
  if (plan === null || plan.stale || planProblem !== null) return { bar: 'noPlan' };
  if (plan.cost === null) return { bar: 'needs' };
  if (openDoses.some((at) => instantOf(at) <= now)) return { bar: 'dose' };
  const end = paperEnd({
    planEndsAt: instantOf(plan.endsAt),
    checks: checks.filter(({ done }) => !done).map(({ at, kind }) => ({ at: instantOf(at), kind })),
    doses: openDoses.map(instantOf),
  });
  if (end.at > now) return { end };
  return { bar: end.why === 'plan' ? 'noPlan' : end.why };
}
