'use client';

import { ChevronLeft, TestTubeDiagonal } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { buttonClass } from '@/components/ui/button-class';
import { DoubleRule } from '@/components/ui/double-rule';
import { textLink } from '@/components/ui/text-link';

type Props = {
  /** The page of one kind has a way back; the index is headed by the place's own name. */
  page: 'index' | 'kind';
  headline: string;
  lead?: string | undefined;
  /** Nothing is open: the head says no more than the name, so that what protects stands right under it. */
  short?: boolean;
  /** When the next test is asked for, in words. */
  nextTest?: string | undefined;
};

/** What this place is, what is to be done, and what is to be measured next; closed by the double rule. */
export function SituationHead({ page, headline, lead, short = false, nextTest }: Props) {
  const t = useTranslations('situations');
  const ofIndex = page === 'index';
  const Headline = ofIndex ? 'h2' : 'h1';
  const Place = ofIndex ? 'h1' : 'p';
  return (
    <header className="px-margin">
      <div className="md:grid md:grid-cols-[230px_minmax(0,1fr)] lg:grid-cols-[341px_minmax(0,1fr)_260px]">
        <div className={`pt-3 pb-3 md:border-r md:border-rule md:pr-6 ${ofIndex ? '' : 'hidden md:block'}`}>
          <Place className="mt-1 font-display text-board">{t('title')}</Place>
          <p className="mt-1 text-small text-ink-2">{t('lead')}</p>
          {!ofIndex && <Back />}
        </div>
        <div className={`pt-2.5 pb-3.5 md:px-7 ${ofIndex ? 'hidden md:block' : ''}`}>
          {!ofIndex && (
            <div className="md:hidden">
              <Back />
            </div>
          )}
          <Headline className="font-display text-headline text-balance">{headline}</Headline>
          {lead !== undefined && <p className="mt-1 font-display text-lead text-pretty">{lead}</p>}
        </div>
        {!short && (
          <div
            className={`pb-4 md:col-start-2 md:px-7 lg:col-start-3 lg:border-l lg:border-rule lg:pt-4.25 lg:pr-0 ${ofIndex ? 'hidden md:block' : ''}`}
          >
            {nextTest !== undefined && (
              <>
                <p className="text-small text-ink-2">{t('head.nextReading')}</p>
                <p className="mb-2 font-display text-section">{nextTest}</p>
              </>
            )}
            <PageLink href="/test" className={buttonClass({ size: 'small' })}>
              <TestTubeDiagonal aria-hidden="true" className="size-4.5" />
              {t('head.enterTest')}
            </PageLink>
          </div>
        )}
      </div>
      <DoubleRule />
    </header>
  );
}

function Back() {
  const t = useTranslations('situations');
  return (
    <PageLink href="/situations" className={`-ml-1 inline-flex min-h-11 items-center gap-1 text-label ${textLink}`}>
      <ChevronLeft aria-hidden="true" className="size-4.5" />
      {t('all')}
    </PageLink>
  );
}
