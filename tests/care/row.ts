import { it } from 'vitest';
import { type RuleId, rules } from './rules';

/**
 * One rule of the care paper as a test. `fallsShort` says where the product does not keep it yet: such a row is expected to
 * fail, and turns red as soon as the rule is kept, so that the mark goes.
 */
export type Row = readonly [of: RuleId, says: string, holds: () => unknown, fallsShort?: string];

/** A test for each row, named by its part of the paper. */
export function testRows(rows: readonly Row[]): void {
  for (const [of, says, holds, fallsShort] of rows) {
    const name = `part ${rules[of][0]}: ${says}`;
    const run = async () => {
      await holds();
    };
    if (fallsShort === undefined) it(name, run);
    else it.fails(`${name} (falls short: ${fallsShort})`, run);
  }
}
