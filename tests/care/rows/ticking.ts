import { randomUUID } from 'node:crypto';
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect } from 'vitest';
import { saveShelfProduct, setStock } from '@/db/queries/shelf-products';
import type { HouseholdAccess } from '@/lib/auth/household-access';
import type { DoseTick, PlanDose } from '@/lib/schemas/plan-dose';
import { confirmStop } from '@/lib/services/confirm-stop';
import type { ServiceContext } from '@/lib/services/context';
import { recordReading } from '@/lib/services/record-reading';
import { showWeek } from '@/lib/services/show-week';
import { tickDose } from '@/lib/services/tick-dose';
import { aFullTest, aPoolHousehold, at, copyOf, designShelf, hoursLater } from '@/tests/support/pool-household';
import { aMember, freshDatabase } from '@/tests/support/test-database';
import type { Row } from '../row';
import { written } from '../words';

const minutes = (count: number, from: Date) => hoursLater(count / 60, from);
const root = join(import.meta.dirname, '../../..');

/** A household that tested on Sunday evening, with the first fast dose of its plan; copied for every row. */
type Prepared = { owner: ServiceContext; dose: PlanDose; due: Date };
let prepared: Prepared;

/** Makes the household; called once before the rows. */
export async function prepareHousehold(): Promise<void> {
  const owner = await aPoolHousehold(freshDatabase());
  const { householdId } = owner.access;
  await setStock(owner.db, { householdId, id: 'tabs', stock: 0 });
  await recordReading(owner, aFullTest(owner.now, { values: { ...aFullTest().values, freeChlorine: 2.6 } }));
  const { doses } = await showWeek(owner, { start: '2026-07-06' });
  const dose = doses.find(({ product }) => product === 'gran');
  if (!dose) throw new Error('The plan has no granules.');
  prepared = { owner, dose, due: new Date(dose.at) };
}

async function household(): Promise<Prepared> {
  return { ...prepared, owner: { ...prepared.owner, db: await copyOf(prepared.owner.db) } };
}

async function another(
  owner: ServiceContext,
  role: HouseholdAccess['role'] = 'caretaker',
  handlesChemicals = true,
): Promise<ServiceContext> {
  const { householdId } = owner.access;
  return at(owner, owner.now, await aMember(owner.db, { householdId, role, handlesChemicals, now: hoursLater(-1) }));
}

const tick = (part: object): DoseTick => ({ id: randomUUID(), planVersion: 1, ...part }) as DoseTick;
const given = () => tick({ action: 'given' });
const codesOf = async (context: ServiceContext) => (await showWeek(context)).verdict.reasons.map(({ code }) => code);
const folders = (path: string) => readdirSync(join(root, path), { withFileTypes: true }).map(({ name }) => name);

