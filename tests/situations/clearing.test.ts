import { describe, expect, it } from 'vitest';
import type { Morning } from '@/lib/schemas/situation';
import { morningsOf, type SituationRecord, wayOf } from '@/lib/situations';
import { aReading, aRecord, DAY, fine, full, HOUR, openedAt, pool, ticked } from './records';

const green = { drain: 'not-at-all', look: 'green', addedInLastDay: 'no' } as const;
const clearing = (
  changes: Partial<SituationRecord> = {},
  answers: Extract<SituationRecord['situation'], { kind: 'clearing' }>['answers'] = green,
) =>
  wayOf(
    aRecord(
      { kind: 'clearing', answers },
      { readings: [aReading(-2, { ...full, pH: 7.3, freeChlorine: 0.6 }, 'green')], ...changes },
    ),
  );
const evening = (day: number) => ({
  at: openedAt + day * DAY + 10 * HOUR,
  substance: 'sodium-hypochlorite',
  rise: 2.5,
});
const morning = (day: string, inARow: number): Morning => ({
  day,
  takenAt: `${day}T08:00:00-05:00`,
  freeChlorine: 8,
  low: 7.5,
  high: 9,
  inside: inARow > 0,
  drainSeen: inARow > 0,
  inARow,
});

describe('green and cloudy water (care rules, part 7)', () => {
  it('raises to 10 at most on treatment evenings, with the pump running day and night', () => {
    const way = clearing();
    expect(way.lead).toMatchObject({
      kind: 'treat',
      treatment: { kind: 'clearing', aim: { to: 10 }, evening: 'treatment' },
    });
    expect(way).toMatchObject({ branch: 'treatment-evenings', stayOut: true, done: false });
    expect(way.cautions[0]).toBe('nobody-in-cloudy');
    expect(way.steps.map(({ code }) => code)).toEqual(
      expect.arrayContaining(['pump-day-and-night', 'leaves-and-brush', 'clean-filter']),
    );
  });

  it('brings pH to 7.4 or less first', () => {
    const way = clearing({ readings: [aReading(-2, { ...full, pH: 7.7 }, 'green')] });
    expect(way).toMatchObject({ branch: 'pH-first', lead: { treatment: { pHFirst: 7.4 } } });
    expect(way.cautions).toContain('acid-alone');
  });

  it('replaces some water first where stabilizer is over 60, and doses nothing', () => {
    const way = clearing({ readings: [aReading(-2, { ...full, cyanuricAcid: 75 }, 'green')] });
    expect(way).toMatchObject({ branch: 'water-first', lead: { kind: 'hold' }, stayOut: true });
    expect(way.reasons[0]).toMatchObject({ code: 'stabilizer-over', stabilizer: 75, limit: 60 });
    expect(clearing({ readings: [aReading(-2, { ...full, pH: 7.3, cyanuricAcid: 60 }, 'green')] }).branch).toBe(
      'treatment-evenings',
    );
  });

  it('is no ground without a test of the day', () => {
    const way = clearing({ readings: [aReading(-30, full, 'green')] });
    expect(way.lead).toEqual({ kind: 'hold' });
    expect(way.steps.map(({ code }) => code)).toContain('test-before-dose');
  });

  it('waits a day and adds nothing where it turned cloudy right after granules, soda or calcium', () => {
    const milky = { drain: 'hazy', look: 'milky', addedInLastDay: 'yes' } as const;
    expect(clearing({}, milky)).toMatchObject({ branch: 'wait-a-day', lead: { kind: 'hold' }, stayOut: true });
    // Still cloudy after the day: then it is not what was added.
    const still = [aReading(-2, full, 'cloudy'), aReading(25, full, 'cloudy')];
    expect(clearing({ readings: still }, milky).branch).not.toBe('wait-a-day');
    const clear = [aReading(-2, full, 'cloudy'), aReading(25, fine), aReading(38, fine)];
    expect(clearing({ readings: clear }, milky).done).toBe(false);
    expect(clearing({ readings: clear, ticks: ticked('drain-seen-2026-07-06') }, milky).done).toBe(true);
  });

  it('sends spots, stain and slime to a professional, and plans nothing', () => {
    const spots = { drain: 'plainly', look: 'spots-or-stain', addedInLastDay: 'no' } as const;
    expect(clearing({}, spots)).toMatchObject({ branch: 'professional', lead: { kind: 'hold' }, callNow: true });
  });

  it('calls a professional after four evenings without progress, and doses no fifth time', () => {
    const given = [0, 1, 2, 3].map(evening);
    const before = clearing({ given, mornings: [morning('2026-07-08', 0)] });
    expect(before.callNow).toBe(false);
    const after = clearing({ given, mornings: [morning('2026-07-08', 0), morning('2026-07-09', 0)] });
    expect(after).toMatchObject({ branch: 'professional', lead: { kind: 'hold' }, callNow: true, stayOut: true });
  });

  it('holds until the morning after an evening was read, and doses no evening on the model alone', () => {
    expect(clearing({ given: [evening(0)] }).lead).toEqual({ kind: 'hold' });
    expect(clearing({ given: [evening(0)], mornings: [morning('2026-07-06', 0)] }).lead.kind).toBe('treat');
    expect(clearing({ given: [evening(0), evening(1)], mornings: [morning('2026-07-06', 0)] }).lead).toEqual({
      kind: 'hold',
    });
  });

  it('after the fourth evening waits for the second morning where the first was good', () => {
    const given = [0, 1, 2, 3].map(evening);
    const way = clearing({ given, mornings: [morning('2026-07-08', 0), morning('2026-07-09', 1)] });
    expect(way).toMatchObject({ lead: { kind: 'hold' }, callNow: false, headline: 'out-one-good-morning' });
  });

  it('leaves a pH under 7.2 to the plan of the week first', () => {
    const way = clearing({ readings: [aReading(-2, { ...full, pH: 6.6 }, 'green')] });
    expect(way).toMatchObject({ branch: 'pH-first', lead: { kind: 'follow' }, stayOut: true });
  });

  it('asks before any water is let out', () => {
    const high = { readings: [aReading(-2, { ...full, cyanuricAcid: 75 }, 'green')] };
    expect(clearing(high).steps.map(({ code }) => code)).toEqual(['ask-before-lowering']);
    const asked = clearing({ ...high, ticks: ticked('ask-before-lowering') });
    expect(asked.steps.map(({ code }) => code)).toContain('replace-water');
  });

  it('treats again where the water turns after two good mornings', () => {
    const mornings = [morning('2026-07-06', 1), morning('2026-07-07', 2), morning('2026-07-08', 0)];
    const readings = [aReading(-2, { ...full, pH: 7.3 }), aReading(72, fine, 'cloudy')];
    expect(clearing({ given: [evening(0), evening(1)], mornings, readings }).branch).toBe('treatment-evenings');
  });

  it('is cleared by two good mornings in a row, and over only with two tests in range 12 h apart', () => {
    const mornings = [morning('2026-07-06', 1), morning('2026-07-07', 2)];
    const given = [evening(0), evening(1)];
    const settling = clearing({ given, mornings });
    expect(settling).toMatchObject({ branch: 'settling', lead: { kind: 'follow' }, stayOut: true, done: false });
    const later = (...hours: number[]) => [aReading(-2, full), ...hours.map((each) => aReading(each, fine))];
    expect(clearing({ given, mornings, readings: later(72, 83) }).done).toBe(false);
    expect(clearing({ given, mornings, readings: later(72, 84) })).toMatchObject({ done: true, stayOut: false });
    const relapse = [...later(72), aReading(80, fine, 'cloudy'), aReading(85, fine)];
    expect(clearing({ given, mornings, readings: relapse }).done).toBe(false);
  });
});

