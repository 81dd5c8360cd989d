import { useTranslations } from 'next-intl';

export const contentId = 'content';

/** The first stop of the Tab key: past the bars to what the page is for. */
export function SkipLink() {
  const t = useTranslations('common');
  return (
    <a
      href={`#${contentId}`}
      className="absolute top-0 left-4 z-30 -translate-y-full bg-ink px-4 py-3 text-control text-on-ink focus-visible:translate-y-2"
    >
      {t('skipToContent')}
    </a>
  );
}
