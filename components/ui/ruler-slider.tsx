import { useId } from 'react';

export type RulerSliderProps = {
  label: string;
  /** The value as it stands at the right, with its unit. */
  shown: React.ReactNode;
  /** The value as it is read out. */
  spoken: string;
  name?: string;
  least: number;
  most: number;
  step: number;
  /** Values that have a line on the ruler, and those that stand under it in figures. */
  lines: readonly number[];
  figures?: readonly number[];
  value: number;
  /** Left out where nobody listens yet: the thumb then moves by itself. */
  onChange?: (value: number) => void;
};

/** A value on a ruler. The native control lies over the drawing, so that finger, keys and readers work as everywhere. */
export function RulerSlider(props: RulerSliderProps) {
  const { label, shown, spoken, name, least, most, step, lines, figures = [], value, onChange } = props;
  const id = useId();
  const at = (mark: number) => `${((mark - least) / (most - least)) * 100}%`;
  const given = onChange
    ? { value, onChange: (event: React.ChangeEvent<HTMLInputElement>) => onChange(event.target.valueAsNumber) }
    : { defaultValue: value };
  return (
    <div>
      <div className="flex items-baseline justify-between gap-3">
        <label htmlFor={id} className="text-body">
          {label}
        </label>
        <span className="text-small whitespace-nowrap text-ink-2">{shown}</span>
      </div>
      <div className={figures.length === 0 ? 'relative h-11' : 'relative h-14'}>
        <div className="absolute inset-x-3.5 top-5.5 border-t-control border-ink" aria-hidden="true">
          {lines.map((line) => (
            <span key={line} className="absolute -top-1 h-2 border-l border-ink" style={{ left: at(line) }} />
          ))}
          {figures.map((figure) => (
            <span
              key={figure}
              className="absolute top-2.5 -translate-x-1/2 text-chart text-ink-2"
              style={{ left: at(figure) }}
            >
              {figure}
            </span>
          ))}
        </div>
        <input
          id={id}
          type="range"
          name={name}
          min={least}
          max={most}
          step={step}
          autoComplete="off"
          aria-valuetext={spoken}
          className="ruler-slider absolute inset-x-0 top-0 h-11"
          {...given}
        />
      </div>
    </div>
  );
}
