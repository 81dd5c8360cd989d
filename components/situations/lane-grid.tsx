import type { StepDay } from './step-days';

type Props = {
  days: readonly StepDay[];
  name: React.ReactNode;
  children: (day: StepDay) => React.ReactNode;
  className?: string;
};

/** A lane of day-columns, each as wide as its day is long; its name stays when the sheet is scrolled. */
export function LaneGrid({ days, name, children, className = '' }: Props) {
  const columns = days.map(({ from, to }) => `minmax(0,${to - from}fr)`).join(' ');
  return (
    <div className={`relative grid grid-cols-[var(--gutter)_minmax(0,1fr)] ${className}`}>
      <div className="sticky left-0 z-2 bg-paper pr-2">{name}</div>
      <div className="grid" style={{ gridTemplateColumns: columns }}>
        {days.map((day) => (
          <div key={day.day} className="min-w-0">
            {children(day)}
          </div>
        ))}
      </div>
    </div>
  );
}
