import { describe, expect, it } from 'vitest';
import { listAudit } from '@/db/queries/audit-trail';
import { findHousehold } from '@/db/queries/households';
import { findPool } from '@/db/queries/pools';
import { proveHousehold } from '@/lib/auth/household-access';
import { type SetupAnswer, setupAnswerSchema } from '@/lib/schemas/pool-profile';
import { checkInput } from '@/lib/schemas/problems';
import { readPool } from '@/lib/services/read-pool';
import { savePool } from '@/lib/services/save-pool';
import { enteredSize, scopeAnswers, setupAnswers, sunAnswers, waterAnswers } from '@/tests/support/setup-answers';
import { aHousehold, aMember, freshDatabase } from '@/tests/support/test-database';

const now = new Date('2026-07-05T12:00:00Z');

async function aFirstRun() {
  const db = freshDatabase();
  const access = await aHousehold(db, { timeZone: 'Europe/Madrid', handlesChemicals: false });
  return { db, access, now };
}

/** Each part is a request of its own, so who is asking is proven anew. */
async function saveAll({ db, access }: Awaited<ReturnType<typeof aFirstRun>>, answers = setupAnswers) {
  let state = await readPool({ db, access });
  for (const answer of answers)
    state = await savePool({ db, now, access: await proveHousehold(db, { ...access, now }) }, answer);
  return state;
}

describe('the first run', () => {
  it('is finished with its last part, and gives back everything as it was answered', async () => {
    const context = await aFirstRun();
    const state = await saveAll(context);
    expect(state).toMatchObject({ nextStep: null, completed: true, recordOnly: false, decision: { result: 'ok' } });
    expect(state.profile).toEqual({
      scope: scopeAnswers,
      size: { ...enteredSize, unitConfirmed: true },
      volume: expect.closeTo(75.708, 3) as number,
      meanDepth: 1.5,
      volumeEstimated: false,
      lining: { surface: 'unsure' },
      // To a tenth of a degree: a neighbourhood, never an address.
      sun: { ...sunAnswers, latitude: 28.3, longitude: -81.4 },
      water: waterAnswers,
      label: { swimLimit: 'not-said', swimHours: { from: '10:00', to: '20:00' } },
      swimLimitSetBy: 'Ines',
    });
  });

  it('can be left after every part and taken up where it stood', async () => {
    const context = await aFirstRun();
    for (const [place, answer] of setupAnswers.entries()) {
      await savePool(context, answer);
      const access = await proveHousehold(context.db, { ...context.access, now });
      const state = await readPool({ db: context.db, access });
      expect(state.nextStep).toBe(setupAnswers[place + 1]?.step ?? null);
      expect(access.poolCompleted).toBe(place === setupAnswers.length - 1);
    }
  });

  it('lets an earlier part be answered again, and no later one ahead of its turn', async () => {
    const context = await aFirstRun();
    const [scope, size, , sun] = setupAnswers as [SetupAnswer, SetupAnswer, SetupAnswer, SetupAnswer];
    await savePool(context, scope);
    await expect(savePool(context, sun)).rejects.toMatchObject({ code: 'conflict' });
    await savePool(context, size);
    expect((await savePool(context, scope)).nextStep).toBe('lining');
  });

  it('moves the household to the time zone of its pool, and marks who handles chemicals', async () => {
    const context = await aFirstRun();
    await saveAll(context);
    expect((await findHousehold(context.db, context.access.householdId))?.timeZone).toBe('America/New_York');
    expect((await proveHousehold(context.db, { ...context.access, now })).handlesChemicals).toBe(true);
    await savePool(context, { step: 'scope', answers: { ...scopeAnswers, handlesChemicals: false } });
    expect((await proveHousehold(context.db, { ...context.access, now })).handlesChemicals).toBe(false);
  });

  it('is written down, part by part', async () => {
    const context = await aFirstRun();
    await saveAll(context);
    const audit = await listAudit(context.db, context.access.householdId);
    expect(audit.map(({ detail }) => detail?.step).reverse()).toEqual(setupAnswers.map(({ step }) => step));
  });

  it('is the owner’s alone', async () => {
    const { db, access } = await aFirstRun();
    const { householdId } = access;
    for (const role of ['caretaker', 'viewer'] as const) {
      const member = await aMember(db, { householdId, role, now });
      const saved = savePool({ db, access: member, now }, { step: 'scope', answers: scopeAnswers });
      await expect(saved).rejects.toMatchObject({ code: 'not-allowed' });
    }
    expect((await findPool(db, householdId))?.pool.system).toBeNull();
  });
});

