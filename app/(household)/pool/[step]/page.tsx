import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { getTranslations } from 'next-intl/server';
import { PoolSteps } from '@/components/pool/pool-steps';
import { stepNamed } from '@/components/pool/step-order';
import { requireHousehold } from '@/lib/auth/page-gate';
import { may } from '@/lib/auth/permissions';
import { ClientMessages } from '@/lib/messages/client-messages';

type Props = { params: Promise<{ step: string }> };

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const t = await getTranslations('first-run');
  const step = stepNamed((await params).step);
  return { title: step === undefined ? t('correcting') : t(`step.${step}.name`) };
}

export default async function PoolStepPage({ params }: Props) {
  const { access } = await requireHousehold();
  const step = stepNamed((await params).step);
  if (step === undefined) notFound();
  const { householdId, householdName, timeZone, locale, unitSystem, personName } = access;
  const household = { id: householdId, name: householdName, timeZone, locale, unitSystem, personName };
  return (
    <ClientMessages namespaces={['first-run', 'photos', 'pool', 'units']}>
      <PoolSteps
        key={step}
        household={{ ...household, mayChange: may(access, 'change-pool') }}
        place="profile"
        step={step}
      />
    </ClientMessages>
  );
}
