import { useTranslations } from 'next-intl';

/** What to do about a spill, by what was spilt. */
export function SpillList() {
  const t = useTranslations('help.emergency.spill');
  const spills = [
    { what: t('dry'), then: t('dryWords') },
    { what: t('dirty'), then: <b>{t('dirtyWords')}</b> },
    { what: t('liquid'), then: t('liquidWords') },
    { what: t('acid'), then: t('acidWords') },
  ];
  return (
    <section aria-labelledby="spill" className="break-inside-avoid border-t border-ink pt-3">
      <h2 id="spill" className="font-display text-section">
        {t('title')}
      </h2>
      <dl className="mt-1">
        {spills.map(({ what, then }) => (
          <div key={what} className="grid grid-cols-[96px_1fr] gap-x-2 border-t border-rule py-2 text-body">
            <dt className="font-strong">{what}</dt>
            <dd>{then}</dd>
          </div>
        ))}
      </dl>
    </section>
  );
}
