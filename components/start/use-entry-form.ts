'use client';

import { useTranslations } from 'next-intl';
import { useRef, useState } from 'react';
import { RequestProblem } from '@/lib/client/fetch-json';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import { leaveFor } from '@/lib/client/session';

type Problems<Field extends string> = Partial<Record<Field, string>>;

export type EntryForm<Field extends string> = {
  problems: Problems<Field>;
  /** One sentence above the form when it did not go through. */
  failure: string | undefined;
  busy: boolean;
  /** A field that is being corrected is no longer told off. */
  forgive: (field: Field) => void;
  submit: (event: React.SubmitEvent<HTMLFormElement>) => void;
};

/**
 * A form that opens a door: sign in and sign up. The fields keep their own text, so nothing that was typed, not even
 * before React listened, is lost when the answer is no. Only one request is under way at a time.
 */
export function useEntryForm<Field extends string>(
  fields: readonly Field[],
  check: (text: Record<Field, string>) => Problems<Field>,
  send: (text: Record<Field, string>) => Promise<{ next: string }>,
): EntryForm<Field> {
  const t = useTranslations('start.form');
  const words = useProblemWords();
  const [problems, setProblems] = useState<Problems<Field>>({});
  const [failure, setFailure] = useState<string>();
  const [busy, setBusy] = useState(false);
  // State is seen a render later; a double click comes sooner.
  const underWay = useRef(false);

  function refuse(form: HTMLFormElement, found: Problems<Field>, sentence?: string) {
    setProblems(found);
    const wrong = fields.filter((field) => found[field] !== undefined);
    setFailure(sentence ?? t('look', { count: wrong.length }));
    const first = wrong[0] === undefined ? null : form.elements.namedItem(wrong[0]);
    if (first instanceof HTMLElement) first.focus();
  }

  async function submit(form: HTMLFormElement) {
    if (underWay.current) return;
    const data = new FormData(form);
    const text = Object.fromEntries(fields.map((field) => [field, String(data.get(field) ?? '')])) as Record<
      Field,
      string
    >;
    const found = check(text);
    if (Object.keys(found).length > 0) return refuse(form, found);

    underWay.current = true;
    setBusy(true);
    setProblems({});
    setFailure(undefined);
    try {
      const { next } = await send(text);
      // Stays busy: the next page is already loading.
      leaveFor(next);
    } catch (problem) {
      underWay.current = false;
      setBusy(false);
      const atFields = problem instanceof RequestProblem ? problemsByField(problem, fields) : {};
      refuse(form, atFields, Object.keys(atFields).length > 0 ? undefined : words(problem));
    }
  }

  return {
    problems,
    failure,
    busy,
    forgive: (field) => setProblems(({ [field]: _corrected, ...others }) => others as Problems<Field>),
    submit: (event) => {
      event.preventDefault();
      void submit(event.currentTarget);
    },
  };
}

function problemsByField<Field extends string>(problem: RequestProblem, fields: readonly Field[]): Problems<Field> {
  const found: Problems<Field> = {};
  for (const field of fields) {
    const message = problem.at(field);
    if (message !== undefined) found[field] = message;
  }
  return found;
}
