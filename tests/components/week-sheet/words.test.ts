import { createTranslator } from 'next-intl';
import { describe, expect, it } from 'vitest';
import { catalogue } from '@/lib/messages/catalogue';
import { cautionCodes, checkReasons, doseReasons, limitCodes, reasonCodes } from '@/lib/planner/codes';
import { stepTexts } from '@/lib/schemas/plan-dose';
import { substances } from '@/lib/schemas/shelf-product';
import { unitCodes } from '@/lib/units/unit';
import { swimReasons } from '@/lib/verdict/codes';

/** A code that nobody worded would leave a person without the reason. */
describe('every code has its words', () => {
  it.each([
    ['swim reasons', Object.keys(swimReasons), catalogue.verdict.reason],
    ['reasons to stay out', stayOutCodes(), catalogue.verdict.short],
    ['reasons of a plan', reasonCodes, catalogue.week.why.reason],
    ['cautions of a plan', cautionCodes, catalogue.week.why.caution],
    ['limits a plan breaks', limitCodes, catalogue.week.why.limit],
    ['reasons of a dose', doseReasons, catalogue.doses.reason],
    ['reasons of a check', checkReasons, catalogue.week.check.reason],
    ['step texts', stepTexts, catalogue.doses.steps],
    ['products', substances, catalogue.doses.product],
    ['units', unitCodes, catalogue.units],
  ] as const)('%s', (_name, codes, words) => {
    expect(codes.filter((code) => !(code in words))).toEqual([]);
  });
});

function stayOutCodes(): string[] {
  return Object.entries(swimReasons).flatMap(([code, state]) => (state === 'stay-out' ? [code] : []));
}

it('gives each way of handling a product exactly six steps', () => {
  // That a label has to be read first is no way of handling.
  const { 'granules-label-first': _, ...ways } = catalogue.doses.steps;
  for (const steps of Object.values(ways)) expect(Object.keys(steps)).toEqual(['1', '2', '3', '4', '5', '6']);
});

it('never calls water safe, and puts no exclamation mark behind anything', () => {
  const { week, doses, verdict, units } = catalogue;
  const words = JSON.stringify({ week, doses, verdict, units });
  expect(words).not.toMatch(/\bsafe\b/i);
  expect(words).not.toContain('!');
});

it('writes hours as one or many', () => {
  const t = createTranslator({ locale: 'en', messages: catalogue, namespace: 'week.water.ago' });
  expect([t('hour', { count: 1 }), t('hour', { count: 15 }), t('minute', { count: 0 })]).toEqual([
    '1 hour ago',
    '15 hours ago',
    'just now',
  ]);
});
