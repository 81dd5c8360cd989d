'use client';

import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { Button } from '@/components/ui/button';
import { Callout } from '@/components/ui/callout';
import { buttonClass } from '@/components/ui/button-class';
import { useSheet } from './sheet-context';
import { useUnits } from './use-units';

/** What the newest test said that was not expected: asked about, never held against whoever tested. */
export function QuestionedTest({ onCorrect }: { onCorrect: (() => void) | undefined }) {
  const { questioned, unrecorded } = useSheet().sheet;
  return (
    <>
      {questioned.length > 0 && <Questioned onCorrect={onCorrect} />}
      {unrecorded && <Unrecorded />}
    </>
  );
}

function Questioned({ onCorrect }: { onCorrect: (() => void) | undefined }) {
  const t = useTranslations('week.state');
  const common = useTranslations('common');
  const { figure, unitOf } = useUnits();
  const { questioned, me } = useSheet().sheet;
  const quick = questioned.every(({ quantity }) => quantity === 'freeChlorine' || quantity === 'pH');
  const again = onCorrect ? (
    <Button variant="primary" onClick={onCorrect}>
      {t('correctIt')}
    </Button>
  ) : (
    <PageLink href={quick ? '/test?kind=quick' : '/test'} className={buttonClass({ variant: 'primary' })}>
      {t('checkAgain')}
    </PageLink>
  );
  return (
    <Callout
      severity="take-care"
      word={common('takeCare')}
      title={t(questioned.length === 1 ? 'questionedTitle' : 'questionedTitleMany')}
      actions={me.role === 'viewer' ? undefined : again}
    >
      <ul className="mt-1 grid gap-1">
        {questioned.map(({ quantity, measured, low, high }) => (
          <li key={quantity}>
            {t('questioned', {
              quantity: t(`quantity.${quantity}`),
              measured: figure(measured, quantity),
              low: figure(low, quantity),
              high: [figure(high, quantity), quantity === 'pH' ? '' : unitOf(quantity)].join(' ').trim(),
            })}
          </li>
        ))}
      </ul>
    </Callout>
  );
}

function Unrecorded() {
  const t = useTranslations('week.state');
  const common = useTranslations('common');
  return (
    <Callout severity="take-care" word={common('takeCare')} title={t('unrecordedTitle')}>
      <p>{t('unrecorded')}</p>
    </Callout>
  );
}
