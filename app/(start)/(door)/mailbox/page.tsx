import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { notFound } from 'next/navigation';
import { EntryPage } from '@/components/start/entry-page';
import { KeptMails } from '@/components/start/kept-mails';
import { MailboxKey } from '@/components/start/mailbox-key';
import { openPageVisit } from '@/lib/auth/page-gate';
import { hasMailbox, showMailbox } from '@/lib/services/show-mailbox';

export async function generateMetadata(): Promise<Metadata> {
  if (!hasMailbox()) return {};
  const t = await getTranslations('start.mailbox');
  return { title: t('title'), referrer: 'no-referrer', robots: { index: false } };
}

/** The mail of a machine that has no mail server. It exists nowhere else. */
export default async function MailboxPage({ searchParams }: { searchParams: Promise<Record<string, unknown>> }) {
  if (!hasMailbox()) notFound();
  const t = await getTranslations('start.mailbox');
  const { key } = await searchParams;
  const given = typeof key === 'string' && key !== '' ? key : undefined;
  const mails = await showMailbox(await openPageVisit(), given);
  return (
    <EntryPage title={t('title')} lead={t('lead')}>
      {mails === null ? <MailboxKey wrong={given !== undefined} /> : <KeptMails mails={mails} />}
    </EntryPage>
  );
}