describe('mornings against the ordinary band', () => {
  const around = { openedAt, timeZone: pool.timeZone };
  const band = () => ({ low: 7.5, high: 9 });
  const at8 = (day: number) => 23 + 24 * (day - 1);
  const judge = (readings: ReturnType<typeof aReading>[], ...seen: string[]) =>
    morningsOf(readings, ticked(...seen), band, around);

  it('counts good ones in a row; a bad one, and a day without, start anew', () => {
    const days = ['2026-07-06', '2026-07-07', '2026-07-09', '2026-07-10'];
    const seen = days.map((day) => `drain-seen-${day}`);
    const readings = [1, 2, 4, 5].map((day) => aReading(at8(day), { freeChlorine: 8 }));
    expect(judge(readings, ...seen).map(({ inARow }) => inARow)).toEqual([1, 2, 1, 2]);
    const low = readings.with(1, aReading(at8(2), { freeChlorine: 7 }));
    expect(judge(low, ...seen).map(({ inARow }) => inARow)).toEqual([1, 0, 1, 2]);
  });

  it('is not good before somebody says that the drain was plainly seen, nor while the water looks cloudy', () => {
    expect(judge([aReading(at8(1), { freeChlorine: 8 })])[0]).toMatchObject({
      inside: true,
      drainSeen: null,
      inARow: 0,
    });
    expect(judge([aReading(at8(1), { freeChlorine: 8 }, 'cloudy')], 'drain-seen-2026-07-06')[0]).toMatchObject({
      drainSeen: false,
      inARow: 0,
    });
  });

  it('takes the first reading before noon of a day after the opening', () => {
    const readings = [
      aReading(1, { freeChlorine: 8 }),
      aReading(at8(1), { freeChlorine: 8 }),
      aReading(at8(1) + 2, { freeChlorine: 1 }),
      aReading(at8(1) + 30, { freeChlorine: 8 }),
    ];
    expect(judge(readings).map(({ day, freeChlorine }) => [day, freeChlorine])).toEqual([['2026-07-06', 8]]);
  });

  it('does not take a reading of the night for a morning', () => {
    expect(judge([aReading(at8(1) - 7, { freeChlorine: 8 })], 'drain-seen-2026-07-06')).toEqual([]);
  });

  it('is neither inside nor outside where nothing was promised', () => {
    const [only] = morningsOf(
      [aReading(at8(1), { freeChlorine: 8 })],
      ticked('drain-seen-2026-07-06'),
      () => null,
      around,
    );
    expect(only).toMatchObject({ low: null, inside: null, inARow: 0 });
  });
});
