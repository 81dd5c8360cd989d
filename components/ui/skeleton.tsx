import { classNames } from './class-names';

/** The place of something that is on its way: drawn in dashes, without a shimmer. The words say what is coming. */
export function Skeleton({ label, className }: { label: string; className?: string }) {
  return (
    <div
      role="status"
      className={classNames(
        'flex items-center justify-center border border-dashed border-rule-2 text-small text-ink-2',
        className,
      )}
    >
      {label}
    </div>
  );
}
