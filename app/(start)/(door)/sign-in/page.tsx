import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { SignOutButton } from '@/components/navigation/sign-out-button';
import { EntryPage } from '@/components/start/entry-page';
import { PasskeySignIn } from '@/components/start/passkey-sign-in';
import { SignInForm } from '@/components/start/sign-in-form';
import { findHousehold, openPageVisit } from '@/lib/auth/page-gate';
import { passkeyPlace } from '@/lib/auth/passkey-place';
import { environment } from '@/lib/env';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('start.signIn');
  return { title: t('title') };
}

export default async function SignInPage() {
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
    <EntryPage title={t('title')} lead={t('lead')}>
      <SignInForm beside={'rpId' in passkeyPlace(environment().origin) ? <PasskeySignIn /> : null} />
    </EntryPage>
  );
}
