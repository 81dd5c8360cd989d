import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { EntryPage } from '@/components/start/entry-page';
import { SignInForm } from '@/components/start/sign-in-form';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('start.signIn');
  return { title: t('title') };
}

export default async function SignInPage() {
  const t = await getTranslations('start.signIn');
  return (
    <EntryPage title={t('title')} lead={t('lead')}>
      <SignInForm />
    </EntryPage>
  );
}
