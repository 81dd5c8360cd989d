import { sql } from 'drizzle-orm';
import { blob, check, foreignKey, index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { MOST_KEPT_BYTES, photoKinds } from '@/lib/schemas/photo';
import { oneOf } from './checks';
import { households } from './households';
import { people } from './people';
import { readings } from './readings';
import { shelfProducts } from './shelf-products';

/** Photos of strips, labels and equipment, encoded anew by the server: nothing of the file that was sent is kept. */
export const photos = sqliteTable(
  'photos',
  {
    /** Made on the device: the primary key is what makes a resend harmless. */
    id: text('id').primaryKey(),
    householdId: text('household_id')
      .notNull()
      .references(() => households.id, { onDelete: 'cascade' }),
    kind: text('kind', { enum: photoKinds }).notNull(),
    readingId: text('reading_id').references(() => readings.id, { onDelete: 'cascade' }),
    productId: text('product_id'),
    caption: text('caption'),
    width: integer('width_pixels').notNull(),
    height: integer('height_pixels').notNull(),
    /** WebP, whole and as a small copy for lists. */
    picture: blob('picture', { mode: 'buffer' }).notNull(),
    small: blob('small', { mode: 'buffer' }).notNull(),
    addedAt: integer('added_at', { mode: 'timestamp_ms' }).notNull(),
    addedBy: text('added_by').references(() => people.id, { onDelete: 'set null' }),
  },
  (table) => [
    foreignKey({
      columns: [table.householdId, table.productId],
      foreignColumns: [shelfProducts.householdId, shelfProducts.id],
    }).onDelete('cascade'),
    check('photos_kind_known', oneOf(table.kind, photoKinds)),
    check('photos_strip_has_reading', sql`(${table.kind} = 'strip') = (${table.readingId} is not null)`),
    check('photos_label_has_product', sql`(${table.kind} = 'label') = (${table.productId} is not null)`),
    check(
      'photos_size_in_range',
      sql`length(${table.picture}) + length(${table.small}) <= ${sql.raw(String(MOST_KEPT_BYTES))}`,
    ),
    check('photos_caption_has_length', sql`length(${table.caption}) between 1 and 120`),
    index('photos_household_added_at_idx').on(table.householdId, table.addedAt),
    index('photos_reading_idx').on(table.readingId),
  ],
);
