import { randomUUID } from 'node:crypto';
import { beforeAll, describe, expect, it } from 'vitest';
import type { Database } from '@/db/client';
import type { HouseholdAccess } from '@/lib/auth/household-access';
import { amountToReach } from '@/lib/chemistry';
import type { Situation } from '@/lib/schemas/situation';
import { answerSituation } from '@/lib/services/answer-situation';
import type { ServiceContext } from '@/lib/services/context';
import { endSituation } from '@/lib/services/end-situation';
import { openSituation } from '@/lib/services/open-situation';
import { recordReading } from '@/lib/services/record-reading';
import { showSituations } from '@/lib/services/show-situations';
import { showWeek } from '@/lib/services/show-week';
import { tickDose } from '@/lib/services/tick-dose';
import { tickSituationStep } from '@/lib/services/tick-situation-step';
import { planWith } from '@/tests/support/engine';
import { aFullTest, aPoolHousehold, at, copyOf, hoursLater } from '@/tests/support/pool-household';
import { freshDatabase } from '@/tests/support/test-database';

planWith();

const green: Situation = { kind: 'clearing', answers: { drain: 'not-at-all', look: 'green', addedInLastDay: 'no' } };
const formed: Situation = { kind: 'accident', answers: { what: 'formed-stool' } };
const water = { combinedChlorine: 0.2, totalAlkalinity: 80, calciumHardness: 220, cyanuricAcid: 40, temperature: 29 };

