import { useTranslations } from 'next-intl';
import { Callout } from '@/components/ui/callout';

/** Figures and sums on a page are no dose: it says so on every page that shows them. */
export function CareNote() {
  const t = useTranslations('how.care');
  const common = useTranslations('common');
  return (
    <Callout severity="note" word={common('note')} title={t('title')} className="mt-5">
      <p>{t('words')}</p>
    </Callout>
  );
}
