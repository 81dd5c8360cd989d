import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { constantGroups } from '@/lib/client/worked-out/constants';
import { examples } from '@/lib/client/worked-out/examples/all-examples';
import type { HowPage } from '@/lib/client/worked-out/how-page';
import { textLink } from '@/components/ui/text-link';
import { CareNote } from './care-note';
import { ConstantGroups } from './constant-groups';
import { EquationTerms } from './equation-terms';
import { equations } from './equations';
import { HowFrame } from './how-frame';
import { LaterExample } from './later-example';

/** One quantity: its equation, what it is in plain words, an example that moves, how sure it is, its constants. */
export function HowPageBody({ page }: { page: HowPage }) {
  const t = useTranslations('how');
  const groups = constantGroups.filter(({ pages }) => pages.includes(page));
  const title = t(`page.${page}.title`);
  return (
    <HowFrame current={page} headline={title} lead={t(`page.${page}.lead`)}>
      <EquationTerms equation={equations[page]} name={title} />
      <div className="grid gap-x-9 md:grid-cols-3">
        <Passage title={t('what')} words={t(`page.${page}.what`)} />
        <Passage title={t('how')} words={t(`page.${page}.how`)} />
        <Passage title={t('sure')} words={t(`page.${page}.sure`)} />
      </div>
      {examples[page] === undefined ? null : <LaterExample key={page} page={page} />}
      {groups.length === 0 ? null : (
        <section aria-labelledby="constants" className="mt-6 border-t border-ink pt-3.5">
          <h2 id="constants" className="font-display text-section">
            {t('constants')}
          </h2>
          <p className="mb-2 text-small text-ink-2">{t('constantsLead')}</p>
          <ConstantGroups groups={groups} heading="h3" folded />
        </section>
      )}
      <CareNote />
      <p className="mt-2 flex flex-wrap gap-x-6 text-body">
        <PageLink href="/help/how/constants" className={`${textLink} inline-flex min-h-11 items-center`}>
          {t('allConstants')}
        </PageLink>
        <PageLink href="/help/how/unknown" className={`${textLink} inline-flex min-h-11 items-center`}>
          {t('unknown.title')}
        </PageLink>
      </p>
    </HowFrame>
  );
}

function Passage({ title, words }: { title: string; words: string }) {
  return (
    <section className="py-3.5">
      <h2 className="font-display text-section">{title}</h2>
      <p className="mt-1 text-body text-pretty">{words}</p>
    </section>
  );
}
