import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { notFound } from 'next/navigation';
import { HowPageBody } from '@/components/help/how/how-page-body';
import { isHowPage } from '@/lib/client/worked-out/how-page';
import { ClientMessages } from '@/lib/messages/client-messages';

type Props = { params: Promise<{ page: string }> };

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { page } = await params;
  const t = await getTranslations('how');
  return isHowPage(page) ? { title: t(`page.${page}.title`) } : {};
}

/** One quantity and how it is worked out; open to everyone. */
export default async function HowQuantityPage({ params }: Props) {
  const { page } = await params;
  if (!isHowPage(page)) notFound();
  return (
    <ClientMessages namespaces={['how-examples']}>
      <HowPageBody page={page} />
    </ClientMessages>
  );
}
