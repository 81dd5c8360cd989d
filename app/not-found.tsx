import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { connection } from 'next/server';
import { PageLink } from '@/components/navigation/page-link';
import { SignedOutBar } from '@/components/navigation/signed-out-bar';
import { contentId, SkipLink } from '@/components/navigation/skip-link';
import { buttonClass } from '@/components/ui/button-class';
import { findHousehold } from '@/lib/auth/page-gate';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('problems');
  return { title: t('notFoundTitle') };
}

export default async function NotFound() {
  // Made per request like every page, so that it carries the nonce.
  await connection();
  const [t, visit] = await Promise.all([getTranslations('problems'), findHousehold()]);
  return (
    <>
      <SkipLink />
      <SignedOutBar signedIn={visit !== null} />
      <main id={contentId} tabIndex={-1} className="mx-auto max-w-sheet px-margin py-12 outline-none">
        <h1 className="font-display text-headline">{t('notFoundTitle')}</h1>
        <p className="mt-2 mb-6 max-w-reading text-body">{t('notFoundWords')}</p>
        <PageLink href="/" className={buttonClass({ variant: 'primary' })}>
          {t('backToStart')}
        </PageLink>
      </main>
    </>
  );
}
