import { beforeAll, describe, expect, it } from 'vitest';
import type { Database } from '@/db/client';
import { auditTrail } from '@/db/schema';
import type { PoolEventKind } from '@/lib/schemas/pool-event';
import type { ServiceContext } from '@/lib/services/context';
import { endPoolEvent } from '@/lib/services/end-pool-event';
import { recordReading } from '@/lib/services/record-reading';
import { reportPoolEvent } from '@/lib/services/report-pool-event';
import { showWeek } from '@/lib/services/show-week';
import { planWith } from '@/tests/support/engine';
import { aFullTest, aPoolHousehold, at, copyOf, hoursLater } from '@/tests/support/pool-household';
import { freshDatabase } from '@/tests/support/test-database';

planWith();

const codesOf = ({ verdict }: { verdict: { reasons: { code: string }[] } }) => verdict.reasons.map(({ code }) => code);

describe('what happens to a pool between tests', { timeout: 60_000 }, () => {
  let tested: Database;
  let owner: ServiceContext;
  beforeAll(async () => {
    tested = freshDatabase();
    owner = await aPoolHousehold(tested);
    await recordReading(owner, aFullTest());
  });
  const fresh = async () => at({ ...owner, db: await copyOf(tested) }, hoursLater(2));
  const report = (context: ServiceContext, kind: PoolEventKind, id: string = crypto.randomUUID()) =>
    reportPoolEvent(context, { id, kind, happenedAt: context.now.toISOString() }).then(() => id);

  // Care rules, part 2: the rows of "Test first", and the drain cover of "Stay out".
  it.each([
    ['storm', 'test-first', 'storm'],
    ['pump-failure', 'test-first', 'pump-failure'],
    ['cover-off', 'test-first', 'cover-off-after-a-week'],
    ['drain-cover', 'stay-out', 'drain-cover-broken'],
  ] as const)('%s: %s', async (kind, state, reason) => {
    const context = await fresh();
    expect(codesOf(await showWeek(context))).not.toContain(reason);
    await report(context, kind);
    const sheet = await showWeek(context);
    expect(sheet.verdict.state).toBe(state);
    expect(codesOf(sheet)).toContain(reason);
    expect(sheet.events).toMatchObject([{ kind, reportedBy: owner.access.personName }]);
  });

  it('is over with the next test; a drain cover only when somebody says that it is replaced', async () => {
    const context = await fresh();
    await report(context, 'storm');
    const cover = await report(context, 'drain-cover');
    const later = at(context, hoursLater(3));
    const again = { ...aFullTest(later.now), kind: 'quick' as const };
    await recordReading(later, again);
    expect((await showWeek(later)).events.map(({ kind }) => kind)).toEqual(['drain-cover']);
    expect(codesOf(await showWeek(later))).toContain('drain-cover-broken');
    await endPoolEvent(later, { id: cover });
    expect((await showWeek(later)).events).toEqual([]);
    expect(codesOf(await showWeek(later))).not.toContain('drain-cover-broken');
  });

  it('stays over for good with that test, however long ago it was', async () => {
    const context = await fresh();
    await report(context, 'storm');
    const later = at(context, hoursLater(3));
    await recordReading(later, { ...aFullTest(later.now), kind: 'quick' as const });
    const spring = at(context, hoursLater(24 * 200));
    expect((await showWeek(spring)).events).toEqual([]);
  });

  it('a drain cover is the headline, whatever the chemistry says', async () => {
    const context = await fresh();
    await report(context, 'drain-cover');
    const later = at(context, hoursLater(3));
    const low = aFullTest(later.now);
    await recordReading(later, { ...low, values: { ...low.values, freeChlorine: 0.6 } });
    expect(codesOf(await showWeek(later))[0]).toBe('drain-cover-broken');
  });

  it('is written down once however often it is sent, and every change is on record', async () => {
    const context = await fresh();
    const before = await context.db.$count(auditTrail);
    const id = await report(context, 'pump-failure');
    await report(context, 'pump-failure', id);
    await endPoolEvent(context, { id });
    expect((await showWeek(context)).events).toEqual([]);
    expect(await context.db.$count(auditTrail)).toBe(before + 2);
  });

  it('of another household is not there, and its id is not to be taken', async () => {
    const context = await fresh();
    const id = await report(context, 'storm');
    const other = { ...(await aPoolHousehold(context.db)), now: context.now };
    await expect(endPoolEvent(other, { id })).rejects.toMatchObject({ code: 'not-found' });
    await expect(report(other, 'storm', id)).rejects.toMatchObject({ code: 'conflict' });
    expect((await showWeek(context)).events).toHaveLength(1);
  });

  it('is not of the future, and not for who only looks', async () => {
    const context = await fresh();
    const ahead = {
      id: crypto.randomUUID(),
      kind: 'storm' as const,
      happenedAt: hoursLater(3).toISOString(),
    };
    await expect(reportPoolEvent(context, ahead)).rejects.toMatchObject({
      code: 'invalid-input',
      problems: [{ path: 'happenedAt' }],
    });
    const viewer = { ...context, access: { ...context.access, role: 'viewer' as const } };
    await expect(report(viewer, 'storm')).rejects.toMatchObject({ code: 'not-allowed' });
    await expect(endPoolEvent(viewer, { id: ahead.id })).rejects.toMatchObject({ code: 'not-allowed' });
  });
});
