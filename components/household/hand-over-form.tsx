'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Disclosure } from '@/components/ui/disclosure';
import { PlainSelect } from '@/components/ui/plain-select';
import { Switch } from '@/components/ui/switch';
import { TextField } from '@/components/ui/text-field';
import { RequestProblem } from '@/lib/client/fetch-json';
import { useHandOver } from '@/lib/client/hand-overs';
import type { Member } from '@/lib/schemas/member';
import type { HouseholdSetting } from './household-setting';
import { useRefusalWords } from './use-refusal-words';

type Props = { today: string; members: readonly Member[]; setting: HouseholdSetting };
const days = ['fromDay', 'untilDay'] as const;

/** From which day to which, and to whom. What was typed stays until it is written down. */
export function HandOverForm({ today, members, setting }: Props) {
  const t = useTranslations('household.duty');
  const words = useRefusalWords();
  const send = useHandOver();
  const blank = () => ({
    ...{ id: crypto.randomUUID(), fromDay: '', untilDay: '', chemicalsAllowed: false },
    memberId: (members.find(({ you }) => !you) ?? members[0])?.id ?? '',
  });
  // The id goes with what is typed, so that sending it again is the same hand-over.
  const [draft, setDraft] = useState(blank);
  const [checked, setChecked] = useState(false);
  const chosen = members.find(({ id }) => id === draft.memberId);
  const change = (part: Partial<typeof draft>) => {
    setDraft({ ...draft, ...part });
    send.reset();
  };
  const refused = send.error instanceof RequestProblem ? send.error : undefined;
  const problemOf = (day: (typeof days)[number]) => (checked && draft[day] === '' ? t('dayMissing') : refused?.at(day));
  const labels = { fromDay: t('from'), untilDay: t('until') };
  return (
    <Disclosure summary={<span className="text-body">{t('open')}</span>}>
      <form
        noValidate
        className="grid max-w-form gap-3"
        onSubmit={(event) => {
          event.preventDefault();
          setChecked(true);
          if (send.isPending || days.some((day) => draft[day] === '')) return;
          send.mutate(draft, {
            onSuccess: () => {
              setDraft(blank());
              setChecked(false);
            },
          });
        }}
      >
        <PlainSelect
          label={t('who')}
          options={members.map(({ id, name }) => ({ value: id, label: name }))}
          value={draft.memberId}
          onChange={(memberId) => change({ memberId, chemicalsAllowed: false })}
        />
        {days.map((day) => (
          <TextField
            key={day}
            type="date"
            name={day}
            label={labels[day]}
            min={today}
            value={draft[day]}
            problem={problemOf(day)}
            onChange={({ target }) => change({ [day]: target.value })}
          />
        ))}
        <Switch
          label={<span className="text-small">{t('allow', { name: chosen?.name ?? '' })}</span>}
          detail={t('allowNote')}
          checked={draft.chemicalsAllowed}
          onChange={(chemicalsAllowed) => change({ chemicalsAllowed })}
        />
        <Button type="submit" busy={send.isPending ? t('asking') : undefined}>
          {t('ask')}
        </Button>
        <p role="status" className="text-small empty:hidden">
          {send.isSuccess ? <Kept id={send.variables.memberId} members={members} atOnce={setting.demo} /> : null}
        </p>
        {send.error === null || (refused?.problems.length ?? 0) > 0 ? null : (
          <p role="alert" className="text-small font-emphasis text-terra-ink">
            {words(send.error)}
          </p>
        )}
      </form>
    </Disclosure>
  );
}

/** Whoever hands it to themselves has agreed, and so has everybody in the demo. */
function Kept({ id, members, atOnce }: { id: string; members: readonly Member[]; atOnce: boolean }) {
  const t = useTranslations('household.duty');
  const member = members.find((each) => each.id === id);
  return atOnce || member === undefined || member.you ? t('keptAtOnce') : t('kept', { name: member.name });
}
