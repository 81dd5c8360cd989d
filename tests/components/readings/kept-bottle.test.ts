import { expect, it } from 'vitest';
import { firstBottle, keptBottle } from '@/components/readings/bottle';

it('takes a bottle as it was kept', () => {
  expect(keptBottle.safeParse(JSON.parse(JSON.stringify(firstBottle)))).toEqual({ success: true, data: firstBottle });
});

it.each([
  ['nothing', null],
  ['no pad', []],
  ['an unknown pad', [{ quantity: 'salt', steps: [0, 1] }]],
  ['a pad without steps', [{ quantity: 'pH' }]],
  ['one step', [{ quantity: 'pH', steps: [7] }]],
  ['steps that are no numbers', [{ quantity: 'pH', steps: ['6.8', '7.2'] }]],
  ['a good pad and a broken one', [{ quantity: 'pH', steps: [6.8, 7.2] }, 7]],
])('does not take %s', (_, kept) => {
  expect(keptBottle.safeParse(kept)).toEqual({ success: false });
});
