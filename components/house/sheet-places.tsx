'use client';

import { useTranslations } from 'next-intl';
import type { HouseNotes } from '@/lib/schemas/house-note';
import { SheetRow } from './sheet-row';
import { SheetSection } from './sheet-section';

type Props = {
  notes: HouseNotes['notes'];
  /** Where the chemicals stand is told to whoever handles them, and to nobody else. */
  handlesChemicals: boolean;
};

/** Where gate, pump switch and breaker are. */
export function SheetPlaces({ notes, handlesChemicals }: Props) {
  const t = useTranslations('house.sheet.places');
  return (
    <SheetSection id="sheet-places" title={t('title')}>
      <dl className="mt-1">
        <SheetRow name={t('gate')}>{notes.gate}</SheetRow>
        <SheetRow name={t('pumpSwitch')}>{notes.pumpSwitch}</SheetRow>
        <SheetRow name={t('breaker')}>{notes.breaker}</SheetRow>
        <SheetRow name={t('chemicals')}>
          {handlesChemicals ? notes.chemicals : <span className="font-text">{t('chemicalsLocked')}</span>}
        </SheetRow>
      </dl>
    </SheetSection>
  );
}
