import { createTranslator } from 'next-intl';
import { describe, expect, it } from 'vitest';
import { english } from '@/lib/messages/english';
import { cautionCodes, checkReasons, doseReasons, limitCodes, reasonCodes } from '@/lib/planner/codes';
import { stepTexts } from '@/lib/schemas/plan-dose';
import { substances } from '@/lib/schemas/shelf-product';
import { unitCodes } from '@/lib/units/unit';
import { swimReasons } from '@/lib/verdict/codes';

/** A code that nobody worded would leave a person without the reason. */
describe('every code has its words', () => {
  it.each([
    ['swim reasons', Object.keys(swimReasons), english.verdict.reason],
    ['reasons to stay out', stayOutCodes(), english.verdict.short],
    ['reasons of a plan', reasonCodes, english.week.why.reason],
    ['cautions of a plan', cautionCodes, english.week.why.caution],
    ['limits a plan breaks', limitCodes, english.week.why.limit],
    ['reasons of a dose', doseReasons, english.doses.reason],
    ['reasons of a check', checkReasons, english.week.check.reason],
    ['step texts', stepTexts, english.doses.steps],
    ['products', substances, english.doses.product],
    ['units', unitCodes, english.units],
  ] as const)('%s', (_name, codes, words) => {
    expect(codes.filter((code) => !(code in words))).toEqual([]);
  });
});

function stayOutCodes(): string[] {
  return Object.entries(swimReasons).flatMap(([code, state]) => (state === 'stay-out' ? [code] : []));
}

it('gives each way of handling a product exactly six steps', () => {
  // That a label has to be read first is no way of handling.
  const { 'granules-label-first': _, ...ways } = english.doses.steps;
  for (const steps of Object.values(ways)) expect(Object.keys(steps)).toEqual(['1', '2', '3', '4', '5', '6']);
});

it('never calls water safe, and puts no exclamation mark behind anything', () => {
  const { week, doses, verdict, units } = english;
  const words = JSON.stringify({ week, doses, verdict, units });
  expect(words).not.toMatch(/\bsafe\b/i);
  expect(words).not.toContain('!');
});

it('writes hours as one or many', () => {
  const t = createTranslator({ locale: 'en', messages: english, namespace: 'week.water.ago' });
  expect([t('hour', { count: 1 }), t('hour', { count: 15 }), t('minute', { count: 0 })]).toEqual([
    '1 hour ago',
    '15 hours ago',
    'just now',
  ]);
});
