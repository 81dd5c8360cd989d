'use client';

import { useTranslations } from 'next-intl';
import type { CautionCode, CompanionReason, LimitCode, ReasonCode } from '@/lib/planner/codes';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { limits } from '@/lib/standards/limits';
import type { Quantity } from '@/lib/units/quantity';
import { besideLimit } from './beside-limit';
import { capitalised } from './capitalised';
import { useSheet } from './sheet-context';
import { instantOf } from './sheet-times';
import { useTimes } from './use-times';
import { useUnits } from './use-units';

type Plan = NonNullable<WeekSheet['plan']>;
type Fact = Plan['reasons'][number];
export type Sentence = { code: string; words: string };

/** How the figures of a fact are written, by their names. */
const quantities: Record<string, Quantity> = {
  stabilizer: 'cyanuricAcid',
  upper: 'cyanuricAcid',
  target: 'cyanuricAcid',
  lowestLevel: 'freeChlorine',
  freeChlorine: 'freeChlorine',
  rise: 'freeChlorine',
  combinedChlorine: 'combinedChlorine',
  pH: 'pH',
  calciumHardness: 'calciumHardness',
  low: 'calciumHardness',
  high: 'calciumHardness',
};

/** Why the plan is as it is, what to mind, and what it does not keep, in sentences. A code without words is left out. */
export function usePlanWords(plan: Plan): { reasons: Sentence[]; cautions: Sentence[]; broken: Sentence[] } {
  const t = useTranslations('week.why');
  const { sheet } = useSheet();
  const times = useTimes();
  const units = useUnits();
  const isReason = (code: string): code is ReasonCode => t.has(`reason.${code as ReasonCode}`);
  const isCaution = (code: string): code is CautionCode => t.has(`caution.${code as CautionCode}`);
  const isLimit = (code: string): code is LimitCode => t.has(`limit.${code as LimitCode}`);

  const productName = (id: unknown) =>
    sheet.doses.find(({ product }) => product !== null && product === id)?.productName ?? t('someProduct');
  const count = (value: unknown) => (typeof value === 'number' ? value : 0);
  /** A figure that stands beside the limit it is over or under: rounded alike it would explain nothing. */
  const apartFromLimit = (fact: Fact): Record<string, string> => {
    const beside = (value: unknown, limit: number, fewest = 1) =>
      besideLimit(count(value), limit, sheet.household.locale, fewest).value;
    const nearest = (value: unknown, low: number, high: number) => (count(value) < low ? low : high);
    switch (fact.code) {
      case 'no-tablets-stabilizer-high':
        return { stabilizer: beside(fact.stabilizer, count(fact.upper), 0) };
      case 'pH-out-of-range':
        return { pH: beside(fact.pH, nearest(fact.pH, limits.pHRangeLow.value, limits.pHRangeHigh.value)) };
      case 'combined-chlorine-high':
        return { combinedChlorine: beside(fact.combinedChlorine, limits.combinedChlorineAct.value) };
      case 'free-chlorine-over-swim-limit':
        return { freeChlorine: beside(fact.freeChlorine, count(fact.swimLimit)) };
      case 'hardness-outside-surface-range': {
        const limit = nearest(fact.calciumHardness, count(fact.low), count(fact.high));
        return { calciumHardness: beside(fact.calciumHardness, limit, 0) };
      }
      default:
        return {};
    }
  };
  const figures = (fact: Fact) => {
    const written = Object.entries(quantities).map(([name, quantity]) => [
      name,
      units.figure(count(fact[name]), quantity),
    ]);
    const assumed = isAssumable(fact.quantity) ? fact.quantity : undefined;
    return {
      ...Object.fromEntries(written),
      stabilizerRise: units.number(count(fact.stabilizer), 1),
      swimLimit: units.number(count(fact.swimLimit)),
      closed: fact.closed === 'yes' ? 'yes' : 'no',
      sets: fact.sets === 'rules' ? 'rules' : 'stabilizer',
      most: fact.most === 'no' ? 'no' : 'yes',
      closes: fact.closes === 'no' ? 'no' : 'yes',
      lastLight: fact.lastLight === 'no' ? 'no' : 'yes',
      halved: fact.halved === 'no' ? 'no' : 'yes',
      doses: typeof fact.doses === 'number' ? fact.doses : 1,
      pHLow: units.figure(limits.pHRangeLow.value, 'pH'),
      pHHigh: units.figure(limits.pHRangeHigh.value, 'pH'),
      combinedAct: units.number(limits.combinedChlorineAct.value),
      index: units.signed(count(fact.index), 1),
      share: units.number(count(fact.share) * 100, 0),
      days: count(fact.days),
      change: isMoved(fact.quantity) ? units.number(count(fact.change), decimalsOf[fact.quantity]) : '',
      fall: units.number(-count(fact.change), decimalsOf.pH),
      reason: waiting[String(fact.reason)] ?? 'other',
      volume: units.quantity(count(fact.volume), 'volume'),
      tablets: count(fact.tablets),
      evenings: count(fact.evenings),
      visits: count(fact.visits),
      form: isForm(fact.form) ? t(`form.${fact.form}`) : '',
      product: productName(fact.product),
      quantity: assumed ? t(`quantity.${assumed}`) : '',
      value: assumed ? units.figure(count(fact.value), assumed) : '',
      ...apartFromLimit(fact),
    };
  };

  const broken = plan.broken.flatMap(({ limit, at, value, bound }): Sentence[] => {
    if (!isLimit(limit)) return [];
    const stabilizer = limit === 'stabilizer-too-high-for-swim-limit';
    const both = besideLimit(value, bound, sheet.household.locale, stabilizer ? 0 : 1);
    const when = capitalised(times.partAt(instantOf(at)));
    return [{ code: limit, words: t(`limit.${limit}`, { when, value: both.value, bound: both.limit }) }];
  });

  return {
    reasons: plan.reasons.flatMap((fact) =>
      isReason(fact.code) ? [{ code: fact.code, words: t(`reason.${fact.code}`, figures(fact)) }] : [],
    ),
    cautions: plan.cautions.flatMap((fact, index) =>
      isCaution(fact.code) ? [{ code: `${fact.code} ${index}`, words: t(`caution.${fact.code}`, figures(fact)) }] : [],
    ),
    broken,
  };
}

const assumable = ['totalAlkalinity', 'calciumHardness', 'cyanuricAcid'] as const;

function isAssumable(quantity: unknown): quantity is (typeof assumable)[number] {
  return assumable.some((known) => known === quantity);
}

/** What a dose beside chlorine moves, and to how many decimals it is told. */
const decimalsOf = { pH: 1, totalAlkalinity: 0, calciumHardness: 0, cyanuricAcid: 0 } as const;

function isMoved(quantity: unknown): quantity is keyof typeof decimalsOf {
  return typeof quantity === 'string' && quantity in decimalsOf;
}

/** Keys of a message cannot hold hyphens. */
const waiting: Record<string, string> = {
  'lowers-pH': 'lowers',
  'raises-pH': 'soda',
  'raises-alkalinity': 'alkalinity',
  'raises-hardness': 'hardness',
} satisfies Partial<Record<CompanionReason, string>>;

const forms = ['granular', 'liquid', 'tablet', 'other'] as const;

function isForm(form: unknown): form is (typeof forms)[number] {
  return forms.some((known) => known === form);
}
