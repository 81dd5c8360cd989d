'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { ProfessionalCall } from '@/components/house/professional-call';
import { Button } from '@/components/ui/button';
import { Callout } from '@/components/ui/callout';
import { useEndSituation } from '@/lib/client/situations';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import type { OpenSituation } from '@/lib/schemas/situation';
import { EmergencyLink } from './emergency-link';
import { EndDialog, type EarlyEnding } from './end-dialog';
import { useHousehold } from './situation-context';
import { useCodeWords } from './use-code-words';

/** How it ends: its rule, when to call somebody, and the buttons that end it. */
export function SituationEnd({ open: { id, procedure }, onEnded }: { open: OpenSituation; onEnded: () => void }) {
  const t = useTranslations('situations.ends');
  const common = useTranslations('common');
  const { mayOpen } = useHousehold();
  const words = useCodeWords();
  const problemWords = useProblemWords();
  const end = useEndSituation();
  const [asking, setAsking] = useState<EarlyEnding | null>(null);
  const calls = procedure.callWhen.map(words.call).filter((call) => call !== undefined);
  return (
    <section aria-label={t('label')} className="grid gap-4 border-t border-ink pt-3.5">
      {procedure.callNow && (
        <Callout severity="take-care" word={common('takeCare')} title={t('callNow')} actions={<EmergencyLink />}>
          <p>{t('callNowText')}</p>
        </Callout>
      )}
      <div className="grid gap-x-8 gap-y-4 md:grid-cols-[118px_minmax(0,1fr)_minmax(0,1fr)]">
        <h2 className="font-display text-name">{t('label')}</h2>
        <div>
          <h3 className="font-display text-section">{t('doneWhen')}</h3>
          <p className="mt-1 text-pretty">{words.done(procedure.doneWhen)}</p>
          <p className="mt-1.5 text-pretty text-ink-2">{t('after')}</p>
        </div>
        {calls.length > 0 && (
          <div className="md:border-l md:border-rule md:pl-6.5">
            <h3 className="font-display text-section">{t('callWhen')}</h3>
            <ul className="mt-1">
              {calls.map((call) => (
                <li
                  key={call}
                  className="grid grid-cols-[20px_minmax(0,1fr)] py-1 before:mt-2.5 before:w-2.25 before:border-t-todo before:border-ink"
                >
                  {call}
                </li>
              ))}
            </ul>
            <div className="mt-2">
              <ProfessionalCall />
            </div>
          </div>
        )}
      </div>
      {mayOpen && (
        <div className="flex flex-wrap gap-2.5">
          {procedure.done && (
            <Button
              variant="primary"
              size="large"
              busy={end.isPending ? t('ending') : undefined}
              onClick={() => end.mutate({ id, ending: 'done' }, { onSuccess: onEnded })}
            >
              {t('doneButton')}
            </Button>
          )}
          <Button variant="outline" onClick={() => setAsking('professional')}>
            {t('professionalButton')}
          </Button>
          <Button variant="quiet" onClick={() => setAsking('mistake')}>
            {t('mistakeButton')}
          </Button>
        </div>
      )}
      {end.error && (
        <p role="alert" className="text-small font-emphasis text-terra-ink">
          {problemWords(end.error)}
        </p>
      )}
      {asking && <EndDialog id={id} ending={asking} onClose={() => setAsking(null)} onEnded={onEnded} />}
    </section>
  );
}
