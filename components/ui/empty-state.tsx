import { classNames } from './class-names';

export type EmptyStateProps = {
  /** A small line drawing, 70 to 96 px wide. */
  picture?: React.ReactNode;
  title: React.ReactNode;
  children?: React.ReactNode;
  action?: React.ReactNode;
  level?: 2 | 3;
  className?: string;
};

/** Nothing here yet: says what will stand here and offers the one thing that starts it. */
export function EmptyState({ picture, title, children, action, level = 2, className }: EmptyStateProps) {
  const Heading = level === 2 ? 'h2' : 'h3';
  return (
    <div className={classNames('flex items-start gap-4', className)}>
      {picture === undefined ? null : <div className="w-24 shrink-0">{picture}</div>}
      <div className="min-w-0 max-w-reading">
        <Heading className="font-display text-section">{title}</Heading>
        {children === undefined ? null : <div className="mt-1 text-body">{children}</div>}
        {action === undefined ? null : <div className="mt-3">{action}</div>}
      </div>
    </div>
  );
}
