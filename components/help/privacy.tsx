import { useTranslations } from 'next-intl';
import { HelpHead } from './help-head';

/** What is kept about people, where, and how long. */
export function Privacy() {
  const t = useTranslations('privacy');
  const parts = [
    { title: t('account.title'), facts: [t('account.one'), t('account.two'), t('account.three'), t('account.four')] },
    {
      title: t('household.title'),
      facts: [t('household.one'), t('household.two'), t('household.three'), t('household.four')],
    },
    { title: t('where.title'), facts: [t('where.one'), t('where.two'), t('where.three'), t('where.four')] },
    { title: t('device.title'), facts: [t('device.one'), t('device.two'), t('device.three')] },
    { title: t('time.title'), facts: [t('time.one'), t('time.two'), t('time.three'), t('time.four')] },
  ];
  return (
    <div className="mx-auto max-w-sheet px-margin pb-10">
      <HelpHead headline={t('headline')} lead={t('lead')} />
      <div className="md:columns-2 md:gap-x-9 md:pt-2">
        {parts.map(({ title, facts }) => (
          <section key={title} className="break-inside-avoid border-t border-rule py-3.5">
            <h2 className="font-display text-section">{title}</h2>
            <ul className="mt-1.5 space-y-1.5 text-body">
              {facts.map((words) => (
                <li key={words}>{words}</li>
              ))}
            </ul>
          </section>
        ))}
      </div>
    </div>
  );
}
