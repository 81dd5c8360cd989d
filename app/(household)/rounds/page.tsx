import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { RoundScreen } from '@/components/rounds/round-screen';
import { requireHousehold } from '@/lib/auth/page-gate';
import { may } from '@/lib/auth/permissions';
import { ClientMessages } from '@/lib/messages/client-messages';
import { forPage } from '@/lib/services/for-page';
import { showHouseNotes } from '@/lib/services/show-house-notes';
import { showRounds } from '@/lib/services/show-rounds';
import { showVisits } from '@/lib/services/show-visits';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('rounds');
  return { title: t('title') };
}

/** What there is to look at comes with the page, so that it can be read on the way round the pool. */
export default async function RoundsPage() {
  const visit = await requireHousehold();
  const { access, now } = visit;
  const { timeZone, locale, unitSystem, personName } = access;
  const [rounds, visits, houseNotes] = await Promise.all([
    forPage(showRounds(visit)),
    forPage(showVisits(visit)),
    forPage(showHouseNotes(visit)),
  ]);
  return (
    <ClientMessages namespaces={['rounds', 'units']} parts={{ house: ['visits'] }}>
      <RoundScreen
        household={{
          ...{ timeZone, locale, unitSystem, personName },
          mayDoRounds: may(access, 'do-rounds'),
          mayKeepHouseNotes: may(access, 'keep-house-notes'),
        }}
        serverNow={now.getTime()}
        initial={{ rounds, visits, houseNotes }}
      />
    </ClientMessages>
  );
}
