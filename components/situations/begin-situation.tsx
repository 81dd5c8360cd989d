'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { PageLink } from '@/components/navigation/page-link';
import { Button } from '@/components/ui/button';
import { textLink } from '@/components/ui/text-link';
import { useOpenSituation } from '@/lib/client/situations';
import type { OpenSituation, SituationKind } from '@/lib/schemas/situation';
import { QuestionForm } from './question-form';
import { useHousehold } from './situation-context';

/** The questions of a kind and the button that begins it; where it cannot begin, why not. */
export function BeginSituation({ kind, open }: { kind: SituationKind; open: OpenSituation | null }) {
  const t = useTranslations('situations');
  const { mayOpen } = useHousehold();
  const begin = useOpenSituation();
  // One id for as long as the page is open: sent twice, it is begun once.
  const [id] = useState(() => crypto.randomUUID());
  const [setsAside, setSetsAside] = useState(false);
  if (open && !setsAside) {
    const other = open.situation.kind;
    return (
      <section className="border-t border-ink py-3.5">
        <p className="max-w-reading font-emphasis">{t('begin.otherOpen', { name: t(`kind.${other}.name`) })}</p>
        <p className="max-w-reading text-ink-2">{t('begin.meanwhile')}</p>
        <div className="flex flex-wrap items-center gap-x-5">
          <PageLink href={`/situations/${other}`} className={`inline-flex min-h-11 items-center ${textLink}`}>
            {t('begin.toOpen')}
          </PageLink>
          {mayOpen && (
            <Button variant="outline" onClick={() => setSetsAside(true)}>
              {t('begin.setAside')}
            </Button>
          )}
        </div>
      </section>
    );
  }
  if (!mayOpen)
    return (
      <section className="border-t border-ink py-3.5">
        <p className="max-w-reading font-emphasis">{t('begin.viewer')}</p>
      </section>
    );
  return (
    <QuestionForm
      kind={kind}
      error={begin.error}
      onSend={(situation) => begin.mutate({ id, situation, ...(open ? { setAside: open.id } : {}) })}
    >
      <div className="flex flex-wrap items-center gap-x-4 gap-y-2 border-t border-ink pt-3.5">
        <Button
          type="submit"
          variant="primary"
          size="large"
          className="min-w-40"
          busy={begin.isPending ? t('begin.busy') : undefined}
        >
          {t('begin.button')}
        </Button>
        <p className="max-w-reading text-ink-2">
          {open ? t('begin.leadsInstead', { name: t(`kind.${open.situation.kind}.name`) }) : t('begin.leads')}
        </p>
      </div>
    </QuestionForm>
  );
}
