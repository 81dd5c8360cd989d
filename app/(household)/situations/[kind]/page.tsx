import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { getTranslations } from 'next-intl/server';
import { SituationScreen } from '@/components/situations/situation-screen';
import { requireHousehold } from '@/lib/auth/page-gate';
import { may } from '@/lib/auth/permissions';
import { ClientMessages } from '@/lib/messages/client-messages';
import { situationKindSchema } from '@/lib/schemas/situation';

type Props = { params: Promise<{ kind: string }> };

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const t = await getTranslations('situations');
  const kind = situationKindSchema.safeParse((await params).kind);
  return { title: kind.success ? t(`kind.${kind.data}.name`) : t('title') };
}

export default async function SituationPage({ params }: Props) {
  const { access } = await requireHousehold();
  const kind = situationKindSchema.safeParse((await params).kind);
  if (!kind.success) notFound();
  const { timeZone, locale, unitSystem } = access;
  return (
    <ClientMessages namespaces={['situations', 'doses', 'units']} parts={{ house: ['visits'] }}>
      <SituationScreen
        household={{ timeZone, locale, unitSystem, mayOpen: may(access, 'open-situations') }}
        kind={kind.data}
      />
    </ClientMessages>
  );
}
