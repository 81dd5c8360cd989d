import { Info, OctagonAlert, TriangleAlert } from 'lucide-react';
import { classNames } from './class-names';

export type Severity = 'stop' | 'take-care' | 'note';

export type CalloutProps = {
  severity: Severity;
  /** The severity in a word; it always comes first. */
  word: string;
  title?: React.ReactNode;
  children?: React.ReactNode;
  actions?: React.ReactNode;
  className?: string;
};

const icons = { stop: OctagonAlert, 'take-care': TriangleAlert, note: Info };

const frames: Record<Severity, string> = {
  stop: 'relative border-stop border-terra-ink bg-paper-lift py-3 pr-4.5 pl-8.5 before:absolute before:inset-y-0 before:left-0 before:w-4.25 before:bg-hatch-stop',
  'take-care': 'border-l-care border-ochre-ink bg-care-wash py-3 pr-4.5 pl-5',
  note: 'border-y border-rule-2 py-3 pr-4.5 pl-5',
};

const words: Record<Severity, string> = {
  stop: 'text-terra-ink',
  'take-care': 'text-ochre-ink',
  note: 'text-teal-ink',
};

/** A caution. Word, outline of the sign and frame all differ, so none of it hangs on colour. */
export function Callout({ severity, word, title, children, actions, className }: CalloutProps) {
  const Icon = icons[severity];
  return (
    <div className={classNames('grid grid-cols-[38px_1fr] text-body', frames[severity], className)}>
      <Icon aria-hidden="true" className={classNames('size-6.5', words[severity])} />
      <div className="min-w-0">
        <p className={classNames('text-control font-severity', words[severity])}>{word}</p>
        {title === undefined ? null : <p className="font-display text-section">{title}</p>}
        {children}
        {actions === undefined ? null : (
          <div className="mt-2.5 mb-1 flex flex-wrap items-center gap-2.5">{actions}</div>
        )}
      </div>
    </div>
  );
}

/** A caution of one sentence. The severity word comes first: `<StopWord>Stop.</StopWord> Never ...`. */
export function InlineStop({ children, className }: { children: React.ReactNode; className?: string }) {
  return (
    <div className={classNames('flex gap-2.5 text-body', className)}>
      <OctagonAlert aria-hidden="true" className="mt-px size-5.5 shrink-0 text-terra-ink" />
      <p>{children}</p>
    </div>
  );
}

export function StopWord({ children }: { children: React.ReactNode }) {
  return <strong className="font-severity text-terra-ink">{children}</strong>;
}