/** Part 4 on ticks, and what of part 2 only a household can show. */
export const tickingRows: readonly Row[] = [
  [
    'three-hours',
    'a dose can be ticked from 3 h before its hour, not a minute earlier',
    async () => {
      const { owner, dose, due } = await household();
      await expect(tickDose(at(owner, minutes(-181, due)), dose.id, given())).rejects.toMatchObject({
        code: 'conflict',
      });
      const sheet = await tickDose(at(owner, minutes(-180, due)), dose.id, given());
      expect(sheet.doses.find(({ id }) => id === dose.id)?.status).toBe('given');
    },
  ],
  [
    'ten-minutes',
    'one tap as planned; whoever ticked takes it back for ten minutes',
    async () => {
      const { owner, dose, due } = await household();
      const caretaker = await another(owner);
      const { doses } = await tickDose(at(caretaker, due), dose.id, given());
      expect(doses.find(({ id }) => id === dose.id)).toMatchObject({ status: 'given', givenAmount: dose.amount });
      const undo = (after: number) => tickDose(at(caretaker, minutes(after, due)), dose.id, tick({ action: 'undo' }));
      await expect(undo(10.1)).rejects.toMatchObject({ code: 'not-allowed' });
      const undone = await undo(10);
      expect(undone.doses.find(({ id }) => id === dose.id)?.status).not.toBe('given');
    },
  ],
  [
    'claim',
    'a claim shows to all by name, and nobody else can claim it meanwhile',
    async () => {
      const { owner, dose, due } = await household();
      const other = await another(owner);
      await tickDose(at(owner, due), dose.id, tick({ action: 'claim' }));
      const seen = await showWeek(at(other, due), { start: '2026-07-06' });
      expect(seen.doses.find(({ id }) => id === dose.id)?.claimedBy).toBe('Ines');
      const second = tickDose(at(other, due), dose.id, tick({ action: 'claim' }));
      await expect(second).rejects.toMatchObject({ code: 'conflict' });
    },
  ],
  [
    'two-ticks',
    'two ticks of one dose keep everyone out until a reading of chlorine',
    async () => {
      const { owner, dose, due } = await household();
      const other = await another(owner);
      await tickDose(at(owner, due), dose.id, given());
      const sheet = await tickDose(at(other, minutes(5, due)), dose.id, given());
      expect(sheet.verdict.state).toBe('stay-out');
      expect(sheet.verdict.reasons[0]?.code).toBe('suspected-double-dose');
      const later = hoursLater(40, due);
      expect(await codesOf(at(owner, later))).toContain('suspected-double-dose');
      await recordReading(at(owner, later), aFullTest(later));
      expect(await codesOf(at(owner, later))).not.toContain('suspected-double-dose');
    },
  ],
  [
    'two-ticks',
    'a tick, and one that waited on another device without a connection, do the same',
    async () => {
      const { owner, dose, due } = await household();
      const other = await another(owner);
      await tickDose(at(owner, due), dose.id, given());
      const offline = tick({ action: 'given', at: minutes(-20, due).toISOString() });
      const sheet = await tickDose(at(other, hoursLater(12, due)), dose.id, offline);
      expect(sheet.verdict.state).toBe('stay-out');
      expect(sheet.verdict.reasons.map(({ code }) => code)).toContain('suspected-double-dose');
    },
  ],
  [
    'two-ticks',
    'two ticks of one person for two different hours are two ticks as well',
    async () => {
      const { owner, dose, due } = await household();
      await tickDose(at(owner, due), dose.id, given());
      const offline = tick({ action: 'given', at: minutes(-170, due).toISOString() });
      await tickDose(at(owner, hoursLater(2, due)), dose.id, offline);
      expect(await codesOf(at(owner, hoursLater(2, due)))).toContain('suspected-double-dose');
    },
  ],
  [
    'two-ticks',
    'and says so in the words of the paper',
    () => {
      for (const place of ['doses: doubtful', 'verdict: reason.suspected-double-dose'])
        expect(written(place)).toBe('Was it added twice? Stay out, test in the morning.');
    },
  ],
  [
    'test-due',
    'a dose whose hour is over, neither ticked nor skipped, asks for a test; skipped it does not',
    async () => {
      const { owner, dose, due } = await household();
      expect(await codesOf(at(owner, minutes(1, due)))).toContain('due-dose-open');
      await tickDose(at(owner, minutes(1, due)), dose.id, tick({ action: 'skipped' }));
      expect(await codesOf(at(owner, minutes(2, due)))).not.toContain('due-dose-open');
    },
  ],
  [
    'test-doubt',
    'skipped by one person, ticked by another: nobody can tell what is in the water',
    async () => {
      const { owner, dose, due } = await household();
      const other = await another(owner);
      await tickDose(at(owner, due), dose.id, tick({ action: 'skipped' }));
      await tickDose(at(other, minutes(5, due)), dose.id, given());
      expect(await codesOf(at(owner, minutes(6, due)))).toContain('doubtful-tick');
    },
  ],
  [
    'handles',
    'only a member marked as handling chemicals ticks; others, and whoever only views, are refused',
    async () => {
      const { owner, dose, due } = await household();
      const refused = [await another(owner, 'viewer', false), await another(owner, 'caretaker', false)];
      refused.push(await another(owner, 'owner', false));
      for (const context of refused)
        await expect(tickDose(at(context, due), dose.id, given())).rejects.toMatchObject({ code: 'not-allowed' });
      await tickDose(at(await another(owner), due), dose.id, given());
    },
  ],
  [
    'handles',
    'whoever does not handle chemicals may test all the same',
    async () => {
      const { owner } = await household();
      const tester = await another(owner, 'caretaker', false);
      await expect(recordReading(at(tester, hoursLater(1)), aFullTest(hoursLater(1)))).resolves.toBeDefined();
    },
  ],
  [
    'stop-by-name',
    'asked once for each person and product, again after 90 days or when the product changes',
    async () => {
      const { owner, dose } = await household();
      const due = async (context: ServiceContext) =>
        (await showWeek(context, { start: '2026-07-06' })).doses.find(({ product }) => product === 'gran')!.stopDue;
      expect(await due(owner)).toBe(true);
      await confirmStop(at(owner, hoursLater(-90 * 24 + 1)), { id: randomUUID(), doseId: dose.id });
      expect(await due(owner)).toBe(false);
      expect(await due(at(owner, hoursLater(1.1)))).toBe(true);
      const other = await another(owner);
      expect(await due(other)).toBe(true);
      const product = { ...designShelf[1]!, strength: 70 };
      await saveShelfProduct(owner.db, { householdId: owner.access.householdId, product, now: owner.now });
      expect(await due(owner)).toBe(true);
    },
  ],
  [
    'pump-4',
    'a dose that went in larger than planned keeps the pump on 8 h where it added more than 5 mg/L',
    async () => {
      const { owner, dose, due } = await household();
      // 700 g of 65 % are 455 g of chlorine: 6 mg/L in 75.7 m3.
      const { doses } = await tickDose(at(owner, due), dose.id, tick({ action: 'changed', amount: 700 }));
      const { pumpUntil } = doses.find(({ id }) => id === dose.id)!;
      expect(Date.parse(pumpUntil!) - due.getTime()).toBe(8 * 3_600_000);
    },
  ],
  [
    'label-way',
    'tablets whose label’s way a household could not find are not planned either',
    async () => {
      const owner = await aPoolHousehold(freshDatabase(), {
        shelf: [{ ...designShelf[0]!, labelWay: 'unknown' }, designShelf[1]!],
      });
      await recordReading(owner, aFullTest());
      const { doses } = await showWeek(owner, { start: '2026-07-06' });
      expect(doses.filter(({ form }) => form === 'tablet')).toEqual([]);
    },
  ],
  [
    'zero-holds',
    'a zero after a dose plans nothing and is Test first until the question is answered',
    async () => {
      const { owner, dose, due } = await household();
      await tickDose(at(owner, due), dose.id, given());
      const morning = hoursLater(14, due);
      await recordReading(
        at(owner, morning),
        aFullTest(morning, { values: { ...aFullTest().values, freeChlorine: 0.2 } }),
      );
      const sheet = await showWeek(at(owner, morning), { start: '2026-07-06' });
      expect(sheet.verdict.state).toBe('test-first');
      expect(sheet.verdict.reasons.map(({ code }) => code)).toContain('false-zero-open');
      expect(sheet.doses.filter(({ status }) => status === 'planned')).toEqual([]);
    },
  ],
  [
    'zero-holds',
    'a colour that flashed is far too much: stay out, nothing is planned',
    async () => {
      const { owner } = await household();
      const later = hoursLater(20);
      const values = { ...aFullTest().values, freeChlorine: 0 };
      await recordReading(at(owner, later), aFullTest(later, { values, zeroAnswer: 'flashed' }));
      const sheet = await showWeek(at(owner, later), { start: '2026-07-06' });
      expect(sheet.verdict.state).toBe('stay-out');
      expect(sheet.verdict.reasons[0]?.code).toBe('chlorine-over-maximum');
      expect(sheet.doses.filter(({ status }) => status === 'planned')).toEqual([]);
    },
  ],
  [
    'calendar-no-amounts',
    'there is no calendar feed yet; when there is one, that it carries no amounts belongs here',
    () => expect(folders('app/api').filter((name) => /calendar|feed|ical/.test(name))).toEqual([]),
  ],
  [
    'no-pump-drive',
    'no route drives a pump',
    () => {
      expect(folders('app/api')).toContain('doses');
      expect(folders('app/api').filter((name) => /pump|switch|device|relay/.test(name))).toEqual([]);
    },
  ],
  [
    'made-and-until',
    'what is printed for the house says when it was made and until when it holds',
    () => {
      expect(written('house: sheet.made')).toBe('Made {when}.');
      expect(written('house: sheet.good')).toMatch(/^Good until \{when\}/);
    },
  ],
  [
    'made-and-until',
    'without a connection only the emergency card opens, which ages by no hour; another page has to say when it was made',
    () => {
      const worker = readFileSync(join(root, 'public/sw.js'), 'utf8');
      const pages = [...worker.matchAll(/'(\/(?!_next)[\w/-]+)'/g)].map(([, path]) => path);
      expect(pages).toEqual(['/help/emergency']);
    },
  ],
];
