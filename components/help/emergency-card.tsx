import { useTranslations } from 'next-intl';
import type { EmergencyCountry } from '@/lib/standards/emergency-numbers';
import { CountryList } from './country-list';
import { EmergencyCalls } from './emergency-calls';
import { FirstAid } from './first-aid';
import { HelpHead } from './help-head';
import { LeaveFrame } from './leave-frame';
import { PrintButton } from './print-button';
import { SpillList } from './spill-list';

const countriesId = 'countries';

/** People first, then call: everything on one page, one tap from everywhere, also without an account. */
export function EmergencyCard({ country }: { country: EmergencyCountry }) {
  const t = useTranslations('help.emergency');
  const common = useTranslations('common');
  return (
    <div className="mx-auto max-w-sheet px-margin pb-10 print:pb-0">
      <HelpHead headline={t('headline')} lead={t('lead')} aside={<PrintButton label={common('print')} />} />
      <div className="md:grid md:grid-cols-2 md:grid-rows-[auto_1fr] md:gap-x-9 md:gap-y-6 md:pt-4 print:grid print:grid-cols-2 print:grid-rows-[auto_1fr] print:gap-x-6 print:gap-y-4 print:pt-3">
        <div className="space-y-4">
          <EmergencyCalls country={country} chooseHref={`#${countriesId}`} />
          <LeaveFrame />
        </div>
        <div className="mt-3 md:row-span-2 md:mt-0 print:row-span-2 print:mt-0">
          <FirstAid />
        </div>
        <SpillList />
      </div>
      <p className="mt-2 border-t border-ink pt-2.5 text-body font-strong">{t('after')}</p>
      <p className="mt-1 text-small text-ink-2">{t('ground')}</p>
      <CountryList id={countriesId} current={country} />
    </div>
  );
}
