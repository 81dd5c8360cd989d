import { classNames } from './class-names';

/** A ruler of equal parts: those done are thick, the current one ends in a ring, those ahead are hairlines. */
export function ProgressRuler({ parts, current, label }: { parts: number; current: number; label: string }) {
  return (
    <div
      role="progressbar"
      aria-label={label}
      aria-valuemin={1}
      aria-valuemax={parts}
      aria-valuenow={current}
      aria-valuetext={label}
      className="flex h-2 items-start gap-1.25"
    >
      {Array.from({ length: parts }, (_, index) => (
        <span
          key={index}
          className={classNames(
            'relative flex-1',
            index < current ? 'border-t-stop border-ink' : 'mt-px border-t border-rule-2',
          )}
        >
          {index === current - 1 ? (
            <span className="absolute -top-[7px] right-0 size-2.75 rounded-full border-due border-ink bg-paper-lift" />
          ) : null}
        </span>
      ))}
    </div>
  );
}