describe('situations of a household', { timeout: 120_000 }, () => {
  let tested: Database;
  let owner: ServiceContext;
  beforeAll(async () => {
    tested = freshDatabase();
    // Monday morning, nine o'clock in Florida.
    owner = await aPoolHousehold(tested, { now: hoursLater(14) });
    await recordReading(
      owner,
      aFullTest(owner.now, { look: 'green', values: { ...water, freeChlorine: 0.6, pH: 7.3 } }),
    );
  });
  const fresh = async (hours = 0) => at({ ...owner, db: await copyOf(tested) }, hoursLater(14 + hours));
  const open = (context: ServiceContext, situation: Situation, id = randomUUID()) =>
    openSituation(context, { id, situation }).then(() => id);
  const later = (context: ServiceContext, hours: number) => at(context, hoursLater(14 + hours));
  const stepsOf = async (context: ServiceContext) => (await showSituations(context)).open?.procedure.steps ?? [];
  /** The newest dose that is still to be given, ticked at its hour. */
  const giveNext = async (context: ServiceContext): Promise<ServiceContext> => {
    const sheet = await showWeek(context);
    const dose = sheet.doses.find(({ status }) => status === 'planned')!;
    const then = at(context, new Date(dose.at));
    await tickDose(then, dose.id, { action: 'given', id: randomUUID(), planVersion: dose.planVersion });
    return then;
  };
  const test = (context: ServiceContext, values: object, look: 'clear' | 'cloudy' | 'green' = 'clear') =>
    recordReading(context, { ...aFullTest(context.now), kind: 'quick', values: values as never, look });

  it('leads the plan: one dose that raises to 10 at most, a step on the sheet, everybody out', async () => {
    const context = await fresh(0.1);
    const before = await showWeek(context);
    await open(context, green);
    const sheet = await showWeek(context);
    expect(sheet.plan!.version).toBeGreaterThan(before.plan!.version);
    expect(sheet.plan!.reasons).toEqual([{ code: 'situation-treats', kind: 'clearing' }]);
    const planned = sheet.doses.filter(({ status }) => status === 'planned');
    expect(planned).toHaveLength(1);
    expect(planned[0]).toMatchObject({ substance: 'calcium-hypochlorite', reason: 'treatment-evening' });
    expect(Math.max(...sheet.ahead!.freeChlorine.p90)).toBeLessThanOrEqual(10);
    expect(sheet.verdict).toMatchObject({
      state: 'stay-out',
      reasons: expect.arrayContaining([{ code: 'water-green' }]),
    });
    const steps = sheet.situation!.procedure.steps;
    expect(steps.find(({ kind }) => kind === 'dose')).toMatchObject({
      doseId: planned[0]!.id,
      figures: { amount: planned[0]!.amount },
    });
    expect(steps.map(({ code }) => code)).toEqual(
      expect.arrayContaining(['leaves-and-brush', 'pump-day-and-night', 'morning-reading', 'drain-seen']),
    );
  });

  it('asks an amount that the water model reckons for its rise, within 1 %', async () => {
    const context = await fresh(0.1);
    await open(context, green);
    const [dose] = (await showWeek(context)).doses.filter(({ status }) => status === 'planned');
    const analysis = { ...water, freeChlorine: 0.4, pH: 7.3 };
    const amount = amountToReach(
      analysis,
      75.7,
      { substance: 'calcium-hypochlorite', strength: 65 },
      { quantity: 'freeChlorine', value: 0.4 + dose!.rise },
    );
    expect(Math.abs(dose!.amount / amount - 1)).toBeLessThan(0.01);
  });

  it('is cleared by two mornings inside the band with the drain seen, and over after two tests in range', async () => {
    let context = await fresh(0.1);
    const id = await open(context, green);
    context = await giveNext(context);
    // Tuesday, eight o'clock: where a clear pool would be.
    context = later(context, 23);
    const promised = (await showSituations(context)).chart!;
    const at8 = promised.hours.findIndex((hour) => Date.parse(hour) >= context.now.getTime());
    const read = promised.p50[at8]!;
    await test(context, { freeChlorine: read, pH: 7.4 });
    expect((await showSituations(context)).open!.procedure.mornings[0]).toMatchObject({
      inside: true,
      drainSeen: null,
      inARow: 0,
    });
    await tickSituationStep(context, { situationId: id, step: 'drain-seen-2026-07-07', done: true });
    const one = (await showSituations(context)).open!.procedure;
    expect(one.mornings[0]).toMatchObject({ inside: true, drainSeen: true, inARow: 1 });
    expect(one.headline.code).toBe('out-one-good-morning');

    context = await giveNext(context);
    context = later(context, 47);
    const again = (await showSituations(context)).chart!;
    const second = again.p50[again.hours.findIndex((hour) => Date.parse(hour) >= context.now.getTime())]!;
    await test(context, { freeChlorine: second, pH: 7.4 });
    await tickSituationStep(context, { situationId: id, step: 'drain-seen-2026-07-08', done: true });
    const settling = (await showSituations(context)).open!.procedure;
    expect(settling).toMatchObject({ branch: 'settling', lead: 'follow', stayOut: true, done: false });
    await expect(endSituation(context, { situationId: id, ending: 'done' })).rejects.toMatchObject({
      code: 'conflict',
    });

    await test(later(context, 95), { freeChlorine: 3.4, pH: 7.5 });
    await test(later(context, 108), { freeChlorine: 3.1, pH: 7.5 });
    const end = later(context, 108.1);
    expect((await showSituations(end)).open!.procedure).toMatchObject({ done: true, stayOut: false });
    await endSituation(end, { situationId: id, ending: 'done' });
    const over = await showSituations(end);
    expect(over.open).toBeNull();
    expect(over.past).toMatchObject([{ id, kind: 'clearing', ending: 'done' }]);
    const sheet = await showWeek(end);
    expect(sheet.situation).toBeNull();
    expect(sheet.verdict.reasons.map(({ code }) => code)).not.toContain('water-green');
    expect(sheet.plan!.reasons.map(({ code }) => code)).not.toContain('situation-treats');
  });

  it('counts a morning under the band as none, and treats again', async () => {
    let context = await fresh(0.1);
    await open(context, green);
    context = later(await giveNext(context), 23);
    // Less than half of the band would raise the question whether the colour was bleached.
    await test(context, { freeChlorine: 4.6, pH: 7.4 }, 'green');
    const { procedure } = (await showSituations(context)).open!;
    expect(procedure.mornings[0]).toMatchObject({ inside: false, drainSeen: false, inARow: 0 });
    expect(procedure).toMatchObject({ lead: 'treat', done: false });
    expect(procedure.reasons).toContainEqual({ code: 'evening-of', evening: 2, most: 4 });
    expect((await showWeek(context)).doses.filter(({ status }) => status === 'planned')).toHaveLength(1);
  });

  it('an accident keeps everybody out and holds the plan until a test says how the water is', async () => {
    const context = await fresh(2);
    await open(context, formed);
    const sheet = await showWeek(context);
    expect(sheet.verdict.state).toBe('stay-out');
    expect(sheet.verdict.reasons.map(({ code }) => code)).toContain('accident-open');
    expect(sheet.doses.filter(({ status }) => status === 'planned')).toEqual([]);
    expect(sheet.plan!.reasons).toEqual([{ code: 'situation-holds', kind: 'accident' }]);
    await test(later(context, 2.5), { freeChlorine: 0.8, pH: 7.4 });
    const [dose] = (await showWeek(later(context, 2.6))).doses.filter(({ status }) => status === 'planned');
    expect(dose).toMatchObject({ reason: 'raise-to-limit' });
  });

  it('opens one at a time, and the same one twice is one', async () => {
    const context = await fresh();
    const id = await open(context, green);
    await open(context, green, id);
    await expect(open(context, formed)).rejects.toMatchObject({ code: 'conflict' });
    expect((await showSituations(context)).past).toEqual([]);
  });

  it('sets the open one aside for another that is named with it, and the water then needs a test', async () => {
    const context = await fresh(0.2);
    const opening = await open(context, { kind: 'opening', answers: { startsOn: '2026-07-06' } });
    await expect(
      openSituation(context, { id: randomUUID(), situation: formed, setAside: randomUUID() }),
    ).rejects.toMatchObject({ code: 'conflict' });
    const shown = await openSituation(context, { id: randomUUID(), situation: formed, setAside: opening });
    expect(shown.open!.situation.kind).toBe('accident');
    expect(shown.past).toMatchObject([{ id: opening, ending: 'set-aside' }]);
  });

  it.each([
    [{ kind: 'storm', answers: { pumpRoom: 'dry', shock: 'no' } }, 'stay-out', 'storm'],
    [{ kind: 'storm', answers: { pumpRoom: 'dry', shock: 'yes' } }, 'stay-out', 'electricity-suspected'],
    [{ kind: 'drain-cover', answers: {} }, 'stay-out', 'drain-cover-broken'],
    [{ kind: 'cover', answers: { covered: 'week-or-more', floaterUnder: 'no' } }, 'stay-out', 'cover-off-after-a-week'],
  ] as const)('%j ends the verdict', async (situation, state, code) => {
    const context = await fresh(0.2);
    await test(context, { freeChlorine: 3, pH: 7.5 });
    await open(later(context, 0.3), situation);
    const { verdict } = await showWeek(later(context, 0.4));
    expect(verdict.state).toBe(state);
    expect(verdict.reasons.map((reason) => reason.code)).toContain(code);
  });

  it('in thunder nobody goes in, however good the test', async () => {
    const context = await fresh(0.2);
    const id = await open(context, { kind: 'storm', answers: { pumpRoom: 'dry', shock: 'no' } });
    await test(later(context, 0.4), { freeChlorine: 3, pH: 7.5 });
    const state = async (hours: number) => (await showWeek(later(context, hours))).verdict.state;
    expect(await state(0.5)).toBe('stay-out');
    await tickSituationStep(later(context, 0.6), { situationId: id, step: 'thunder-over', done: true });
    await test(later(context, 0.7), { freeChlorine: 3, pH: 7.5 });
    expect(await state(0.8)).toBe('fine');
  });

  it('nothing smaller takes the place of what keeps everybody out', async () => {
    const context = await fresh(0.2);
    const stool = await open(context, { kind: 'accident', answers: { what: 'loose-stool' } });
    const instead = (situation: Situation, setAside: string) =>
      openSituation(context, { id: randomUUID(), situation, setAside });
    await expect(instead({ kind: 'quick-raise', answers: {} }, stool)).rejects.toMatchObject({ code: 'conflict' });
    await expect(instead({ kind: 'drain-cover', answers: {} }, stool)).rejects.toMatchObject({ code: 'conflict' });
    await endSituation(context, { situationId: stool, ending: 'mistake' });
    const algae = await open(context, green);
    await expect(instead({ kind: 'stain', answers: {} }, algae)).rejects.toMatchObject({ code: 'conflict' });
    expect((await instead(formed, algae)).open!.situation.kind).toBe('accident');
  });

  it('one that ended early is not forgotten over another that ended well', async () => {
    const context = await fresh(0.2);
    await test(context, { freeChlorine: 3, pH: 7.5 });
    const begun = later(context, 0.3);
    await endSituation(begun, { situationId: await open(begun, formed), ending: 'mistake' });
    const cover = await open(begun, { kind: 'cover', answers: { covered: 'days', floaterUnder: 'no' } });
    await tickSituationStep(begun, { situationId: cover, step: 'air-cover', done: true });
    await endSituation(begun, { situationId: cover, ending: 'done' });
    expect((await showWeek(begun)).verdict.reasons.map(({ code }) => code)).toContain('situation-ended-early');
  });

  it('a replaced drain cover asks for a test: the pump stood still', async () => {
    const context = await fresh(0.2);
    await test(context, { freeChlorine: 3, pH: 7.5 });
    const begun = later(context, 0.3);
    const id = await open(begun, { kind: 'drain-cover', answers: {} });
    await expect(endSituation(begun, { situationId: id, ending: 'done' })).rejects.toMatchObject({ code: 'conflict' });
    await tickSituationStep(begun, { situationId: id, step: 'cover-replaced', done: true });
    await endSituation(begun, { situationId: id, ending: 'done' });
    const { verdict } = await showWeek(later(context, 0.4));
    expect(verdict.reasons.map(({ code }) => code)).not.toContain('drain-cover-broken');
    expect(verdict.reasons.map(({ code }) => code)).toContain('pump-failure');
  });

  it('a drain is not seen the evening before', async () => {
    const context = await fresh(0.2);
    const id = await open(context, green);
    const step = (await stepsOf(context)).find(({ code }) => code === 'drain-seen')!;
    await expect(tickSituationStep(context, { situationId: id, step: step.id, done: true })).rejects.toMatchObject({
      code: 'invalid-input',
    });
  });

  it('ended before its rule is met, the water needs a test before anyone swims', async () => {
    const context = await fresh(0.2);
    await test(context, { freeChlorine: 3, pH: 7.5 });
    const begun = later(context, 0.3);
    const id = await open(begun, formed);
    await endSituation(begun, { situationId: id, ending: 'mistake' });
    await endSituation(begun, { situationId: id, ending: 'mistake' });
    const { verdict } = await showWeek(begun);
    expect(verdict.state).toBe('test-first');
    expect(verdict.reasons.map(({ code }) => code)).toContain('situation-ended-early');
    await test(later(context, 0.5), { freeChlorine: 3, pH: 7.5 });
    expect((await showWeek(later(context, 0.6))).verdict.reasons.map(({ code }) => code)).not.toContain(
      'situation-ended-early',
    );
  });

  it('a drain cover stays broken when a professional has only taken over', async () => {
    const context = await fresh(0.2);
    const id = await open(context, { kind: 'drain-cover', answers: {} });
    await endSituation(context, { situationId: id, ending: 'professional' });
    expect((await showWeek(context)).verdict.reasons[0]!.code).toBe('drain-cover-broken');
  });

  it('takes other answers of the same kind only, and ticks only what is a tick', async () => {
    const context = await fresh(0.2);
    const id = await open(context, green);
    const milky: Situation = { kind: 'clearing', answers: { drain: 'hazy', look: 'milky', addedInLastDay: 'yes' } };
    const answered = await answerSituation(context, { situationId: id, situation: milky });
    expect(answered.open!.procedure.branch).toBe('wait-a-day');
    await expect(answerSituation(context, { situationId: id, situation: formed })).rejects.toMatchObject({
      code: 'conflict',
    });
    await expect(
      tickSituationStep(context, { situationId: id, step: 'test-next-day', done: true }),
    ).rejects.toMatchObject({ code: 'invalid-input' });
    await tickSituationStep(context, { situationId: id, step: 'pump-day-and-night', done: true });
    await tickSituationStep(context, { situationId: id, step: 'pump-day-and-night', done: true });
    const pump = async () => (await stepsOf(context)).find(({ code }) => code === 'pump-day-and-night')!;
    expect(await pump()).toMatchObject({ doneBy: owner.access.personName });
    await tickSituationStep(context, { situationId: id, step: 'pump-day-and-night', done: false });
    expect((await pump()).doneAt).toBeNull();
  });

  it('a viewer looks and changes nothing; another household has nothing of it', async () => {
    const context = await fresh(0.2);
    const viewer = at(context, context.now, { ...context.access, role: 'viewer' } as HouseholdAccess);
    await expect(open(viewer, green)).rejects.toMatchObject({ code: 'not-allowed' });
    const id = await open(context, green);
    expect((await showSituations(viewer)).open!.id).toBe(id);
    await expect(endSituation(viewer, { situationId: id, ending: 'mistake' })).rejects.toMatchObject({
      code: 'not-allowed',
    });
    const other = await aPoolHousehold(context.db, { now: context.now });
    expect((await showSituations(other)).open).toBeNull();
    await expect(endSituation(other, { situationId: id, ending: 'mistake' })).rejects.toMatchObject({
      code: 'not-found',
    });
    await expect(open(other, green, id)).rejects.toMatchObject({ code: 'conflict' });
  });

  it('a larger pool is asked for more in proportion', async () => {
    const amountIn = async (volume: number) => {
      const context = await aPoolHousehold(freshDatabase(), {
        pool: { volume, enteredVolume: volume },
        now: hoursLater(14),
      });
      await recordReading(
        context,
        aFullTest(context.now, { look: 'green', values: { ...water, freeChlorine: 0.6, pH: 7.3 } }),
      );
      await open(context, green);
      return (await stepsOf(context)).find(({ kind }) => kind === 'dose')!.figures.amount as number;
    };
    const ratio = (await amountIn(60)) / (await amountIn(30));
    expect(ratio).toBeGreaterThan(1.97);
    expect(ratio).toBeLessThan(2.03);
  });
});
