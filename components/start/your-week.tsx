import { useTranslations } from 'next-intl';

const parts = ['one', 'two', 'three', 'four'] as const;

/** What the household itself does in a week, in four lines. */
export function YourWeek() {
  const t = useTranslations('start.week');
  return (
    <section aria-labelledby="your-week" className="pt-4">
      <h2 id="your-week" className="font-display text-section">
        {t('title')}
      </h2>
      <ol className="mt-2.5 md:grid md:grid-cols-2 md:gap-x-7.5 lg:block">
        {parts.map((part, index) => (
          <li key={part} className="grid grid-cols-[26px_1fr] border-t border-rule py-3">
            <span aria-hidden="true" className="font-display text-name text-ink-2">
              {index + 1}
            </span>
            <span>
              <b className="block text-body font-strong">{t(part)}</b>
              <span className="block text-small text-ink-2">{t(`${part}Note`)}</span>
            </span>
          </li>
        ))}
      </ol>
    </section>
  );
}
