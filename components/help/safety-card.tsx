import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { emergencyCard } from '@/components/navigation/addresses';
import { buttonClass } from '@/components/ui/button-class';
import { Callout } from '@/components/ui/callout';
import { HelpHead } from './help-head';
import { PrintButton } from './print-button';
import { RuleList } from './rule-list';

/** What whoever handles chemicals reads each season; a minute long. The rules are those of care.md 2, 4, 5 and 6. */
export function SafetyCard() {
  const t = useTranslations('help.safety');
  const common = useTranslations('common');
  const navigation = useTranslations('navigation');
  return (
    <div className="mx-auto max-w-sheet px-margin pb-10 print:pb-0">
      <HelpHead headline={t('headline')} lead={t('lead')} aside={<PrintButton label={common('print')} />} />
      <Callout severity="stop" word={common('stop')} title={t('stopTitle')} className="mt-4 break-inside-avoid">
        <p>{t('stopWords')}</p>
      </Callout>
      <div className="mt-2 md:grid md:grid-cols-2 md:gap-x-9 print:grid print:grid-cols-2 print:gap-x-6">
        <div>
          <RuleList
            title={t('before.title')}
            rules={[t('before.one'), t('before.two'), t('before.three'), t('before.four')]}
          />
          <RuleList
            title={t('during.title')}
            rules={[t('during.one'), t('during.two'), t('during.three'), t('during.four'), t('during.five')]}
          />
          <RuleList
            title={t('after.title')}
            rules={[t('after.one'), t('after.two'), t('after.three'), t('after.four')]}
          />
        </div>
        <div>
          <RuleList
            title={t('store.title')}
            rules={[t('store.one'), t('store.two'), t('store.three'), t('store.four')]}
          />
          <RuleList
            title={t('swim.title')}
            rules={[t('swim.one'), t('swim.two'), t('swim.three'), t('swim.four'), t('swim.five')]}
          />
        </div>
      </div>
      <div className="mt-2 flex flex-wrap items-center gap-x-5 gap-y-2 border-t border-ink pt-3 print:hidden">
        <p className="font-display text-section">{t('wrong')}</p>
        <PageLink href={emergencyCard} className={buttonClass({ variant: 'terra' })}>
          {navigation('emergencyCard')}
        </PageLink>
      </div>
      <p className="mt-3 max-w-[60rem] text-small text-ink-2">{t('ground')}</p>
    </div>
  );
}
