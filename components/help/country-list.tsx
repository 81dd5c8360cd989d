import { useTranslations } from 'next-intl';
import { textLink } from '@/components/ui/text-link';
import { emergencyCountries, type EmergencyCountry } from '@/lib/standards/emergency-numbers';

/** Plain links, so that the numbers change without any script. */
export function CountryList({ id, current }: { id: string; current: EmergencyCountry }) {
  const t = useTranslations('help.emergency');
  return (
    <nav id={id} aria-label={t('chooseCountry')} className="mt-6 border-t border-ink pt-2.5 print:hidden">
      <h2 className="font-display text-section">{t('chooseCountry')}</h2>
      <ul className="flex flex-wrap gap-x-5">
        {emergencyCountries.map((country) => (
          <li key={country}>
            <a
              href={`?country=${country}`}
              aria-current={country === current ? 'true' : undefined}
              className={`inline-flex min-h-11 items-center text-body ${country === current ? 'font-strong' : textLink}`}
            >
              {t(`country.${country}`)}
            </a>
          </li>
        ))}
      </ul>
    </nav>
  );
}
