import { useTranslations } from 'next-intl';
import { constantGroups } from '@/lib/client/worked-out/constants';
import { CareNote } from './care-note';
import { ConstantGroups } from './constant-groups';
import { HowFrame } from './how-frame';

/** Every constant in use, with its source. */
export function HowConstants() {
  const t = useTranslations('how');
  return (
    <HowFrame current="constants" headline={t('sources.title')} lead={t('sources.lead')}>
      <CareNote />
      <p className="max-w-reading py-3.5 text-body">{t('sources.marks')}</p>
      <ConstantGroups groups={constantGroups} heading="h2" />
    </HowFrame>
  );
}
