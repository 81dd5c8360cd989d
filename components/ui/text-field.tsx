'use client';

import { classNames } from './class-names';
import { Field, type FieldWords } from './field';

const box = 'flex min-h-12 items-center gap-2.5 rounded border-control bg-paper-lift px-3.5 md:min-h-11 md:px-3';
const focus =
  'has-[input:focus-visible]:outline-3 has-[input:focus-visible]:outline-offset-2 has-[input:focus-visible]:outline-teal';

export type TextFieldProps = FieldWords &
  Omit<React.ComponentProps<'input'>, 'className'> & {
    /** The unit or a short fact at the right inside the box. */
    unit?: React.ReactNode;
    className?: string;
  };

/** One line of text. The value that was typed is the caller's to keep, also when it is refused. */
export function TextField(props: TextFieldProps) {
  const { label, aside, hint, problem, unit, className, id, readOnly, ...input } = props;
  const words = { label, aside, hint, problem };
  return (
    <Field {...words} {...(id === undefined ? {} : { id })} {...(className === undefined ? {} : { className })}>
      {(control) => (
        <span
          className={classNames(
            box,
            focus,
            control['aria-invalid'] ? 'border-terra-ink inset-ring inset-ring-terra-ink' : 'border-ink',
            readOnly && 'border-dashed border-rule-2 bg-transparent',
          )}
        >
          <input
            type="text"
            {...input}
            {...control}
            readOnly={readOnly}
            className="min-w-0 flex-1 self-stretch bg-transparent text-field outline-none"
          />
          {unit === undefined ? null : <span className="shrink-0 text-small text-ink-2">{unit}</span>}
        </span>
      )}
    </Field>
  );
}
