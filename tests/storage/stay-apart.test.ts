import { describe, expect, it } from 'vitest';
import { substances } from '@/lib/schemas/shelf-product';
import { type ApartReason, mustStayApart, type ShelfSubstance } from '@/lib/storage/stay-apart';

// Source: shared/reference/care-sources.md B1, B2, B8 (CDC, fire services, US EPA 550-F-01-003, Bland Shire Council).

const chlorines = ['trichlor', 'dichlor', 'calcium-hypochlorite', 'sodium-hypochlorite'] as const;
const acids = ['hydrochloric-acid', 'sodium-bisulfate'] as const;
const all: ShelfSubstance[] = [...substances, 'other'];

describe('what must stay apart', () => {
  it.each(chlorines.flatMap((chlorine) => acids.map((acid) => [chlorine, acid] as const)))(
    '%s and %s: toxic gas',
    (chlorine, acid) => {
      expect(mustStayApart(chlorine, acid)).toBe('toxic-gas');
    },
  );

  it('two different chlorines can burn or explode', () => {
    for (const a of chlorines)
      for (const b of chlorines) expect(mustStayApart(a, b)).toBe(a === b ? null : 'fire-or-explosion');
  });

  it.each<[ShelfSubstance, ShelfSubstance, ApartReason | null]>([
    ['calcium-hypochlorite', 'cyanuric-acid', 'fire-or-explosion'],
    ['trichlor', 'sodium-thiosulfate', 'fire-or-explosion'],
    ['calcium-hypochlorite', 'sodium-bicarbonate', 'contaminated-chlorine'],
    ['trichlor', 'calcium-chloride', 'contaminated-chlorine'],
    ['hydrochloric-acid', 'sodium-carbonate', 'heat-and-spatter'],
    ['hydrochloric-acid', 'sodium-thiosulfate', 'toxic-gas'],
    ['hydrochloric-acid', 'calcium-chloride', 'acid-fumes'],
    ['hydrochloric-acid', 'sodium-bisulfate', 'acid-fumes'],
    ['sodium-bicarbonate', 'sodium-carbonate', null],
    ['sodium-bicarbonate', 'calcium-chloride', null],
    ['cyanuric-acid', 'sodium-bicarbonate', null],
  ])('%s and %s: %s', (a, b, reason) => {
    expect(mustStayApart(a, b)).toBe(reason);
  });

  it('does not depend on the order, and a product may stand beside itself', () => {
    for (const a of all) for (const b of all) expect(mustStayApart(a, b)).toBe(mustStayApart(b, a));
    for (const substance of substances) expect(mustStayApart(substance, substance)).toBeNull();
  });

  it('lets nothing stand beside a chlorine or an unknown blend', () => {
    for (const other of all) {
      expect(mustStayApart('other', other)).toBe('unknown-product');
      for (const chlorine of chlorines) if (other !== chlorine) expect(mustStayApart(chlorine, other)).not.toBeNull();
    }
  });
});
