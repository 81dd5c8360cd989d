import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { headers } from 'next/headers';
import { EntryPage } from '@/components/start/entry-page';
import { likelyUnits } from '@/components/start/likely-units';
import { SignUpForm } from '@/components/start/sign-up-form';
import { shortestPassword } from '@/lib/schemas/account';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('start.signUp');
  return { title: t('title') };
}

export default async function SignUpPage() {
  const t = await getTranslations('start.signUp');
  const languages = (await headers()).get('accept-language');
  return (
    <EntryPage title={t('title')} lead={t('lead')}>
      <SignUpForm likelyUnits={likelyUnits(languages)} shortestPassword={shortestPassword} />
    </EntryPage>
  );
}
