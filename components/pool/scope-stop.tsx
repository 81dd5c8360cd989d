'use client';

import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { Button } from '@/components/ui/button';
import { buttonClass } from '@/components/ui/button-class';
import { Callout } from '@/components/ui/callout';
import { contentId } from '@/components/navigation/skip-link';
import { emergencyCard } from '@/components/navigation/addresses';
import type { Scope } from '@/lib/schemas/pool-profile';
import type { PoolPlace } from './setting';

/** The pool is out of scope: says why in words, and what to do instead. Answers can be changed. */
export function ScopeStop({ decision, place, onChange }: { decision: Scope; place: PoolPlace; onChange: () => void }) {
  const t = useTranslations('first-run');
  const common = useTranslations('common');
  // What only narrows the service is no reason to stop.
  const reasons = decision.reasons.filter(
    (reason) => reason !== 'salt-generator' && reason !== 'under-10-cubic-metres',
  );
  const Content = place === 'first-run' ? 'main' : 'div';
  return (
    <Content
      id={place === 'first-run' ? contentId : undefined}
      className="mx-auto grid max-w-reading gap-5 px-margin py-8"
    >
      <h1 className="font-display text-board text-balance md:text-headline">{t('stopTitle')}</h1>
      <ul className="grid gap-3.5">
        {reasons.map((reason) => (
          <li key={reason}>
            <Callout severity="stop" word={common('stop')} title={t(`stop.${reason}.title`)}>
              <p>{t(`stop.${reason}.words`)}</p>
            </Callout>
          </li>
        ))}
      </ul>
      <p className="text-body text-pretty text-ink-2">{t('stopNote')}</p>
      <div className="flex flex-wrap gap-2.5">
        <Button variant="primary" size="large" onClick={onChange}>
          {t('changeAnswer')}
        </Button>
        <PageLink href={emergencyCard} className={buttonClass({ size: 'large' })}>
          {t('emergencyCard')}
        </PageLink>
      </div>
    </Content>
  );
}
