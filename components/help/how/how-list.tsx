import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { howPages, type HowPage } from '@/lib/client/worked-out/how-page';

export type HowPlace = HowPage | 'constants' | 'unknown' | 'index';

const row = 'flex min-h-11 items-center gap-2 border-t border-rule py-1.5 text-body';

/** All pages of "how it is worked out", the current one marked. */
export function HowList({ current }: { current: HowPlace }) {
  const t = useTranslations('how');
  const pages = [
    ...howPages.map((page) => ({ page, name: t(`page.${page}.title`) })),
    { page: 'unknown', name: t('unknown.title') },
    { page: 'constants', name: t('sources.title') },
  ];
  return (
    <nav aria-labelledby="how-list">
      <h2 id="how-list" className="pb-1.5 font-display text-section">
        {current === 'index' ? (
          t('listTitle')
        ) : (
          <PageLink href="/help/how" className="inline-flex min-h-11 items-center hover:underline">
            {t('listTitle')}
          </PageLink>
        )}
      </h2>
      <ul>
        {pages.map(({ page, name }) => (
          <li key={page}>
            {page === current ? (
              <span aria-current="page" className={`${row} font-strong`}>
                <span aria-hidden="true" className="size-2 rotate-45 bg-ink" />
                {name}
              </span>
            ) : (
              <PageLink href={`/help/how/${page}`} className={`${row} hover:underline`}>
                {name}
              </PageLink>
            )}
          </li>
        ))}
      </ul>
    </nav>
  );
}