describe('the size of a pool', () => {
  it.each([
    [{ shape: 'rectangle', length: 10, width: 5 }, { floor: 'slope', shallow: 1.12, deep: 1.6 }, 68],
    [{ shape: 'round', diameter: 5 }, { floor: 'flat', depth: 1.2 }, 23.562],
    [{ shape: 'freeform', length: 9, widthA: 4, widthB: 5 }, { floor: 'drop-off', shallow: 1, deep: 2 }, 50.119],
  ] as const)('is worked out of its measures, and comes back: %j', async (outline, floor, volume) => {
    const context = await aFirstRun();
    await savePool(context, { step: 'scope', answers: scopeAnswers });
    const answers = { how: 'measured' as const, outline, floor };
    const { profile } = await savePool(context, { step: 'size', answers });
    expect(profile.volume).toBeCloseTo(volume, 2);
    expect(profile).toMatchObject({ size: answers, volumeEstimated: true });
    // Measured first and known later: nothing of the measures stays.
    expect((await savePool(context, { step: 'size', answers: enteredSize })).profile.size).toMatchObject({
      how: 'entered',
      volume: 20_000,
    });
    expect((await findPool(context.db, context.access.householdId))?.pool).toMatchObject({ shape: null, length: null });
  });

  const problemsOf = (answers: object) => {
    const checked = checkInput(setupAnswerSchema, { step: 'size', answers: { ...enteredSize, ...answers } });
    return checked.sound ? [] : checked.problems;
  };
  it.each(['m3', 'L'])('of 18,000 %s is asked back: gallons?', (unit) => {
    expect(problemsOf({ volume: 18_000, unit })).toEqual([
      { path: 'answers.unit', message: 'That would be an unusual pool. Did you mean US gallons?' },
    ]);
  });

  it('of 18,000 litres is taken once that was confirmed, and 18,000 m3 never', () => {
    expect(problemsOf({ volume: 18_000, unit: 'L', unitConfirmed: true })).toEqual([]);
    expect(problemsOf({ volume: 18_000, unit: 'm3', unitConfirmed: true })).toMatchObject([{ path: 'answers.volume' }]);
    expect(problemsOf({ volume: 18_000, unit: 'us-gal' })).toEqual([]);
  });
});

describe('the scope', () => {
  it.each([
    ['salt-generator', { system: 'salt-generator' }, 'record-only'],
    ['bromine', { system: 'bromine' }, 'stop'],
    ['unknown-system', { system: 'unknown' }, 'stop'],
    ['hot-tub', { kind: 'hot-tub' }, 'stop'],
    ['roofed', { roofed: true }, 'stop'],
    ['new-surface', { newSurface: true }, 'stop'],
    ['open-to-public', { openToPublic: true }, 'stop'],
    ['planted', { planted: true }, 'stop'],
  ] as const)('of a pool: %s', async (reason, changed, result) => {
    const context = await aFirstRun();
    const answers = { ...scopeAnswers, ...changed };
    const { decision } = await savePool(context, { step: 'scope', answers });
    expect(decision).toMatchObject({ result, reasons: [reason] });
  });

  it.each([
    [1.5, 'stop', 'under-2-cubic-metres'],
    [9, 'record-only', 'under-10-cubic-metres'],
  ] as const)('of %s m3 is %s', async (volume, result, reason) => {
    const context = await aFirstRun();
    const answers = { ...enteredSize, volume, unit: 'm3', unitConfirmed: true } as typeof enteredSize;
    const state = await saveAll(
      context,
      setupAnswers.map((answer) => (answer.step === 'size' ? { step: 'size', answers } : answer)),
    );
    expect(state).toMatchObject({
      completed: result !== 'stop',
      recordOnly: true,
      decision: { result, reasons: [reason] },
    });
  });

  it('lets ultraviolet light and well water pass, the latter with a note', async () => {
    const context = await aFirstRun();
    const answers = { ...scopeAnswers, ultravioletOrOzone: true, wellWater: true, kind: 'pool-with-spa' as const };
    expect((await savePool(context, { step: 'scope', answers })).decision).toEqual({
      result: 'ok',
      reasons: [],
      notes: ['spa-counts-in-volume', 'metal-test-first'],
    });
  });

  it('that stops the first run is taken back by another answer, which then finishes it', async () => {
    const context = await aFirstRun();
    const painted = { step: 'scope', answers: { ...scopeAnswers, newSurface: true } } as const;
    expect(await saveAll(context, [painted, ...setupAnswers.slice(1)])).toMatchObject({
      completed: false,
      nextStep: null,
    });
    expect(await savePool(context, { step: 'scope', answers: scopeAnswers })).toMatchObject({
      completed: true,
      recordOnly: false,
    });
  });
});
