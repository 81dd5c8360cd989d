'use client';

import { useTranslations } from 'next-intl';
import type { HandOvers } from '@/lib/schemas/hand-over';
import type { Member } from '@/lib/schemas/member';
import { DutyStrip } from './duty-strip';
import { HandOverForm } from './hand-over-form';
import { HandOverRow } from './hand-over-row';
import type { HouseholdSetting } from './household-setting';
import { useDutyWords } from './use-duty-words';

type Props = { duty: HandOvers; members: readonly Member[]; setting: HouseholdSetting };

/** Who looks after the pool in these weeks: on a line, in words, and for owners the way to hand it over. */
export function OnDuty({ duty, members, setting }: Props) {
  const t = useTranslations('household.duty');
  const words = useDutyWords(setting);
  return (
    <section aria-labelledby="on-duty" className="mt-5 border-t border-ink pt-2.5">
      <h2 id="on-duty" className="font-display text-section">
        {t('title')}
      </h2>
      <p className="mb-2.5 text-small text-ink-2">{t('note')}</p>
      <DutyStrip duty={duty} setting={setting} />
      <p className="my-3 text-body font-emphasis">{t('now', { names: words.names(duty.onDuty) })}</p>
      {duty.handOvers.length === 0 ? <p className="mb-3 text-small text-ink-2">{t('none')}</p> : null}
      <ul>
        {duty.handOvers.map((handOver) => (
          <HandOverRow key={handOver.id} handOver={handOver} setting={setting} />
        ))}
      </ul>
      {setting.mayHandOver && members.length > 0 ? (
        <HandOverForm today={duty.today} members={members} setting={setting} />
      ) : null}
    </section>
  );
}
