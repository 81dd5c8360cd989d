import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { breakpointArithmetic } from '@/lib/chemistry/breakpoint';
import { WaterRangeError } from '@/lib/errors';

// The published ratios (BRK-* of tests/reference/published-values.csv) are checked in published-values.test.ts.

describe('breakpoint arithmetic', () => {
  it('gives half of combined chlorine and ten times it', () => {
    const { byStoichiometry, byFieldRule } = breakpointArithmetic(0.6);
    expect(byStoichiometry).toBeCloseTo(0.3, 12);
    expect(byFieldRule).toBeCloseTo(6, 12);
    expect(breakpointArithmetic(0)).toEqual({ byStoichiometry: 0, byFieldRule: 0 });
  });

  it.each([-0.1, 51, Number.NaN])('refuses %d mg/L', (combinedChlorine) => {
    expect(() => breakpointArithmetic(combinedChlorine)).toThrow(WaterRangeError);
  });

  it('is for the help page: nothing that plans or guides knows it', () => {
    const folders = ['planner', 'projection', 'learning', 'services', 'situations'];
    const root = join(import.meta.dirname, '../../lib');
    const existing = readdirSync(root).filter((folder) => folders.includes(folder));
    expect(existing).toContain('planner');
    const files = existing.flatMap((folder) =>
      readdirSync(join(root, folder), { recursive: true, encoding: 'utf8' })
        .filter((file) => file.endsWith('.ts'))
        .map((file) => join(root, folder, file)),
    );
    expect(files.filter((file) => readFileSync(file, 'utf8').includes('chemistry/breakpoint'))).toEqual([]);
  });
});
