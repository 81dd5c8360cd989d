import { type SQL, sql } from 'drizzle-orm';
import type { SQLiteColumn } from 'drizzle-orm/sqlite-core';

// A CHECK is text in the migration, so its values are written out and not bound; they come from this code only.
const literal = (value: string | number) => sql.raw(typeof value === 'number' ? String(value) : `'${value}'`);

/** The column holds one of the values, or null. */
export const oneOf = (column: SQLiteColumn, values: readonly (string | number)[]): SQL =>
  sql`${column} in (${sql.join(values.map(literal), sql.raw(', '))})`;

/** The column lies between low and high, both included, or is null. */
export const between = (column: SQLiteColumn, low: number, high: number): SQL =>
  sql`${column} between ${literal(low)} and ${literal(high)}`;

/** The column is a calendar day such as 2026-07-05, or null. */
export const isDay = (column: SQLiteColumn): SQL => sql`${column} is null or ${column} is date(${column})`;

/** The column is a time of day such as 19:40, or null. */
export const isWallTime = (column: SQLiteColumn): SQL =>
  sql`${column} is null or ${column} is strftime('%H:%M', ${column})`;
