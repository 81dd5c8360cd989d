import { useTranslations } from 'next-intl';

type Props = { controls: React.ReactNode; answer: React.ReactNode; sheet: React.ReactNode };

/** Sheet at the left and what moves it at the right; on a phone the sliders come first, and what follows from them below. */
export function SampleLayout({ controls, answer, sheet }: Props) {
  const t = useTranslations('start.sample');
  return (
    <section
      aria-labelledby="try-it"
      className="grid gap-x-7.5 border-t-todo border-ink md:border-t-0 lg:grid-cols-[1fr_326px]"
    >
      <div className="pt-4 lg:order-last">
        <h2 id="try-it" className="font-display text-section">
          {t('title')}
        </h2>
        <p className="mt-0.5 mb-3 text-small text-ink-2">{t('lead')}</p>
        <div className="grid gap-x-7.5 md:grid-cols-2 lg:grid-cols-1">
          {controls}
          <div className="mt-2 border-t border-ink pt-3 pb-4 md:mt-0 md:border-t-0 md:pt-0 lg:mt-2 lg:border-t lg:pt-3">
            {answer}
          </div>
        </div>
      </div>
      <div className="min-w-0 md:pt-2">{sheet}</div>
    </section>
  );
}
