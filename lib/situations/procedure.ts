import { addDays, dayOf } from '@/lib/calendar/household-day';
import { toOffsetIso } from '@/lib/calendar/wall-time';
import type { MeasuredQuantity } from '@/lib/schemas/measured-range';
import type { PlannedDose } from '@/lib/schemas/dose';
import type { Morning, Procedure, SituationStep } from '@/lib/schemas/situation';
import { type Headline, severityOf } from './codes';
import { EARLY, morningSteps } from './morning-steps';
import { morningAfter, type PromiseAt } from './mornings';
import type { SituationRecord, Taken } from './record';
import { type Asked, test, type Way } from './way';

/** A dose of the plan since a procedure was opened, as it stands now. Instants in ms. */
export type SituationDose = Pick<PlannedDose, 'substance' | 'form' | 'amount' | 'unit' | 'toBuy'> & {
  id: string;
  at: number;
  pumpUntil: number | null;
  givenAt: number | null;
  doneBy: string | null;
};

type Around = {
  /** Doses since the opening that were given or are planned, oldest first. */
  doses: readonly SituationDose[];
  /** Who ticked each step; null for a former member. */
  tickedBy: ReadonlyMap<string, string | null>;
  promise: PromiseAt;
  now: number;
};

/** What an open procedure shows at one moment: its way, with the doses of the plan and who did what woven in. */
export function procedureOf(way: Way, record: SituationRecord, around: Around): Procedure {
  const { timeZone } = record.pool;
  const { doses } = around;
  const iso = (instant: number) => toOffsetIso(instant, timeZone);
  const next = doses.find(({ givenAt }) => givenAt === null);
  const asked = [...way.steps, ...(next ? followUps(next, record) : [])];
  const steps = [
    ...asked.map((step) => stepOf(step, record, around, iso)),
    ...doses.map((dose) => doseStep(dose, record, iso)),
  ].toSorted((a, b) => Date.parse(a.at) - Date.parse(b.at));
  const nextTest = steps.find(({ kind, doneAt }) => kind === 'test' && doneAt === null);
  return {
    branch: way.branch,
    lead: way.lead.kind,
    stayOut: way.stayOut,
    headline: headlineOf(way, next, record, around.now, iso),
    cautions: way.cautions.map((code) => ({ code, severity: severityOf(code) })),
    reasons: [...way.reasons],
    steps,
    mornings: [...record.mornings, ...(next ? expectedMorning(next, record, around.promise) : [])],
    doneWhen: way.doneWhen,
    done: way.done,
    callWhen: [...way.callWhen],
    callNow: way.callNow,
    nextTestAt: nextTest?.at ?? null,
  };
}

function headlineOf(
  { headline, lead, stayOut }: Way,
  next: SituationDose | undefined,
  { pool: { timeZone } }: SituationRecord,
  now: number,
  iso: (instant: number) => string,
): Procedure['headline'] {
  if (stayOut || lead.kind !== 'treat') return { code: headline };
  if (!next) return { code: 'test-next' satisfies Headline };
  const tonight = dayOf(next.at, timeZone) === dayOf(now, timeZone);
  return { code: (tonight ? 'dose-tonight' : 'dose-on') satisfies Headline, at: iso(next.at) };
}

function stepOf(
  step: Asked,
  record: SituationRecord,
  { tickedBy }: Around,
  iso: (instant: number) => string,
): SituationStep {
  const doneAt = step.kind === 'tick' ? record.ticks.get(step.id) : testedAt(step, record.readings);
  return {
    id: step.id,
    at: iso(step.at),
    kind: step.kind,
    code: step.code,
    figures: step.figures ?? {},
    doseId: null,
    doneAt: doneAt === undefined ? null : iso(doneAt),
    doneBy: tickedBy.get(step.id) ?? null,
  };
}

/** When readings since an instant had all that a test wants. */
function testedAt(
  { since, wants }: { since: number; wants: readonly MeasuredQuantity[] },
  readings: readonly Taken[],
): number | undefined {
  return readings.find(
    ({ takenAt, values }) => takenAt >= since && wants.every((quantity) => values[quantity] !== undefined),
  )?.takenAt;
}

function doseStep(dose: SituationDose, { pool }: SituationRecord, iso: (instant: number) => string): SituationStep {
  const { id, at, substance, form, amount, unit, toBuy, pumpUntil, givenAt, doneBy } = dose;
  return {
    id: `dose-${substance}-${dayOf(at, pool.timeZone)}`,
    at: iso(at),
    kind: 'dose',
    code: 'dose',
    figures: { amount, unit, substance, form, toBuy: toBuy ? 1 : 0, ...(pumpUntil ? { until: iso(pumpUntil) } : {}) },
    doseId: id,
    doneAt: givenAt === null ? null : iso(givenAt),
    doneBy,
  };
}

/** What is read on the morning after a dose that is still to come. */
function followUps({ at, substance }: SituationDose, { situation, pool: { timeZone } }: SituationRecord): Asked[] {
  if (!substance.endsWith('hypochlorite')) return [];
  const morning = morningAfter(dayOf(at, timeZone), timeZone);
  switch (situation.kind) {
    case 'clearing':
      return morningSteps(morning, timeZone);
    case 'combined-chlorine': {
      const wants = ['freeChlorine', 'combinedChlorine', 'pH'] as const;
      return [test('test-combined', morning, wants, morning - EARLY, `test-combined-${dayOf(morning, timeZone)}`)];
    }
    case 'quick-raise':
      return [test('morning-reading', morning, ['freeChlorine', 'pH'], morning - EARLY)];
    default:
      return [];
  }
}

/** The morning that a dose to come leads to: its band, and how many in a row it would make. */
function expectedMorning(
  { at, substance }: SituationDose,
  { situation, mornings, pool: { timeZone } }: SituationRecord,
  promise: PromiseAt,
): Morning[] {
  if (situation.kind !== 'clearing' || !substance.endsWith('hypochlorite')) return [];
  const day = addDays(dayOf(at, timeZone), 1);
  const band = promise(morningAfter(dayOf(at, timeZone), timeZone));
  return [
    {
      day,
      takenAt: null,
      freeChlorine: null,
      low: band?.low ?? null,
      high: band?.high ?? null,
      inside: null,
      drainSeen: null,
      inARow: (mornings.at(-1)?.inARow ?? 0) + 1,
    },
  ];
}
