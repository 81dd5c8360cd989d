import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { PageLink } from '@/components/navigation/page-link';
import { EntryPage } from '@/components/start/entry-page';
import { ResetForm } from '@/components/start/reset-form';
import { textLink } from '@/components/ui/text-link';
import { openPageVisit } from '@/lib/auth/page-gate';
import { ClientMessages } from '@/lib/messages/client-messages';
import { shortestPassword } from '@/lib/schemas/account';
import { openReset } from '@/lib/services/reset-password';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('start.reset');
  // What stands in the address opens an account: nobody else is told it.
  return { title: t('title'), referrer: 'no-referrer', robots: { index: false } };
}

export default async function ChoosePasswordPage({ params }: { params: Promise<{ token: string }> }) {
  const { token } = await params;
  const t = await getTranslations('start.reset');
  const opened = await openReset(await openPageVisit(), token);
  if (opened.state !== 'open')
    return (
      <EntryPage title={t(`over.${opened.state}`)} lead={t('overWords')}>
        <PageLink href="/reset" className={`inline-flex min-h-11 items-center text-body ${textLink}`}>
          {t('again')}
        </PageLink>
      </EntryPage>
    );
  return (
    <ClientMessages parts={{ start: ['form', 'reset', 'signUp'] }}>
      <EntryPage title={t('chooseTitle')} lead={t('chooseLead', { email: opened.email })}>
        <ResetForm token={token} shortestPassword={shortestPassword} />
      </EntryPage>
    </ClientMessages>
  );
}
