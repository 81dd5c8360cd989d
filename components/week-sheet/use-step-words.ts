'use client';

import { useTranslations } from 'next-intl';
import type { SituationStep } from '@/lib/schemas/situation';
import type { StepCode } from '@/lib/situations/codes';
import { useSheet } from './sheet-context';
import { useUnits } from './use-units';

/** What a step of an open situation is called; undefined for a code without words. */
export function useStepWords() {
  const t = useTranslations('situations.step');
  const { sheet } = useSheet();
  const units = useUnits();
  const known = (code: string): code is Exclude<StepCode, 'dose'> => t.has(`${code as Exclude<StepCode, 'dose'>}.name`);
  return ({ code, figures }: SituationStep): string | undefined => {
    if (code === 'dose' || !known(code)) return undefined;
    const figure = (name: string) => (typeof figures[name] === 'number' ? figures[name] : 0);
    const situation = sheet.situation?.situation;
    return t(`${code}.name`, {
      minutes: figure('minutes'),
      drop: units.quantity(figure('drop'), 'level'),
      volume: units.quantity(figure('volume'), 'volume'),
      name: situation?.kind === 'away' ? (situation.answers.name ?? 'none') : 'none',
    });
  };
}
