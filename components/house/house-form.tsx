'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { checkAnswers, type FieldProblems, focusFirstProblem, noProblems } from '@/components/pool/field-problems';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/text-field';
import { longDay } from '@/lib/calendar/format';
import { dayOf } from '@/lib/calendar/household-day';
import { parseInstant } from '@/lib/calendar/wall-time';
import { RequestProblem } from '@/lib/client/fetch-json';
import { useSaveHouseNotes } from '@/lib/client/house-notes';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import { type HouseNoteName, houseNoteNames, type HouseNotes, newHouseNotesSchema } from '@/lib/schemas/house-note';
import type { HouseHousehold } from './house-household';

type Draft = Record<HouseNoteName, string>;

const groups = [
  { name: 'reach', fields: ['ourPhone', 'neighbourName', 'neighbourPhone', 'professionalName', 'professionalPhone'] },
  { name: 'places', fields: ['gate', 'pumpSwitch', 'breaker', 'chemicals'] },
] as const satisfies readonly { name: string; fields: readonly HouseNoteName[] }[];

const phones: readonly HouseNoteName[] = ['ourPhone', 'neighbourPhone', 'professionalPhone'];

type Props = { household: HouseHousehold; known: HouseNotes };

/** Whom to call and where things are. What was typed stays, also when it is refused. */
export function HouseForm({ household, known }: Props) {
  const t = useTranslations('house');
  const problemWords = useProblemWords();
  const save = useSaveHouseNotes();
  const [draft, setDraft] = useState<Draft>(() => draftOf(known));
  const [problems, setProblems] = useState<FieldProblems>(noProblems);
  const refused = save.error instanceof RequestProblem ? save.error : undefined;
  const send = () => {
    const checked = checkAnswers(newHouseNotesSchema, saidOf(draft));
    setProblems(checked.problems);
    if (checked.answers) save.mutate(checked.answers);
    else focusFirstProblem();
  };
  return (
    <form
      noValidate
      className="max-w-form"
      onSubmit={(event) => {
        event.preventDefault();
        send();
      }}
    >
      {groups.map(({ name, fields }) => (
        <fieldset key={name} className="mb-6 grid gap-3.5">
          <legend className="mb-2 font-display text-section">{t(`group.${name}`)}</legend>
          {fields.map((field) => (
            <NoteField
              key={field}
              field={field}
              value={draft[field]}
              problem={problems[field] ?? refused?.at(field)}
              readOnly={!household.mayKeepHouseNotes}
              onChange={(text) => {
                setDraft({ ...draft, [field]: text });
                save.reset();
              }}
            />
          ))}
        </fieldset>
      ))}
      <Button
        type="submit"
        wide
        variant="primary"
        size="large"
        busy={save.isPending ? t('saving') : undefined}
        offReason={household.mayKeepHouseNotes ? undefined : t('mayNot')}
      >
        {t('save')}
      </Button>
      <p role="status" className="mt-2 text-small text-ink-2">
        {save.isSuccess ? t('kept') : known.updatedAt === null ? null : lastKept(t, known, household)}
      </p>
      {save.error === null ? null : (
        <p role="alert" className="mt-1 text-small font-emphasis text-terra-ink">
          {t('notSaved')} {problemWords(save.error)}
        </p>
      )}
    </form>
  );
}

type NoteFieldProps = {
  field: HouseNoteName;
  value: string;
  problem: string | undefined;
  readOnly: boolean;
  onChange: (text: string) => void;
};

function NoteField({ field, value, problem, readOnly, onChange }: NoteFieldProps) {
  const t = useTranslations('house');
  const isPhone = phones.includes(field);
  return (
    <TextField
      name={field}
      label={t(`field.${field}`)}
      hint={hasHint(field) ? t(`hint.${field}`) : undefined}
      problem={problem}
      type={isPhone ? 'tel' : 'text'}
      inputMode={isPhone ? 'tel' : undefined}
      autoComplete="off"
      readOnly={readOnly}
      value={value}
      onChange={(event) => onChange(event.target.value)}
    />
  );
}

function hasHint(field: HouseNoteName): field is 'gate' | 'breaker' | 'pumpSwitch' | 'chemicals' {
  return groups[1].fields.some((place) => place === field);
}

function draftOf({ notes }: HouseNotes): Draft {
  return Object.fromEntries(houseNoteNames.map((name) => [name, notes[name] ?? ''])) as Draft;
}

/** Without what is empty: it is not known, or no longer. */
function saidOf(draft: Draft): Partial<Draft> {
  return Object.fromEntries(Object.entries(draft).filter(([, text]) => text.trim() !== ''));
}

function lastKept(
  t: ReturnType<typeof useTranslations<'house'>>,
  { updatedAt, updatedBy }: HouseNotes,
  { timeZone, locale }: HouseHousehold,
): string {
  const when = longDay(dayOf(parseInstant(updatedAt ?? '') ?? 0, timeZone), locale);
  return t('lastKept', { when, by: updatedBy ?? 'none' });
}
