import { describe, expect, it } from 'vitest';
import type { AnswersOf } from '@/lib/schemas/situation';
import { type Taken, wayOf } from '@/lib/situations';
import { aReading, aRecord, fine, full, HOUR, openedAt, ticked } from './records';

const accident = (
  answers: AnswersOf<'accident'>,
  ...changes: Parameters<typeof aRecord> extends [unknown, ...infer Rest] ? Rest : never
) => wayOf(aRecord({ kind: 'accident', answers }, ...changes));
const formed = { what: 'formed-stool' } as const;
/** Warm water without stabilizer, pH low enough. */
const plain: Taken['values'] = { freeChlorine: 2.4, pH: 7.4, cyanuricAcid: 0, temperature: 27 };

describe('an accident in the water (care rules, part 7)', () => {
  it('always begins with everybody out, and then the net, before anything is poured', () => {
    for (const answers of [
      formed,
      { what: 'loose-stool' },
      { what: 'vomit', moreThanSwallowedWater: 'yes' },
      { what: 'vomit', moreThanSwallowedWater: 'no' },
      { what: 'blood' },
      { what: 'dead-animal', animal: 'other' },
      { what: 'dead-animal', animal: 'raccoon-calf-lamb' },
    ] as const) {
      const way = accident(answers);
      expect(way.stayOut).toBe(true);
      expect(way.cautions[0]).toBe('everyone-out');
      expect(way.steps[0]!.code).toBe('everyone-out');
    }
  });

  it('sends loose stool, and a raccoon, calf or lamb, to the health department: no dose and no waiting time at any stabilizer', () => {
    for (const answers of [{ what: 'loose-stool' }, { what: 'dead-animal', animal: 'raccoon-calf-lamb' }] as const)
      for (const values of [full, plain]) {
        const way = accident(answers, { readings: [aReading(-2, values), aReading(1, values)] });
        expect(way).toMatchObject({
          branch: 'health-department',
          lead: { kind: 'hold' },
          stayOut: true,
          callNow: true,
        });
        expect(way.steps.map(({ code }) => code)).not.toContain('test-after-time');
        expect(JSON.stringify(way)).not.toContain('minutes');
        expect(way.callWhen[0]).toBe('health-department');
      }
  });

  it('is over with the health department’s word and a good test after it, in this order', () => {
    const steps = { ticks: ticked('health-department-done') };
    const loose = { what: 'loose-stool' } as const;
    expect(accident(loose, { ...steps, readings: [aReading(0.5, full)] }).done).toBe(false);
    expect(accident(loose, { ...steps, readings: [aReading(0.5, full), aReading(2, fine)] }).done).toBe(true);
    expect(accident(loose, { readings: [aReading(2, full)] }).done).toBe(false);
  });

  it('asks for no extra step for blood, or swallowed water: only that chlorine is in range', () => {
    for (const answers of [{ what: 'blood' }, { what: 'vomit', moreThanSwallowedWater: 'no' }] as const) {
      expect(accident(answers)).toMatchObject({ branch: 'no-extra-step', lead: { kind: 'follow' }, done: false });
      expect(accident(answers, { readings: [aReading(-2, full), aReading(1, fine)] })).toMatchObject({
        done: true,
        stayOut: false,
      });
      expect(
        accident(answers, { readings: [aReading(-2, full), aReading(1, { ...fine, freeChlorine: 0.8 })] }).done,
      ).toBe(false);
    }
  });

  describe('formed stool, in stabilized water', () => {
    it('waits for a test, then raises to the swim limit, then holds until the next day', () => {
      expect(accident(formed)).toMatchObject({ branch: 'next-day', lead: { kind: 'hold' } });
      const tested = [aReading(-2, full), aReading(1, { ...fine, freeChlorine: 1.5 })];
      expect(accident(formed, { readings: tested }).lead).toEqual({
        kind: 'treat',
        treatment: { kind: 'accident', aim: { to: 4 }, evening: 'treatment' },
      });
      const given = [{ at: openedAt + 10 * HOUR, substance: 'sodium-hypochlorite', rise: 2.5 }];
      expect(accident(formed, { readings: tested, given }).lead).toEqual({ kind: 'hold' });
    });

    it('is over on the next day with a test in range, not on the same day', () => {
      const given = [{ at: openedAt + 10 * HOUR, substance: 'sodium-hypochlorite', rise: 2.5 }];
      const tested = [aReading(-2, full), aReading(1, { ...fine, freeChlorine: 1.5 })];
      expect(accident(formed, { given, readings: [...tested, aReading(12, fine)] }).done).toBe(false);
      expect(accident(formed, { given, readings: [...tested, aReading(23, fine)] }).done).toBe(true);
      expect(accident(formed, { given, readings: [...tested, aReading(23, { ...fine, freeChlorine: 6 })] }).done).toBe(
        false,
      );
    });

    it('is not over minutes after midnight', () => {
      const late = openedAt + 14.6 * HOUR;
      const readings = [
        aReading(-2, full),
        aReading(14.7, { ...fine, freeChlorine: 3.8 }),
        aReading(15.6, { ...fine, freeChlorine: 3.7 }),
      ];
      expect(accident(formed, { readings, openedAt: late }).done).toBe(false);
    });

    it('is not over where what went in cannot have come near the swim limit', () => {
      const given = [{ at: openedAt + 10 * HOUR, substance: 'sodium-hypochlorite', rise: 1 }];
      const readings = [
        aReading(-2, full),
        aReading(1, { ...fine, freeChlorine: 1.5 }),
        aReading(23, { ...fine, freeChlorine: 2.1 }),
      ];
      expect(accident(formed, { given, readings }).done).toBe(false);
      expect(accident(formed, { given, readings }).lead.kind).toBe('treat');
    });

    it('is not over by waiting alone where nothing was raised', () => {
      expect(accident(formed, { readings: [aReading(-2, full), aReading(23, fine)] }).done).toBe(false);
    });

    it('raises again where the next day finds too little', () => {
      const given = [{ at: openedAt + 10 * HOUR, substance: 'sodium-hypochlorite', rise: 2.5 }];
      const readings = [aReading(-2, full), aReading(1, fine), aReading(24, { ...fine, freeChlorine: 1 })];
      expect(accident(formed, { given, readings }).lead.kind).toBe('treat');
    });

    it('counts water as stabilized where nobody measured it', () => {
      const readings = [aReading(1, { freeChlorine: 2.5, pH: 7.4, temperature: 27 })];
      expect(accident(formed, { readings })).toMatchObject({
        branch: 'next-day',
        reasons: [{ code: 'stabilizer-unknown' }],
      });
    });
  });

  // US CDC: 2 mg/L for 30 minutes, pH 7.5 or less, 25 degrees C or more, no stabilizer.
  describe('formed stool, in warm water without stabilizer', () => {
    it('keeps the published 30 minutes at 2 mg/L, and tests after them', () => {
      const readings = [aReading(1, plain)];
      expect(accident(formed, { readings })).toMatchObject({
        branch: 'published-time',
        lead: { kind: 'hold' },
        done: false,
      });
      expect(accident(formed, { readings: [...readings, aReading(1.4, plain)] }).done).toBe(false);
      expect(accident(formed, { readings: [...readings, aReading(1.6, plain)] }).done).toBe(true);
      expect(accident(formed, { readings: [...readings, aReading(1.6, { ...plain, freeChlorine: 1.8 })] }).done).toBe(
        false,
      );
    });

    it('raises above 2 first where there is less', () => {
      const low = aReading(1, { ...plain, freeChlorine: 1.2 });
      expect(accident(formed, { readings: [low] }).lead).toMatchObject({
        kind: 'treat',
        treatment: { aim: { to: 2.5 } },
      });
    });

    it.each([
      ['pH over 7.5', { ...plain, pH: 7.6 }],
      ['colder than 25', { ...plain, temperature: 24 }],
      ['stabilizer of 10', { ...plain, cyanuricAcid: 10 }],
    ])('has no published time with %s', (_name, values) => {
      expect(accident(formed, { readings: [aReading(1, values)] }).branch).toBe('next-day');
    });

    it('has no published time on a temperature of days ago', () => {
      const old = aReading(-30, { temperature: 28, cyanuricAcid: 0 });
      expect(accident(formed, { readings: [old, aReading(1, { freeChlorine: 2.4, pH: 7.4 })] }).branch).toBe(
        'next-day',
      );
    });

    it('has no published time where dichlor or trichlor was used', () => {
      expect(accident(formed, { readings: [aReading(1, plain)], stabilizedProductUsed: true }).branch).toBe('next-day');
    });
  });
});
