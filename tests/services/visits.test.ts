import { beforeEach, describe, expect, it } from 'vitest';
import { newVisitSchema } from '@/lib/schemas/visit';
import type { ServiceContext } from '@/lib/services/context';
import { recordVisit } from '@/lib/services/record-visit';
import { showVisits } from '@/lib/services/show-visits';
import { aPoolHousehold, at } from '@/tests/support/pool-household';
import { freshDatabase } from '@/tests/support/test-database';

const aVisit = (visitedOn: string, note?: string) => ({
  id: crypto.randomUUID(),
  visitedOn,
  ...(note === undefined ? {} : { note }),
});

describe('a visit of the professional', () => {
  let owner: ServiceContext;
  beforeEach(async () => {
    owner = await aPoolHousehold(freshDatabase());
  });

  it('is kept by its day; the newest five are shown, whenever they were written down', async () => {
    const days = ['2026-06-01', '2026-07-05', '2026-03-10', '2026-05-20', '2025-11-02', '2026-04-15'];
    for (const day of days) await recordVisit(owner, aVisit(day, `on ${day}`));
    const shown = await showVisits(owner);
    expect(shown.map(({ visitedOn }) => visitedOn)).toEqual(days.toSorted().reverse().slice(0, 5));
    expect(shown[0]).toMatchObject({ note: 'on 2026-07-05', recordedBy: owner.access.personName });
  });

  it('sent twice is kept once', async () => {
    const visit = aVisit('2026-07-01');
    await recordVisit(owner, visit);
    expect(await recordVisit(owner, visit)).toHaveLength(1);
  });

  it('can be of today as the household lives it, and not of tomorrow', async () => {
    // 02:00 in UTC is still Sunday evening in New York.
    const night = at(owner, new Date('2026-07-06T02:00:00Z'));
    expect(await recordVisit(night, aVisit('2026-07-05'))).toHaveLength(1);
    await expect(recordVisit(night, aVisit('2026-07-06'))).rejects.toMatchObject({
      code: 'invalid-input',
      problems: [{ path: 'visitedOn' }],
    });
  });

  it('of another household, or by somebody who only looks: refused, and nothing is kept', async () => {
    const visit = aVisit('2026-07-01');
    await recordVisit(owner, visit);
    const other = await aPoolHousehold(owner.db);
    await expect(recordVisit(other, visit)).rejects.toMatchObject({ code: 'conflict' });
    expect(await showVisits(other)).toEqual([]);
    const viewer = { ...owner, access: { ...owner.access, role: 'viewer' as const } };
    await expect(recordVisit(viewer, aVisit('2026-07-02'))).rejects.toMatchObject({ code: 'not-allowed' });
    expect(await showVisits(viewer)).toHaveLength(1);
  });

  it.each([
    ['a note of 501 characters', { note: 'x'.repeat(501) }],
    ['a day that is none', { visitedOn: '2026-02-30' }],
    ['a key it does not know', { price: 80 }],
  ])('refuses %s', (_, wrong) => {
    expect(newVisitSchema.safeParse({ ...aVisit('2026-07-01', 'x'.repeat(500)), ...wrong }).success).toBe(false);
  });
});
