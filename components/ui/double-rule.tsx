import { classNames } from './class-names';

/** The rule that closes a masthead: 2.5 px of ink, 1 px of paper, 1 px of ink. */
export function DoubleRule({ className }: { className?: string }) {
  return (
    <div aria-hidden="true" className={classNames('border-t-stop border-ink', className)}>
      <div className="mt-px border-t border-ink" />
    </div>
  );
}
