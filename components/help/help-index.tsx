import { ChevronRight } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { LanguageButton } from '@/components/navigation/language-button';
import { LanguageLinks } from '@/components/navigation/language-links';
import { PageLink } from '@/components/navigation/page-link';
import { emergencyCard } from '@/components/navigation/addresses';
import { scopeAnchor } from '@/components/start/scope-list';
import { textLink } from '@/components/ui/text-link';
import { HelpHead } from './help-head';

/**
 * The help that exists today, trouble first, and what no sheet can know.
 *
 * @param member   whether somebody looks who belongs to a household with a pool
 * @param signedIn whether somebody is signed in at all
 */
export function HelpIndex({ member, signedIn }: { member: boolean; signedIn: boolean }) {
  const t = useTranslations('help');
  const how = useTranslations('how');
  const navigation = useTranslations('navigation');
  const privacy = useTranslations('privacy');
  const pages = [
    { href: emergencyCard, name: t('emergency.title'), note: t('index.emergencyNote') },
    { href: '/help/safety', name: t('index.safety'), note: t('index.safetyNote') },
    ...(member ? [{ href: '/house', name: t('index.house'), note: t('index.houseNote') }] : []),
    { href: '/help/how', name: how('title'), note: t('index.howNote') },
    { href: `/#${scopeAnchor}`, name: t('index.scope'), note: t('index.scopeNote') },
    { href: '/help/privacy', name: privacy('title'), note: privacy('note') },
  ];
  const unknowns = [t('cannot.see'), t('cannot.label'), t('cannot.measure'), t('cannot.body')];
  return (
    <div className="mx-auto max-w-sheet px-margin pb-10">
      <HelpHead headline={t('title')} lead={t('lead')} />
      <div className="md:grid md:grid-cols-2 md:gap-x-9 md:pt-2">
        <ul>
          {pages.map(({ href, name, note }) => (
            <li key={href}>
              <PageLink href={href} className="flex min-h-17 items-center gap-3 border-t border-rule py-2">
                <span className="min-w-0 flex-1">
                  <b className="block font-display text-section">{name}</b>
                  <span className="block text-small text-ink-2">{note}</span>
                </span>
                <ChevronRight aria-hidden="true" className="size-5 shrink-0 text-ink-3" />
              </PageLink>
            </li>
          ))}
        </ul>
        <section aria-labelledby="cannot" className="border-t border-rule py-3.5">
          <h2 id="cannot" className="font-display text-section">
            {t('cannot.title')}
          </h2>
          <ul className="mt-1.5 space-y-2 text-body">
            {unknowns.map((words) => (
              <li key={words} className="border-l-stop border-ink pl-3">
                {words}
              </li>
            ))}
          </ul>
        </section>
      </div>
      <p className="flex items-center gap-2 border-t border-rule pt-1 text-body">
        {navigation('language.label')}
        {signedIn ? <LanguageButton /> : <LanguageLinks className={`inline-flex min-h-11 items-center ${textLink}`} />}
      </p>
    </div>
  );
}
