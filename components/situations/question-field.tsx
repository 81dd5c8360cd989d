'use client';

import { useTranslations } from 'next-intl';
import { RadioRows } from '@/components/ui/radio-rows';
import { Segments } from '@/components/ui/segments';
import { TextField } from '@/components/ui/text-field';
import type { Question } from './questions';

type Props = {
  question: Question;
  value: string | undefined;
  onChange: (value: string) => void;
  problem: string | undefined;
};

/** One question of a procedure. Nothing is chosen beforehand. */
export function QuestionField({ question: { name, as, answers = [] }, value, onChange, problem }: Props) {
  const t = useTranslations('situations');
  const label = t(`question.${name}`);
  if (as === 'day' || as === 'text')
    return (
      <TextField
        label={label}
        type={as === 'day' ? 'date' : 'text'}
        autoComplete="off"
        maxLength={80}
        problem={problem}
        value={value ?? ''}
        onChange={(event) => onChange(event.target.value)}
        className="max-w-form"
      />
    );
  const Choices = as === 'rows' ? RadioRows : Segments;
  return (
    <Choices
      label={label}
      problem={problem}
      choices={answers.map((answer) => ({ value: answer, label: t(`answer.${answer}`) }))}
      value={answers.find((answer) => answer === value) ?? null}
      onChange={onChange}
      className="max-w-form"
    />
  );
}
