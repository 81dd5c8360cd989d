'use client';

import { useId } from 'react';

export type SliderProps = {
  label: string;
  value: number;
  /** The value with its unit. */
  written: string;
  low: number;
  high: number;
  step: number;
  onMove: (value: number) => void;
};

const ticks = 8;

/** A value on an engraved scale. It is the browser's own slider: arrow keys, page keys, home and end work. */
export function Slider({ label, value, written, low, high, step, onMove }: SliderProps) {
  const id = useId();
  return (
    <div className="min-w-0 py-1">
      <div className="flex items-baseline justify-between gap-2 text-body">
        <label htmlFor={id}>{label}</label>
        <output htmlFor={id} className="font-display text-[21px] leading-[26px] font-headline whitespace-nowrap">
          {written}
        </output>
      </div>
      <div className="relative">
        <svg
          className="pointer-events-none absolute inset-x-3 top-0 h-11"
          width="calc(100% - 24px)"
          viewBox="0 0 100 44"
          preserveAspectRatio="none"
          aria-hidden="true"
        >
          <path d="M0 22H100" className="fill-none stroke-ink" strokeWidth="1.4" vectorEffect="non-scaling-stroke" />
          {Array.from({ length: ticks + 1 }, (_, tick) => (
            <path
              key={tick}
              d={`M${(100 * tick) / ticks} 22v7`}
              className="fill-none stroke-ink"
              strokeWidth="1"
              vectorEffect="non-scaling-stroke"
            />
          ))}
        </svg>
        <input
          id={id}
          type="range"
          min={low}
          max={high}
          step={step}
          value={value}
          aria-valuetext={written}
          onChange={(event) => onMove(event.target.valueAsNumber)}
          className="relative h-11 w-full cursor-pointer appearance-none bg-transparent text-ink [&::-moz-range-thumb]:size-5 [&::-moz-range-thumb]:rounded-full [&::-moz-range-thumb]:border-[2px] [&::-moz-range-thumb]:border-ink [&::-moz-range-thumb]:bg-teal [&::-webkit-slider-thumb]:size-6 [&::-webkit-slider-thumb]:appearance-none [&::-webkit-slider-thumb]:rounded-full [&::-webkit-slider-thumb]:border-[2px] [&::-webkit-slider-thumb]:border-ink [&::-webkit-slider-thumb]:bg-[radial-gradient(circle,var(--teal)_0_5px,var(--paper-lift)_5.5px)]"
        />
      </div>
    </div>
  );
}
