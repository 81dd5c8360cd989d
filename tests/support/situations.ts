import {
  type Morning,
  type OpenSituation,
  type Procedure,
  type Situation,
  type SituationKind,
  type Situations,
  type SituationStep,
  situationsSchema,
} from '@/lib/schemas/situation';
import { severityOf } from '@/lib/situations/codes';

/** Answers of each kind as somebody would give them. */
export const someAnswers = {
  accident: { kind: 'accident', answers: { what: 'formed-stool' } },
  clearing: { kind: 'clearing', answers: { drain: 'not-at-all', look: 'green', addedInLastDay: 'no' } },
  'combined-chlorine': { kind: 'combined-chlorine', answers: {} },
  'drain-cover': { kind: 'drain-cover', answers: {} },
  'quick-raise': { kind: 'quick-raise', answers: {} },
  storm: { kind: 'storm', answers: { pumpRoom: 'dry', shock: 'no' } },
  cover: { kind: 'cover', answers: { covered: 'days', floaterUnder: 'yes' } },
  stain: { kind: 'stain', answers: {} },
  away: {
    kind: 'away',
    answers: { leavesOn: '2026-07-14', backOn: '2026-07-30', care: 'adult', name: 'Ilse' },
  },
  'stabilizer-high': { kind: 'stabilizer-high', answers: { ground: 'no' } },
  'hardness-high': { kind: 'hardness-high', answers: { ground: 'unsure' } },
  opening: { kind: 'opening', answers: { startsOn: '2026-07-12' } },
  closing: { kind: 'closing', answers: { startsOn: '2026-07-12' } },
} as const satisfies { [Kind in SituationKind]: Extract<Situation, { kind: Kind }> };

export const openedAt = '2026-07-09T18:00:00+02:00';
export const now = '2026-07-12T08:10:00+02:00';
export const situationId = '7d1f6d2c-0b7a-4a53-9a54-0f6a2a4c8f10';

export function aStep(code: string, changes: Partial<SituationStep> = {}): SituationStep {
  const step = {
    id: code,
    at: now,
    kind: 'tick',
    code,
    figures: {},
    doseId: null,
    doneAt: null,
    doneBy: null,
  } as const;
  return { ...step, ...changes };
}

export function aProcedure(changes: Partial<Procedure> = {}): Procedure {
  return {
    branch: 'list',
    lead: 'follow',
    stayOut: false,
    headline: { code: 'steps-next' },
    cautions: [],
    reasons: [],
    steps: [],
    mornings: [],
    doneWhen: 'ticks-and-test',
    done: false,
    callWhen: [],
    callNow: false,
    nextTestAt: null,
    ...changes,
  };
}

type Changes = { kind?: SituationKind; procedure?: Partial<Procedure>; chart?: Situations['chart'] };

/** What a household's situations are; `kind`: of the open one. */
export function aSituations({ kind, procedure = {}, chart = null }: Changes = {}, past: Situations['past'] = []) {
  const open: OpenSituation | null = kind
    ? { id: situationId, situation: someAnswers[kind], openedAt, openedBy: 'Ines', procedure: aProcedure(procedure) }
    : null;
  const unknown = { freeChlorine: null, combinedChlorine: null, pH: null, cyanuricAcid: null, calciumHardness: null };
  return situationsSchema.parse({ now, open, past, water: unknown, chart });
}

const caution = (code: Parameters<typeof severityOf>[0]) => ({ code, severity: severityOf(code) });

const morning = (day: string, changes: Partial<Morning>): Morning => ({
  day,
  takenAt: `${day}T07:10:00+02:00`,
  freeChlorine: null,
  low: 7.9,
  high: 9.1,
  inside: null,
  drainSeen: null,
  inARow: 0,
  ...changes,
});

