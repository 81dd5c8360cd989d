import { sql } from 'drizzle-orm';
import { check, integer, primaryKey, real, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { labelWays, productForms, substances } from '@/lib/schemas/shelf-product';
import { between, isDay, oneOf } from './checks';
import { households } from './households';

const substancesOrOther = [...substances, 'other'] as const;

export const shelfProducts = sqliteTable(
  'shelf_products',
  {
    householdId: text('household_id')
      .notNull()
      .references(() => households.id, { onDelete: 'cascade' }),
    /** Made on the device; unique within the household, so that a copied household keeps its ids. */
    id: text('id').notNull(),
    /** What the family calls it. */
    name: text('name'),
    form: text('form', { enum: productForms }).notNull(),
    substance: text('substance', { enum: substancesOrOther }).notNull(),
    /** % available chlorine or % by weight; liquids trade %. */
    strength: real('strength'),
    alkali: real('alkali').notNull(),
    tabletMass: real('tablet_mass_grams'),
    labelWay: text('label_way', { enum: labelWays }).notNull(),
    /** The marked measure kept for this product [g or mL]. */
    measure: real('measure'),
    pricePerKg: real('price_per_kg'),
    pricePerLitre: real('price_per_litre'),
    /** Left on the shelf [g or mL]. */
    stock: real('stock').notNull(),
    boughtOn: text('bought_on'),
    storedAt: real('stored_at_celsius').notNull(),
    createdAt: integer('created_at', { mode: 'timestamp_ms' }).notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.householdId, table.id] }),
    check('shelf_products_id_has_length', sql`length(${table.id}) between 1 and 64`),
    check('shelf_products_form_known', oneOf(table.form, productForms)),
    check('shelf_products_substance_known', oneOf(table.substance, substancesOrOther)),
    check('shelf_products_label_way_known', oneOf(table.labelWay, labelWays)),
    check('shelf_products_strength_in_range', sql`${table.strength} > 0 and ${table.strength} <= 100`),
    check('shelf_products_alkali_in_range', between(table.alkali, 0, 20)),
    check('shelf_products_tablet_mass_in_range', between(table.tabletMass, 1, 1000)),
    check('shelf_products_measure_in_range', sql`${table.measure} > 0 and ${table.measure} <= 20000`),
    check('shelf_products_price_per_kg_in_range', between(table.pricePerKg, 0, 10000)),
    check('shelf_products_price_per_litre_in_range', between(table.pricePerLitre, 0, 10000)),
    check('shelf_products_stock_in_range', between(table.stock, 0, 1e7)),
    check('shelf_products_stored_at_in_range', between(table.storedAt, -20, 60)),
    check('shelf_products_bought_on_is_a_day', isDay(table.boughtOn)),
  ],
);
