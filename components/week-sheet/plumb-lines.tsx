'use client';

import { doseFoot } from '@/components/charts/dose-marks';
import { isOn, xOf } from '@/components/charts/time-axis';
import { type ValueAxis, yOf } from '@/components/charts/value-axis';
import type { CurveQuantity } from '@/components/charts/water-curve';
import { chartDoses } from './chart-input';
import { laneHeight, lanesFoot } from './lane';
import { useSheet } from './sheet-context';
import { useDoseWords } from './use-dose-words';

const tops: Record<CurveQuantity, number> = {
  freeChlorine: laneHeight.head + laneHeight.sun,
  pH: laneHeight.head + laneHeight.sun + laneHeight.chlorine + laneHeight.highLow,
  cyanuricAcid: laneHeight.head + laneHeight.sun + laneHeight.chlorine + laneHeight.highLow + laneHeight.pH,
};
const figures = { top: tops.pH - laneHeight.highLow, bottom: tops.pH };
const FIGURES_WIDTH = 96;

/** From the to-do lane up through the lanes to the curve that each dose lifts: drawn out once it is given. */
export function PlumbLines({ width, axes }: { width: number; axes: Record<CurveQuantity, ValueAxis> }) {
  const { sheet, picture } = useSheet();
  const doses = chartDoses(sheet.doses, useDoseWords());
  // Like the line of now, a plumb line breaks for the high and low figures at the left of each column.
  const crossesFigures = (x: number) =>
    picture.days.some(({ from }) => {
      const left = xOf(picture.axis, width, from);
      return x > left && x < left + FIGURES_WIDTH;
    });
  return (
    <svg
      width={width}
      height={lanesFoot}
      viewBox={`0 0 ${width} ${lanesFoot}`}
      aria-hidden="true"
      className="pointer-events-none absolute top-0 left-[var(--gutter)] stroke-ink"
    >
      {doses.map((dose) => {
        const level = doseFoot(picture.points, dose);
        if (dose.moves === undefined || level === undefined || !isOn(picture.axis, dose.at)) return null;
        const x = xOf(picture.axis, width, dose.at);
        const top = tops[dose.moves] + yOf(axes[dose.moves], level);
        return (
          <path
            key={dose.id}
            d={
              crossesFigures(x)
                ? `M${x} ${lanesFoot}V${figures.bottom}M${x} ${figures.top}V${top}`
                : `M${x} ${lanesFoot}V${top}`
            }
            fill="none"
            strokeWidth="1.1"
            strokeDasharray={dose.given ? 'none' : '2 3'}
          />
        );
      })}
    </svg>
  );
}
