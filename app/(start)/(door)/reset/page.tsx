import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { PageLink } from '@/components/navigation/page-link';
import { EntryPage } from '@/components/start/entry-page';
import { ResetRequestForm } from '@/components/start/reset-request-form';
import { textLink } from '@/components/ui/text-link';
import { sendsMail } from '@/lib/services/queue-mail';
import { ClientMessages } from '@/lib/messages/client-messages';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('start.reset');
  return { title: t('title') };
}

export default async function ResetPage({ searchParams }: { searchParams: Promise<Record<string, unknown>> }) {
  const t = await getTranslations('start.reset');
  if (!sendsMail())
    return (
      <EntryPage title={t('noMail')} lead={t('noMailWords')}>
        {null}
      </EntryPage>
    );
  if ('sent' in (await searchParams))
    return (
      <EntryPage title={t('sent')} lead={t('sentWords')}>
        <PageLink href="/reset" className={`inline-flex min-h-11 items-center text-body ${textLink}`}>
          {t('again')}
        </PageLink>
      </EntryPage>
    );
  return (
    <ClientMessages parts={{ start: ['form', 'reset', 'signIn'] }}>
      <EntryPage title={t('title')} lead={t('lead')}>
        <ResetRequestForm />
      </EntryPage>
    </ClientMessages>
  );
}
