import { type Draft, questionsOf, readAnswers } from '@/components/situations/questions';
import { poolSchema } from '@/lib/schemas/pool';
import { type Procedure, type Situation, situationKinds } from '@/lib/schemas/situation';
import { procedureOf, type SituationDose, type SituationRecord, type Way, wayOf } from '@/lib/situations';
import { drainSeenOn } from '@/lib/situations/mornings';
import { aReading, aRecord, DAY, full, HOUR, openedAt, pool } from '@/tests/situations/records';

const days: Record<string, string> = { leavesOn: '2026-07-10', backOn: '2026-07-16', startsOn: '2026-07-06' };
const text: Record<string, string> = { name: 'Grandmother' };

/** Every procedure with every set of answers that it takes. */
export const everySituation: readonly Situation[] = situationKinds.flatMap((kind) => {
  const drafts = questionsOf(kind).reduce<Draft[]>(
    (before, { name, answers }) =>
      before.flatMap((draft) =>
        (answers ?? [days[name] ?? text[name] ?? '']).map((answer): Draft => ({ ...draft, [name]: answer })),
      ),
    [{}],
  );
  const read = drafts.flatMap((draft) => {
    const answered = readAnswers(kind, draft);
    return 'situation' in answered ? [answered.situation] : [];
  });
  return [...new Map(read.map((situation) => [JSON.stringify(situation), situation])).values()];
});

/** Waters in which a procedure may be opened: with and without stabilizer, never measured, too much of each thing. */
const waters: readonly SituationRecord['readings'][] = [
  [],
  [aReading(-2, full)],
  [aReading(-2, { ...full, freeChlorine: 0.5 })],
  [aReading(-2, { ...full, freeChlorine: 3.9 })],
  [aReading(-2, full), aReading(1, { freeChlorine: 1, pH: 7.5 })],
  [aReading(-2, { ...full, cyanuricAcid: 0, temperature: 27, pH: 7.4 }), aReading(1, { freeChlorine: 1, pH: 7.4 })],
  [aReading(-2, { ...full, cyanuricAcid: 0, temperature: 18 }), aReading(1, { freeChlorine: 1, pH: 7.7 })],
  [aReading(-2, { ...full, cyanuricAcid: 90, calciumHardness: 700 })],
  [aReading(-2, { ...full, pH: 7.9, combinedChlorine: 0.9 })],
  [aReading(-2, { ...full, combinedChlorine: 0.9 }), aReading(96, { ...full, combinedChlorine: 0.9 })],
  [aReading(-2, full), aReading(26, { freeChlorine: 3, pH: 7.5 }), aReading(40, { freeChlorine: 3, pH: 7.5 })],
];
const liquid = (hours: number) => ({ at: openedAt + hours * HOUR, substance: 'sodium-hypochlorite', rise: 3 });
const doses: readonly SituationRecord['given'][] = [
  [],
  [liquid(11)],
  [0, 24, 48, 72].map((hours) => liquid(11 + hours)),
];
const morning = (day: string, inARow: number) => ({
  ...{ day, takenAt: `${day}T08:00:00-05:00`, freeChlorine: 8, low: 7, high: 9, inside: true, drainSeen: true },
  inARow,
});
const mornings: readonly SituationRecord['mornings'][] = [
  [],
  [morning('2026-07-06', 1), morning('2026-07-07', 2)],
  ['2026-07-06', '2026-07-07', '2026-07-08', '2026-07-09'].map((day) => ({ ...morning(day, 0), inside: false })),
];
const pools = [pool, poolSchema.parse({ ...pool, surface: 'vinyl', fillWater: { calciumHardness: 600 } })];

/** A dose as the plan might hold it for a procedure that treats the water, and acid before it where it asks for that. */
function planned({ lead }: Way): SituationDose[] {
  if (lead.kind !== 'treat') return [];
  const common = { toBuy: false, pumpUntil: null, givenAt: null, doneBy: null, unit: 'mL', amount: 1000 } as const;
  const acid = { ...common, id: 'acid', substance: 'hydrochloric-acid', form: 'liquid' } as const;
  const chlorine = { ...common, id: 'liquid', substance: 'sodium-hypochlorite', form: 'liquid' } as const;
  const evening = openedAt + 11 * HOUR;
  return lead.treatment.pHFirst === undefined
    ? [{ ...chlorine, at: evening }]
    : [
        { ...acid, at: openedAt + 22 * HOUR },
        { ...chlorine, at: evening + DAY },
      ];
}

export type ShownWay = { name: string; situation: Situation; way: Way; procedure: Procedure };

/** Every procedure in every water, at every stage: what it asks for, as it is shown. */
export function everyWay(): ShownWay[] {
  const shown = new Map<string, ShownWay>();
  for (const situation of everySituation)
    for (const readings of waters)
      for (const given of doses)
        for (const past of mornings)
          for (const each of pools) {
            const bare = aRecord(situation, { readings, given, mornings: past, pool: each });
            const ticked = new Map([
              ...wayOf(bare).steps.map(({ id }): [string, number] => [id, openedAt + HOUR]),
              [drainSeenOn('2026-07-06'), openedAt + 24 * HOUR],
            ]);
            for (const ticks of [new Map<string, number>(), ticked]) {
              const record = { ...bare, ticks };
              const way = wayOf(record);
              const around = { doses: planned(way), tickedBy: new Map(), promise: () => null, now: openedAt };
              const procedure = procedureOf(way, record, around);
              const name = `${situation.kind} ${JSON.stringify(situation.answers)} ${way.branch}`;
              const key = `${name} ${procedure.steps.map(({ code, at }) => `${code} ${at}`).join()} ${way.cautions.join()}`;
              if (!shown.has(key)) shown.set(key, { name, situation, way, procedure });
            }
          }
  return [...shown.values()];
}
