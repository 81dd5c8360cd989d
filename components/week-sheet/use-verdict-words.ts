'use client';

import { useTranslations } from 'next-intl';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import type { SwimReasonCode } from '@/lib/verdict/codes';
import { besideLimit } from './beside-limit';
import { useSheet } from './sheet-context';
import { instantOf } from './sheet-times';
import { useTimes } from './use-times';
import { useUnits } from './use-units';

type Reason = WeekSheet['verdict']['reasons'][number];

/** The reasons that ask everyone to stay out; the headline says the first of them. */
type ShortCode = Extract<
  SwimReasonCode,
  | 'chlorine-under-code-minimum'
  | 'chlorine-over-maximum'
  | 'ph-too-low'
  | 'ph-too-high'
  | 'water-cloudy'
  | 'water-green'
  | 'accident-open'
  | 'drain-cover-broken'
  | 'electricity-suspected'
  | 'situation-open'
  | 'suspected-double-dose'
>;

/** The swim verdict in words: its headline and one sentence for each reason. */
export function useVerdictWords() {
  const t = useTranslations('verdict');
  const { sheet } = useSheet();
  const { verdict, household } = sheet;
  const { locale } = household;
  const times = useTimes();
  const units = useUnits();

  const hasShort = (code: string): code is ShortCode => t.has(`short.${code as ShortCode}`);
  const hasReason = (code: string): code is SwimReasonCode => t.has(`reason.${code as SwimReasonCode}`);

  const figuresOf = ({ value, limit, until, measured }: Reason) => {
    const number = typeof value === 'number' ? value : 0;
    const both = besideLimit(number, typeof limit === 'number' ? limit : 0, locale);
    const end = typeof until === 'string' ? instantOf(until) : until;
    return {
      ...both,
      measured: measured === true ? 'true' : 'other',
      part: typeof end === 'number' ? times.partAfter(end) : '',
      hours: Math.floor(number),
      limitHours: units.number(typeof limit === 'number' ? limit : 0, 0),
      rain: units.rain(number),
    };
  };

  const headline = (): string => {
    const until = verdict.until === null ? undefined : instantOf(verdict.until);
    switch (verdict.state) {
      case 'stay-out': {
        const code = verdict.reasons[0]?.code ?? '';
        return t('headline.stay-out', { reason: t(hasShort(code) ? `short.${code}` : 'short.other') });
      }
      case 'wait':
        return until === undefined ? t('headline.waitForTest') : t('headline.wait', { part: times.partAfter(until) });
      case 'test-first':
        return t('headline.test-first');
      case 'fine':
        return until === undefined ? t('headline.fineForNow') : t('headline.fine', { part: times.partAt(until) });
    }
  };

  return {
    state: t(`state.${verdict.state}`),
    headline: headline(),
    reasons: verdict.reasons.flatMap((fact) =>
      hasReason(fact.code) ? [{ code: fact.code, words: t(`reason.${fact.code}`, figuresOf(fact)) }] : [],
    ),
  };
}
