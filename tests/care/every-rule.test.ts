import { expect, it } from 'vitest';
import { capRows } from './rows/caps';
import { sentenceRows } from './rows/sentences';
import { swimVerdictRows } from './rows/swim-verdict';
import { tickingRows } from './rows/ticking';
import { weekPlanRows } from './rows/week-plan';
import { type RuleId, rules, rulesOnScreen } from './rules';

const rows = [...swimVerdictRows, ...weekPlanRows, ...capRows, ...tickingRows, ...sentenceRows];

it('has a row for every rule of parts 2 and 4 that is not about a drawn page', () => {
  const held = new Set<RuleId>([...rows.map(([of]) => of), ...rulesOnScreen]);
  const ids = Object.keys(rules) as RuleId[];
  expect(ids.filter((id) => !held.has(id))).toEqual([]);
});

it('has no two rows of the same words', () => {
  const names = rows.map(([of, says]) => `${of} ${says}`);
  expect(names.filter((name, index) => names.indexOf(name) !== index)).toEqual([]);
});
