import { beforeAll, describe, expect, it } from 'vitest';
import type { Database } from '@/db/client';
import type { NewRound } from '@/lib/schemas/round';
import { newRoundSchema } from '@/lib/schemas/round';
import type { ServiceContext } from '@/lib/services/context';
import { recordReading } from '@/lib/services/record-reading';
import { recordRound } from '@/lib/services/record-round';
import { showRounds } from '@/lib/services/show-rounds';
import { showWeek } from '@/lib/services/show-week';
import { planWith } from '@/tests/support/engine';
import { aFullTest, aPoolHousehold, at, copyOf, hoursLater } from '@/tests/support/pool-household';
import { freshDatabase } from '@/tests/support/test-database';

planWith();

const aRound = ({ now }: ServiceContext, rest: Partial<NewRound> = {}): NewRound => ({
  id: crypto.randomUUID(),
  doneAt: now.toISOString(),
  exceptions: [],
  ...rest,
});

describe('a ten-minute round', { timeout: 60_000 }, () => {
  let tested: Database;
  let owner: ServiceContext;
  beforeAll(async () => {
    tested = freshDatabase();
    owner = await aPoolHousehold(tested);
    await recordReading(owner, aFullTest());
  });
  const fresh = async (hours = 2) => at({ ...owner, db: await copyOf(tested) }, hoursLater(hours));

  it('is kept with what was not fine, and the newest is shown', async () => {
    const context = await fresh();
    expect(await showRounds(context)).toEqual({ last: null, cleanPressure: null });
    await recordRound(context, aRound(context, { exceptions: ['pump-seal'] }));
    const later = at(context, hoursLater(9));
    const shown = await recordRound(later, aRound(later, { pressure: 1.2, cleanPressure: 0.9 }));
    expect(shown).toMatchObject({ last: { exceptions: [], doneBy: owner.access.personName }, cleanPressure: 0.9 });
    const last = at(context, hoursLater(10));
    // A round without the gauge leaves the clean filter's pressure as it was.
    expect(await recordRound(last, aRound(last))).toMatchObject({ cleanPressure: 0.9 });
  });

  it('sent twice is kept once', async () => {
    const context = await fresh();
    const round = aRound(context, { exceptions: ['drain-cover'] });
    await recordRound(context, round);
    await recordRound(context, round);
    expect((await showWeek(context)).events).toHaveLength(1);
  });

  it('with a drain cover that is not whole ends the verdict: stay out', async () => {
    const context = await fresh();
    await recordRound(context, aRound(context, { exceptions: ['gate-latch', 'drain-cover'] }));
    const { verdict } = await showWeek(context);
    expect(verdict.state).toBe('stay-out');
    expect(verdict.reasons.map(({ code }) => code)).toContain('drain-cover-broken');
  });

  it('of another household, of the future, by somebody who only looks: refused, and nothing is kept', async () => {
    const context = await fresh();
    const round = aRound(context);
    await recordRound(context, round);
    const other = { ...(await aPoolHousehold(context.db)), now: context.now };
    await expect(recordRound(other, round)).rejects.toMatchObject({ code: 'conflict' });
    expect((await showRounds(other)).last).toBeNull();
    const ahead = aRound(context, { doneAt: hoursLater(5).toISOString() });
    await expect(recordRound(context, ahead)).rejects.toMatchObject({ problems: [{ path: 'doneAt' }] });
    const viewer = { ...context, access: { ...context.access, role: 'viewer' as const } };
    await expect(recordRound(viewer, aRound(context))).rejects.toMatchObject({ code: 'not-allowed' });
  });

  it.each([
    ['a pressure no gauge shows', { pressure: 30 }],
    ['the same thing twice', { exceptions: ['ladder', 'ladder'] }],
    ['a thing it does not know', { exceptions: ['roof'] }],
    ['a key it does not know', { level: 3 }],
  ])('refuses %s', async (_, wrong) => {
    expect(newRoundSchema.safeParse({ ...aRound(await fresh()), ...wrong }).success).toBe(false);
  });
});
