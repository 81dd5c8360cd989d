'use client';

import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { buttonClass } from '@/components/ui/button-class';
import { StandingLine, VerdictFrame } from '@/components/ui/verdict-frame';
import { bold } from './bold';
import { OpenSituation } from './open-situation';
import { PoolEvents } from './pool-events';
import { useSheet } from './sheet-context';
import { useVerdictWords } from './use-verdict-words';
import { WaterNow } from './water-now';

/** The swim verdict, the first line of the page, and below it what happened since the test. */
export function Verdict() {
  return (
    <div>
      <VerdictItself />
      <OpenSituation />
      <PoolEvents />
    </div>
  );
}

/** A Fine needs no frame and always has its standing line. */
function VerdictItself() {
  const t = useTranslations('verdict');
  const { sheet } = useSheet();
  const { state, headline, reasons } = useVerdictWords();
  if (sheet.verdict.state === 'fine')
    return (
      <section data-verdict="fine">
        <h1 className="font-display text-verdict text-balance md:text-wrap">{headline}</h1>
        <WaterNow>
          <Standing />
        </WaterNow>
      </section>
    );
  const [first, ...others] = reasons;
  return (
    <VerdictFrame state={sheet.verdict.state} word={state} headline={headline}>
      {first && <p className="text-pretty">{first.words}</p>}
      {others.length > 0 && (
        <ul className="mt-1 grid list-disc gap-0.5 pl-4.5 text-small text-ink-2">
          {others.map(({ code, words }) => (
            <li key={code}>{words}</li>
          ))}
        </ul>
      )}
      <WaterNow framed />
      {sheet.verdict.state !== 'stay-out' && (
        <PageLink
          href="/test"
          className={buttonClass({
            variant: sheet.verdict.state === 'test-first' ? 'primary' : 'outline',
            className: 'mt-3 mb-1',
          })}
        >
          {t(sheet.lastReading === null ? 'enterTest' : 'quickCheck')}
        </PageLink>
      )}
    </VerdictFrame>
  );
}

function Standing() {
  const t = useTranslations('verdict');
  const { sheet } = useSheet();
  return (
    <div className="mt-2.5 grid gap-1.5 md:mt-2">
      <StandingLine className="md:text-small">{t.rich('standing', { b: bold })}</StandingLine>
      {sheet.verdict.adviseDailyCheck && <p className="text-small text-ink-2">{t('dailyCheck')}</p>}
    </div>
  );
}
