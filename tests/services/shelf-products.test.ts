import { describe, expect, it } from 'vitest';
import { listAudit } from '@/db/queries/audit-trail';
import { type HouseholdProduct, householdProductSchema } from '@/lib/schemas/household-product';
import { checkInput } from '@/lib/schemas/problems';
import { countStock } from '@/lib/services/count-stock';
import { listShelfProducts } from '@/lib/services/list-shelf-products';
import { removeShelfProduct } from '@/lib/services/remove-shelf-product';
import { saveShelfProduct } from '@/lib/services/save-shelf-product';
import { aHousehold, aMember, freshDatabase } from '@/tests/support/test-database';

const now = new Date('2026-07-05T12:00:00Z');
const granules: HouseholdProduct = householdProductSchema.parse({
  id: 'gran',
  name: 'The blue tub',
  form: 'granular',
  substance: 'calcium-hypochlorite',
  strength: 65,
  labelWay: 'dissolve',
  measure: 50,
  pricePerKg: 7.5,
  stock: 4000,
});

async function aShelf() {
  const db = freshDatabase();
  const access = await aHousehold(db);
  await saveShelfProduct({ db, access, now }, granules);
  return { db, access, now };
}

describe('the shelf', () => {
  it('gives back what was put on it, once however often it was sent', async () => {
    const context = await aShelf();
    await saveShelfProduct(context, granules);
    expect(await listShelfProducts(context)).toEqual([granules]);
  });

  it('forgets what is no longer said of a product', async () => {
    const context = await aShelf();
    const { name: _name, pricePerKg: _price, ...bare } = granules;
    await saveShelfProduct(context, bare);
    expect(await listShelfProducts(context)).toEqual([bare]);
  });

  it('is counted by a caretaker, and filled and cleared by an owner only', async () => {
    const { db, access, now: at } = await aShelf();
    const caretaker = {
      db,
      now: at,
      access: await aMember(db, { householdId: access.householdId, role: 'caretaker', now }),
    };
    expect((await countStock(caretaker, { id: 'gran', stock: 1200 })).stock).toBe(1200);
    await expect(saveShelfProduct(caretaker, granules)).rejects.toMatchObject({ code: 'not-allowed' });
    await expect(removeShelfProduct(caretaker, { id: 'gran' })).rejects.toMatchObject({ code: 'not-allowed' });
    const [counted] = await listAudit(db, access.householdId);
    expect(counted).toMatchObject({ action: 'count-stock', detail: { from: 4000, to: 1200 } });
  });

  it('of another household is out of reach, also by the same id', async () => {
    const mine = await aShelf();
    const theirs = { db: mine.db, now, access: await aHousehold(mine.db) };
    expect(await listShelfProducts(theirs)).toEqual([]);
    await expect(countStock(theirs, { id: 'gran', stock: 0 })).rejects.toMatchObject({ code: 'not-found' });
    await expect(removeShelfProduct(theirs, { id: 'gran' })).rejects.toMatchObject({ code: 'not-found' });
    await saveShelfProduct(theirs, { ...granules, stock: 1 });
    expect(await listShelfProducts(mine)).toEqual([granules]);
    await removeShelfProduct(theirs, { id: 'gran' });
    expect(await listShelfProducts(mine)).toEqual([granules]);
  });

  it('has an end', async () => {
    const context = await aShelf();
    for (let count = 1; count < 50; count += 1) await saveShelfProduct(context, { ...granules, id: `gran-${count}` });
    await expect(saveShelfProduct(context, { ...granules, id: 'one-more' })).rejects.toMatchObject({
      code: 'conflict',
    });
    await saveShelfProduct(context, { ...granules, stock: 5 });
  });
});

describe('a product', () => {
  it.each([
    [{ strength: undefined }, 'strength', 'Copy the strength from the label.'],
    [{ strength: 0 }, 'strength', 'Copy the strength from the label.'],
    [{ strength: 'strong' }, 'strength', 'Write a number.'],
    [{ form: 'liquid' }, 'form', 'This one is not sold as a liquid.'],
    [{ substance: 'bleach' }, 'substance', /^Choose one of these: trichlor, /],
    [{ form: 'tablet', substance: 'trichlor' }, 'tabletMass', 'Write what one tablet weighs.'],
    [{ form: 'liquid', substance: 'sodium-hypochlorite' }, 'boughtOn', /loses strength on the shelf/],
    [{ stock: -1 }, 'stock', 'Write 0 or more.'],
    [{ boughtOn: '5 July' }, 'boughtOn', 'Write a day like 2026-07-05.'],
  ])('is refused in words: %j', (changed, path, message) => {
    const checked = checkInput(householdProductSchema, { ...granules, ...changed });
    expect(checked.sound ? [] : checked.problems).toEqual([
      { path, message: message instanceof RegExp ? (expect.stringMatching(message) as string) : message },
    ]);
  });

  it('that is a blend is kept with nothing but its name', () => {
    const blend = { id: 'blend', name: 'Weekend mix', form: 'other', substance: 'other' };
    expect(checkInput(householdProductSchema, blend).sound).toBe(true);
  });
});
