import { useTranslations } from 'next-intl';
import { LanguageLinks } from '@/components/navigation/language-links';
import { PageLink } from '@/components/navigation/page-link';
import { InlineStop, StopWord } from '@/components/ui/callout';
import { emergencyCard } from '@/components/navigation/addresses';

const bold = (words: React.ReactNode) => <b className="font-emphasis text-ink">{words}</b>;

/** The Stop that stands on every page, what outranks the sheet, and where the figures come from. */
export function LandingFoot() {
  const t = useTranslations('start.foot');
  const navigation = useTranslations('navigation');
  const privacy = useTranslations('privacy');
  const link = 'inline-flex min-h-11 items-center underline decoration-1 underline-offset-[3px] whitespace-nowrap';
  return (
    <footer className="border-t border-ink pb-8">
      <InlineStop className="border-b border-rule py-3.5">
        {t.rich('stop', { stop: (words) => <StopWord>{words}</StopWord> })}
      </InlineStop>
      <div className="flex flex-col gap-x-10 pt-3 text-small text-ink-2 md:flex-row md:justify-between">
        <div className="max-w-[860px] space-y-1.5">
          <p>{t.rich('label', { b: bold })}</p>
          <p>{t.rich('source', { b: bold })}</p>
        </div>
        <nav aria-label={navigation('help')} className="flex flex-wrap gap-x-5.5 text-ink">
          <PageLink href={emergencyCard} className={link}>
            {navigation('emergencyCard')}
          </PageLink>
          <PageLink href="/help/safety" className={link}>
            {navigation('keepingSafe')}
          </PageLink>
          <PageLink href="/help/how" className={link}>
            {t('sources')}
          </PageLink>
          <PageLink href="/help" className={link}>
            {navigation('help')}
          </PageLink>
          <PageLink href="/help/privacy" className={link}>
            {privacy('title')}
          </PageLink>
          <LanguageLinks className={link} />
        </nav>
      </div>
    </footer>
  );
}
