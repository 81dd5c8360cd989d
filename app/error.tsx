'use client';

import { useTranslations } from 'next-intl';
import { emergencyCard } from '@/components/navigation/addresses';
import { buttonClass } from '@/components/ui/button-class';

/** A page that could not be made. The emergency card is a plain link, so that it loads anew and works without this page. */
export default function PageProblem({ reset }: { error: Error & { digest?: string }; reset: () => void }) {
  const t = useTranslations('problems');
  const common = useTranslations('common');
  return (
    <div role="alert" className="mx-auto max-w-sheet px-margin py-12">
      <h1 className="font-display text-headline">{t('pageTitle')}</h1>
      <p className="mt-2 mb-6 max-w-reading text-body">{t('pageWords')}</p>
      <div className="flex flex-wrap gap-2.5">
        {/* Every page carries this one: the plain element is all it needs. */}
        <button type="button" className={buttonClass({ variant: 'primary' })} onClick={reset}>
          {common('tryAgain')}
        </button>
        <a href={emergencyCard} className={buttonClass({})}>
          {t('emergencyCard')}
        </a>
      </div>
    </div>
  );
}
