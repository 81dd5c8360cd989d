import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { ConfirmButton } from '@/components/start/confirm-button';
import { EntryPage } from '@/components/start/entry-page';
import { openPageVisit } from '@/lib/auth/page-gate';
import { ClientMessages } from '@/lib/messages/client-messages';
import { openConfirmation } from '@/lib/services/confirm-email';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('start.confirm');
  return { title: t('title'), referrer: 'no-referrer', robots: { index: false } };
}

export default async function ConfirmPage({ params }: { params: Promise<{ token: string }> }) {
  const { token } = await params;
  const t = await getTranslations('start.confirm');
  const opened = await openConfirmation(await openPageVisit(), token);
  if (opened.state !== 'open')
    return (
      <EntryPage title={t(`over.${opened.state}`)} lead={opened.state === 'used' ? '' : t('overWords')}>
        {null}
      </EntryPage>
    );
  return (
    <ClientMessages parts={{ start: ['confirm'] }}>
      <EntryPage title={t('title')} lead={t('lead', { email: opened.email })}>
        <ConfirmButton token={token} />
      </EntryPage>
    </ClientMessages>
  );
}
