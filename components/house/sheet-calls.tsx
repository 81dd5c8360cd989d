'use client';

import { useTranslations } from 'next-intl';
import { PhoneLink } from '@/components/ui/phone-link';
import type { HouseNotes } from '@/lib/schemas/house-note';
import { emergencyCountryOf, emergencyNumbers } from '@/lib/standards/emergency-numbers';
import { SheetRow } from './sheet-row';
import { SheetSection } from './sheet-section';

/** Whom to call: those who know this pool first, then those who come when somebody is hurt. */
export function SheetCalls({ notes, locale }: { notes: HouseNotes['notes']; locale: string }) {
  const t = useTranslations('house.sheet.call');
  const country = emergencyCountryOf(locale);
  const { emergency, poison } = emergencyNumbers(country);
  const call = (whom: string, number: string | undefined, name?: string) => (
    <SheetRow name={whom}>
      {number === undefined && name === undefined ? undefined : (
        <span className="flex flex-wrap items-baseline gap-x-3">
          {name === undefined ? null : <span>{name}</span>}
          {number === undefined ? null : <PhoneLink number={number} label={`${name ?? whom}, ${number}`} />}
        </span>
      )}
    </SheetRow>
  );
  return (
    <SheetSection id="sheet-calls" title={t('title')}>
      <dl className="mt-1">
        {call(t('us'), notes.ourPhone)}
        {call(t('neighbour'), notes.neighbourPhone, notes.neighbourName)}
        {call(t('professional'), notes.professionalPhone, notes.professionalName)}
        <SheetRow name={t('emergency')}>
          {emergency === null ? (
            t('localEmergency')
          ) : (
            <PhoneLink number={emergency} label={`${t('emergency')}, ${emergency}`} />
          )}
        </SheetRow>
        <SheetRow name={t('poison')}>
          {poison === null ? (
            <span className="font-text">{t('poisonOnLabel')}</span>
          ) : (
            <PhoneLink number={poison} label={`${t('poison')}, ${poison}`} />
          )}
        </SheetRow>
      </dl>
      {emergency === null ? null : <p className="text-small text-ink-2">{t('numbersFor', { country })}</p>}
    </SheetSection>
  );
}
