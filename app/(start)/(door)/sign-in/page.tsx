import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { headers } from 'next/headers';
import { DeleteAccount } from '@/components/household/delete-account';
import { SignOutButton } from '@/components/navigation/sign-out-button';
import { EntryPage } from '@/components/start/entry-page';
import { likelyUnits } from '@/components/start/likely-units';
import { OwnHousehold } from '@/components/start/own-household';
import { PasskeySignIn } from '@/components/start/passkey-sign-in';
import { SignInForm } from '@/components/start/sign-in-form';
import { findHousehold, openPageVisit } from '@/lib/auth/page-gate';
import { passkeyPlace } from '@/lib/auth/passkey-place';
import { environment } from '@/lib/env';
import { ClientMessages } from '@/lib/messages/client-messages';

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
        <ClientMessages parts={{ household: ['deleting'], start: ['signIn', 'signUp', 'form'] }}>
          <OwnHousehold likelyUnits={likelyUnits((await headers()).get('accept-language'))} />
          <div className="mt-6 grid justify-items-start gap-1 border-t border-rule pt-4">
            <SignOutButton className="text-body" />
            <DeleteAccount />
          </div>
        </ClientMessages>
      </EntryPage>
    );
  return (
    <EntryPage title={t('title')} lead={'changed' in (await searchParams) ? t('changed') : t('lead')}>
      <SignInForm beside={'rpId' in passkeyPlace(environment().origin) ? <PasskeySignIn /> : null} />
    </EntryPage>
  );
}
