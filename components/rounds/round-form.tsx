'use client';

import { Check } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { Activity, useState } from 'react';
import { PageLink } from '@/components/navigation/page-link';
import { Button } from '@/components/ui/button';
import { buttonClass } from '@/components/ui/button-class';
import { Disclosure } from '@/components/ui/disclosure';
import { useRecordRound } from '@/lib/client/rounds';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import type { Rounds } from '@/lib/schemas/round';
import { type RoundItem, roundItems } from '@/lib/schemas/round-items';
import { PressureField } from './pressure-field';
import { RoundHead } from './round-head';
import { RoundRow } from './round-row';
import type { RoundHousehold } from './round-household';
import { type PressureText, readPressures } from './pressures';
import { roundTimes } from './round-times';

type Props = { household: RoundHousehold; serverNow: number; known: Rounds };

/** Ten rows and one tap: what is not named is fine. */
export function RoundForm({ household, serverNow, known }: Props) {
  const t = useTranslations('rounds');
  const problemWords = useProblemWords();
  const record = useRecordRound();
  const [exceptions, setExceptions] = useState<readonly RoundItem[]>([]);
  const [pressure, setPressure] = useState<PressureText>({ now: '', clean: '' });
  const [missing, setMissing] = useState(false);
  // One id for as long as the page is open: sent twice, the round is written down once.
  const [id] = useState(() => crypto.randomUUID());
  // The server's clock as it goes on from here: the device's own may be wrong.
  const [openedAt] = useState(() => Date.now());
  const read = readPressures(pressure, household.unitSystem);
  const toggle = (item: RoundItem) =>
    setExceptions((before) =>
      before.includes(item)
        ? before.filter((each) => each !== item)
        : roundItems.filter((each) => each === item || before.includes(each)),
    );
  const send = () => {
    if (!read) return setMissing(true);
    record.mutate({
      id,
      doneAt: new Date(serverNow + Math.max(0, Date.now() - openedAt)).toISOString(),
      exceptions: [...exceptions],
      ...read,
    });
  };

  if (record.isSuccess)
    return (
      <div className="mx-auto max-w-form px-margin py-6">
        <RoundHead household={household} serverNow={serverNow} />
        <p role="status" className="mt-5 font-display text-verdict">
          {t('kept')}
        </p>
        <PageLink href="/week" className={buttonClass({ variant: 'primary', size: 'large', className: 'mt-5 w-full' })}>
          {t('toSheet')}
        </PageLink>
      </div>
    );
  return (
    <form
      className="mx-auto max-w-form px-margin pt-1 pb-6"
      onSubmit={(event) => {
        event.preventDefault();
        send();
      }}
    >
      <RoundHead household={household} serverNow={serverNow} />
      <h1 className="mt-4 font-display text-verdict">{t('headline', { count: exceptions.length })}</h1>
      <p className="mt-1 text-body text-ink-2">{t(exceptions.length === 0 ? 'lead' : 'leadExceptions')}</p>
      <ul className="mt-3.5">
        <Activity>
          {roundItems.map((item) => (
            <RoundRow
              key={item}
              item={item}
              off={exceptions.includes(item)}
              onToggle={() => toggle(item)}
              household={household}
              cleanPressure={known.cleanPressure}
            >
              {item === 'filter-pressure' && (
                <PressureField
                  part="now"
                  pressure={pressure}
                  onChange={setPressure}
                  problem={missing && !read}
                  household={household}
                />
              )}
            </RoundRow>
          ))}
        </Activity>
      </ul>
      <Disclosure summary={<span className="text-small">{t('writeClean')}</span>}>
        <PressureField
          part="clean"
          pressure={pressure}
          onChange={setPressure}
          problem={missing && !read}
          household={household}
        />
      </Disclosure>
      {!exceptions.includes('drain-cover') && (
        <p className="border-t border-rule pt-3 text-small text-ink-2">{t('drainNote')}</p>
      )}
      <div className="mt-5 border-t border-ink pt-3">
        <p className="flex flex-wrap justify-between gap-x-4 text-small text-ink-2">
          {exceptions.length > 0 ? (
            <span>{t('exceptions', { count: exceptions.length })}</span>
          ) : known.last === null ? (
            <span>{t('firstRound')}</span>
          ) : (
            <>
              <span>{t('lastRound', { when: roundTimes(household).day(Date.parse(known.last.doneAt)) })}</span>
              <span>
                {t(known.last.exceptions.length === 0 ? 'lastFine' : 'lastExceptions', {
                  count: known.last.exceptions.length,
                  by: known.last.doneBy ?? 'none',
                })}
              </span>
            </>
          )}
        </p>
        <Button
          type="submit"
          wide
          variant="primary"
          size="large"
          className="mt-2.5 min-h-15"
          busy={record.isPending ? t('saving') : undefined}
          offReason={household.mayDoRounds ? undefined : t('mayNot')}
        >
          <Check aria-hidden="true" className="size-5" />
          {t(exceptions.length === 0 ? 'allFine' : 'save')}
        </Button>
        {record.error && (
          <p role="alert" className="mt-2 text-small font-emphasis text-terra-ink">
            {problemWords(record.error)}
          </p>
        )}
      </div>
    </form>
  );
}
