'use client';

import { useTranslations } from 'next-intl';
import type { HouseNotes } from '@/lib/schemas/house-note';

/** How to read the page, and whom to ring in doubt, as far as somebody wrote it down. */
export function PaperFoot({ notes }: { notes: HouseNotes['notes'] }) {
  const t = useTranslations('week-print.foot');
  const week = useTranslations('week');
  const { ourPhone, neighbourName, neighbourPhone, professionalName, professionalPhone } = notes;
  const people = [
    { name: t('us'), number: ourPhone },
    { name: neighbourName ?? t('neighbour'), number: neighbourPhone },
    { name: professionalName ?? t('professional'), number: professionalPhone },
  ].flatMap(({ name, number }) => (number === undefined ? [] : [t('person', { name, number })]));
  return (
    <footer className="mt-2 flex flex-wrap justify-between gap-x-6 border-t border-ink pt-1">
      <p>{t('nights')}</p>
      {people.length > 0 && <p className="font-strong">{t('doubt', { list: people.join(week('listJoiner')) })}</p>}
    </footer>
  );
}
