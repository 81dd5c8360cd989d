import { CircleX } from 'lucide-react';
import { classNames } from './class-names';

export type ProblemStateProps = {
  title: React.ReactNode;
  children?: React.ReactNode;
  action?: React.ReactNode;
  className?: string;
};

/** Something did not work. Read out at once; offers the way on. */
export function ProblemState({ title, children, action, className }: ProblemStateProps) {
  return (
    <div
      role="alert"
      className={classNames('flex gap-3 border-l-care border-terra-ink py-1 pl-4 text-body', className)}
    >
      <CircleX aria-hidden="true" className="mt-px size-5.5 shrink-0 text-terra-ink" />
      <div className="min-w-0">
        <p className="font-strong">{title}</p>
        {children === undefined ? null : <div className="text-ink-2">{children}</div>}
        {action === undefined ? null : <div className="mt-2.5">{action}</div>}
      </div>
    </div>
  );
}