const dose = (day: string, amount: number, changes: Partial<SituationStep> = {}) =>
  aStep('dose', {
    id: `dose-${day}`,
    kind: 'dose',
    at: `${day}T20:40:00+02:00`,
    doseId: `dose-${day}`,
    figures: {
      ...{ amount, unit: 'mL', substance: 'sodium-hypochlorite', form: 'liquid', toBuy: 0 },
      until: `${day}T23:40:00+02:00`,
    },
    ...changes,
  });

const ticked = (at: string) => ({ doneAt: at, doneBy: 'Joost' });

/** Green water on its fourth morning: two evenings are over, one morning is good. */
export function aClearing(): Situations {
  const hours = Array.from({ length: 96 }, (_, hour) =>
    new Date(Date.parse(openedAt) + hour * 3_600_000).toISOString(),
  );
  return aSituations({
    kind: 'clearing',
    procedure: {
      branch: 'treatment-evenings',
      lead: 'treat',
      stayOut: true,
      headline: { code: 'out-one-good-morning' },
      cautions: [caution('liquid-low'), caution('nobody-in-cloudy'), caution('nothing-of-ours'), caution('never-mix')],
      reasons: [
        { code: 'stabilizer-under', stabilizer: 34, limit: 60 },
        { code: 'evening-of', evening: 3, most: 4 },
      ],
      steps: [
        aStep('pump-day-and-night', { at: openedAt, ...ticked('2026-07-09T18:20:00+02:00') }),
        aStep('leaves-and-brush', { at: openedAt, ...ticked('2026-07-09T18:40:00+02:00') }),
        dose('2026-07-09', 6400, ticked('2026-07-09T20:45:00+02:00')),
        aStep('morning-reading', {
          ...{ id: 'morning-reading-1', kind: 'test', at: '2026-07-10T08:00:00+02:00' },
          ...{ doneAt: '2026-07-10T07:10:00+02:00' },
        }),
        aStep('clean-filter', { at: '2026-07-10T08:00:00+02:00' }),
        dose('2026-07-10', 4600, ticked('2026-07-10T20:45:00+02:00')),
        dose('2026-07-12', 2100),
        aStep('morning-reading', { id: 'morning-reading-4', kind: 'test', at: '2026-07-13T08:00:00+02:00' }),
        aStep('drain-seen', { id: 'drain-seen-2026-07-13', at: '2026-07-13T08:00:00+02:00' }),
      ],
      mornings: [
        morning('2026-07-10', { freeChlorine: 4.2, inside: false, drainSeen: false }),
        morning('2026-07-11', { freeChlorine: 6.9, inside: false, drainSeen: null }),
        morning('2026-07-12', { freeChlorine: 8.5, inside: true, drainSeen: true, inARow: 1 }),
        morning('2026-07-13', { takenAt: null, inARow: 2 }),
      ],
      doneWhen: 'two-mornings-and-two-tests',
      callWhen: ['four-evenings', 'spots-or-slime', 'filter-climbs', 'doctor-first'],
      nextTestAt: '2026-07-13T08:00:00+02:00',
    },
    chart: {
      hours,
      p10: hours.map((_, hour) => (hour < 3 ? 0.5 : 8.1)),
      p50: hours.map((_, hour) => (hour < 3 ? 0.6 : 8.6)),
      p90: hours.map((_, hour) => (hour < 3 ? 0.7 : 9)),
      readings: [
        { takenAt: '2026-07-09T18:10:00+02:00', freeChlorine: 0.6, inside: null },
        { takenAt: '2026-07-10T07:10:00+02:00', freeChlorine: 4.2, inside: false },
        { takenAt: '2026-07-11T07:10:00+02:00', freeChlorine: 6.9, inside: false },
        { takenAt: '2026-07-12T07:10:00+02:00', freeChlorine: 8.5, inside: true },
      ],
      doses: [
        { at: '2026-07-09T20:45:00+02:00', given: true },
        { at: '2026-07-10T20:45:00+02:00', given: true },
        { at: '2026-07-12T20:40:00+02:00', given: false },
      ],
      swimLimit: 4,
      lowestLevel: 2,
      maximum: 10,
    },
  });
}
