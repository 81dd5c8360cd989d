'use client';

import { CircleX } from 'lucide-react';
import { useId } from 'react';
import { classNames } from './class-names';

export type FieldWords = {
  label: React.ReactNode;
  /** Stands at the right of the label: where the figure is found, whether it can stay empty. */
  aside?: React.ReactNode;
  /** Help below the control. A problem takes its place. */
  hint?: React.ReactNode;
  /** What is wrong, and the likely fix, in plain words. */
  problem?: React.ReactNode;
};

/** What a control has to carry so that its label, hint and problem are read out with it. */
export type FieldControl = {
  id: string;
  'aria-describedby': string | undefined;
  'aria-invalid': true | undefined;
};

export function Field(
  props: FieldWords & {
    id?: string | undefined;
    className?: string;
    children: (control: FieldControl) => React.ReactNode;
  },
) {
  const { label, aside, hint, problem, className, children } = props;
  const ownId = useId();
  const id = props.id ?? ownId;
  const wordsId = `${id}-words`;
  const words = problem ?? hint;
  const hasWords = words !== undefined && words !== null;

  return (
    <div className={classNames('min-w-0', className)}>
      <div className="mb-1.5 flex items-baseline justify-between gap-3">
        <label htmlFor={id} className="text-label font-strong">
          {label}
        </label>
        {aside === undefined ? null : <span className="text-small text-ink-2">{aside}</span>}
      </div>
      {children({
        id,
        'aria-describedby': hasWords ? wordsId : undefined,
        'aria-invalid': problem === undefined ? undefined : true,
      })}
      {hasWords ? <FieldWordsBelow id={wordsId} hint={hint} problem={problem} /> : null}
    </div>
  );
}

/** The line below a control or a group of controls: the problem if there is one, else the hint. */
export function FieldWordsBelow({
  id,
  hint,
  problem,
}: {
  id: string;
  hint?: React.ReactNode;
  problem?: React.ReactNode;
}) {
  if (problem === undefined || problem === null) {
    return (
      <p id={id} className="mt-1.5 text-small text-ink-2">
        {hint}
      </p>
    );
  }
  return (
    <p id={id} className="mt-1.5 flex gap-1.5 text-small font-emphasis text-terra-ink">
      <CircleX aria-hidden="true" className="mt-px size-4.25 shrink-0" />
      <span>{problem}</span>
    </p>
  );
}
