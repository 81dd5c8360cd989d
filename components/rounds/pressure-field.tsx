'use client';

import { useTranslations } from 'next-intl';
import { NumberTextField } from '@/components/ui/number-text-field';
import { GAUGE } from '@/lib/schemas/round-items';
import { type PressureText, pressureUnit, readPressures, writePressure } from './pressures';
import type { RoundHousehold } from './round-household';

type Props = {
  part: keyof PressureText;
  pressure: PressureText;
  onChange: (pressure: PressureText) => void;
  /** Whether what was typed has been found wanting. */
  problem: boolean;
  household: RoundHousehold;
};

/** What the gauge of the filter shows, now or with a clean filter. It can stay empty. */
export function PressureField({ part, pressure, onChange, problem, household: { unitSystem, locale } }: Props) {
  const t = useTranslations('rounds');
  const unit = pressureUnit[unitSystem];
  const said = (bar: number) => writePressure(bar, unitSystem, locale);
  const wrong = problem && readPressures({ now: '', clean: '', [part]: pressure[part] }, unitSystem) === null;
  return (
    <NumberTextField
      label={`${t(part === 'now' ? 'pressureNow' : 'pressureClean')} [${unit}]`}
      hint={t('pressureHint')}
      problem={wrong ? t('pressureProblem', { low: said(GAUGE[0]), high: said(GAUGE[1]) }) : undefined}
      value={pressure[part]}
      onChange={(event) => onChange({ ...pressure, [part]: event.target.value })}
    />
  );
}
