import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { SignOutButton } from '@/components/navigation/sign-out-button';
import { EntryPage } from '@/components/start/entry-page';
import { SignInForm } from '@/components/start/sign-in-form';
import { findHousehold, openPageVisit } from '@/lib/auth/page-gate';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('start.signIn');
  return { title: t('title') };
}

export default async function SignInPage({ searchParams }: { searchParams: Promise<Record<string, unknown>> }) {
  const t = await getTranslations('start.signIn');
  const visit = await openPageVisit();
  // Whoever is signed in and belongs nowhere is sent here from every page of a household.
  if (visit.signedIn && !(await findHousehold()))
    return (
      <EntryPage title={t('nowhere')} lead={t('nowhereWords')}>
        <SignOutButton className="text-body" />
      </EntryPage>
    );
  return (
    <EntryPage title={t('title')} lead={'changed' in (await searchParams) ? t('changed') : t('lead')}>
      <SignInForm />
    </EntryPage>
  );
}
