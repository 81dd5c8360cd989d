'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { PageLink } from '@/components/navigation/page-link';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { textLink } from '@/components/ui/text-link';
import { TickBox } from '@/components/ui/tick-box';
import { dayOf } from '@/lib/calendar/household-day';
import { useAgreeToHandOver, useEndHandOver } from '@/lib/client/hand-overs';
import { leaveFor } from '@/lib/client/session';
import type { HandOver } from '@/lib/schemas/hand-over';
import type { HouseholdSetting } from './household-setting';
import { useDutyWords } from './use-duty-words';
import { useRefusalWords } from './use-refusal-words';

type Props = { handOver: HandOver; setting: HouseholdSetting };

/** A hand-over in words: whose days, whether it is agreed, what it brings, and what whoever looks can do about it. */
export function HandOverRow({ handOver, setting }: Props) {
  const t = useTranslations('household.duty');
  const words = useDutyWords(setting);
  const { name, role, you, chemicalsAllowed, cardRead, agreedAt } = handOver;
  const when = agreedAt === null ? null : words.longDay(dayOf(Date.parse(agreedAt), setting.timeZone));
  return (
    <li className="grid gap-x-6 gap-y-2 border-t border-rule py-3 md:grid-cols-[minmax(0,1fr)_auto]">
      <div className="min-w-0">
        <b className="block font-display text-name break-words">{t('time', { name, days: words.daysOf(handOver) })}</b>
        <p className="text-body">
          {when === null ? t('waiting', words.whoOf(handOver)) : t('agreed', { ...words.whoOf(handOver), when })}
        </p>
        <p className="text-small text-ink-2">{t('means', { role })}</p>
        <p className="text-small text-ink-2">
          {t(`chemicals.${chemicalsAllowed ? (cardRead ? 'ready' : 'waits') : 'none'}`)}
        </p>
      </div>
      {you ? <YourAnswer handOver={handOver} /> : setting.mayHandOver ? <TakeBack handOver={handOver} /> : null}
    </li>
  );
}

/** For whoever is asked. What the page shows hangs on one's own role, which changes with it while the days run. */
function YourAnswer({ handOver: { id, chemicalsAllowed, cardRead, agreedAt, inForce } }: Pick<Props, 'handOver'>) {
  const t = useTranslations('household.duty');
  const words = useRefusalWords();
  const agree = useAgreeToHandOver();
  const decline = useEndHandOver();
  const [hasRead, setHasRead] = useState(false);
  const wantsCard = chemicalsAllowed && !cardRead;
  const problem = agree.error ?? decline.error;
  const agreeTo = (card: boolean) =>
    agree.mutate(
      { id, cardRead: card },
      {
        onSuccess: ({ handOvers }) => {
          if (handOvers.some((each) => each.id === id && each.inForce)) leaveFor('/household');
        },
      },
    );
  return (
    <div className="grid content-start justify-items-start gap-1.5">
      {wantsCard ? (
        <>
          <PageLink href="/help/safety" className={`inline-flex min-h-11 items-center text-body ${textLink}`}>
            {t('cardRead')}
          </PageLink>
          <TickBox label={t('cardNow')} checked={hasRead} onChange={setHasRead} />
        </>
      ) : null}
      <div className="flex flex-wrap gap-2">
        {agreedAt === null || (wantsCard && hasRead) ? (
          <Button
            variant="primary"
            busy={agree.isPending ? t('agreeing') : undefined}
            onClick={() => agreeTo(wantsCard && hasRead)}
          >
            {t('agree')}
          </Button>
        ) : null}
        <Button
          busy={decline.isPending ? t('declining') : undefined}
          onClick={() => decline.mutate(id, { onSuccess: () => inForce && leaveFor('/household') })}
        >
          {t(agreedAt === null ? 'decline' : 'giveBack')}
        </Button>
      </div>
      {problem === null ? null : (
        <p role="alert" className="text-small font-emphasis text-terra-ink">
          {words(problem)}
        </p>
      )}
    </div>
  );
}

/** For owners, at any hour. */
function TakeBack({ handOver: { id, name } }: Pick<Props, 'handOver'>) {
  const t = useTranslations('household.duty');
  const common = useTranslations('common');
  const words = useRefusalWords();
  const end = useEndHandOver();
  const [asked, setAsked] = useState(false);
  return (
    <div>
      <Button onClick={() => setAsked(true)}>{t('takeBack')}</Button>
      <Dialog
        open={asked}
        onOpenChange={setAsked}
        title={t('takeBackTitle', { name })}
        description={t('takeBackWords', { name })}
        closeLabel={common('close')}
        actions={
          <>
            <Button
              variant="primary"
              busy={end.isPending ? t('takingBack') : undefined}
              onClick={() => end.mutate(id, { onSuccess: () => setAsked(false) })}
            >
              {t('takeBackYes')}
            </Button>
            <Button onClick={() => setAsked(false)}>{common('cancel')}</Button>
          </>
        }
      >
        {end.error === null ? null : <p role="alert">{words(end.error)}</p>}
      </Dialog>
    </div>
  );
}
