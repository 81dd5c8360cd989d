import { ChevronRight } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { howPages } from '@/lib/client/worked-out/how-page';
import { HelpHead } from '../help-head';

/** The list of all pages, each with a line about it. */
export function HowIndex() {
  const t = useTranslations('how');
  return (
    <div className="mx-auto max-w-sheet px-margin pb-10">
      <HelpHead headline={t('title')} lead={t('lead')} />
      <ul className="md:columns-2 md:gap-x-9 md:pt-2 lg:columns-3">
        {howPages.map((page) => (
          <Row
            key={page}
            href={`/help/how/${page}`}
            name={t(`page.${page}.title`)}
            note={page === 'free-chlorine' ? t('startsHere') : t(`page.${page}.note`)}
          />
        ))}
        <Row href="/help/how/unknown" name={t('unknown.title')} note={t('unknown.note')} />
        <Row href="/help/how/constants" name={t('sources.title')} note={t('sources.note')} />
      </ul>
    </div>
  );
}

function Row({ href, name, note }: { href: string; name: string; note: string }) {
  return (
    <li className="break-inside-avoid">
      <PageLink href={href} className="flex min-h-17 items-center gap-3 border-t border-rule py-2">
        <span className="min-w-0 flex-1">
          <b className="block font-display text-section">{name}</b>
          <span className="block text-small text-ink-2">{note}</span>
        </span>
        <ChevronRight aria-hidden="true" className="size-5 shrink-0 text-ink-3" />
      </PageLink>
    </li>
  );
}
