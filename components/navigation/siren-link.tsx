import { Siren } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { PageLink } from './page-link';
import { emergencyCard } from './addresses';

/** One tap to the emergency card from every page of a phone. */
export function SirenLink() {
  const t = useTranslations('navigation');
  return (
    <PageLink
      href={emergencyCard}
      aria-label={t('emergencyCard')}
      className="flex size-11 items-center justify-center rounded text-ink"
    >
      <Siren aria-hidden="true" className="size-5.75" />
    </PageLink>
  );
}
