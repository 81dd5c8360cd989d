'use client';

import { useTranslations } from 'next-intl';
import { useSheet } from '@/components/week-sheet/sheet-context';
import { usePaper } from './paper-context';
import { useMoment } from './use-moment';

/** When the page was made, until when it is good and what ends it; or why nothing is added from it. */
export function PaperMade() {
  const t = useTranslations('week-print');
  const { picture } = useSheet();
  const { state, mayAdd } = usePaper();
  const moment = useMoment();
  const made = moment(picture.now);
  const end = mayAdd && 'end' in state ? state.end : undefined;
  return (
    <section className="border-l border-ink pl-3 text-small">
      <p className="font-display text-name">{end ? t('good', { made, until: moment(end.at) }) : t('made', { made })}</p>
      {end && <p>{t(`why.${end.why}`)}</p>}
      {end?.doseBefore !== undefined && <p>{t('doseBefore', { when: moment(end.doseBefore) })}</p>}
      {end && <p>{t('before')}</p>}
      {/* What happened and bars dosing stands beside it, under what the week asks. */}
      {'bar' in state && <p>{t(`bar.${state.bar}`)}</p>}
    </section>
  );
}
