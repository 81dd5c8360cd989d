'use client';

import { Fragment } from 'react';
import { Area, Line, ReferenceArea, ReferenceLine } from 'recharts';
import { bandOf, type ChartRow, middleOf, waterOf } from './chart-rows';
import { layer, still } from './lane-chart';
import { HATCH } from './patterns';
import type { Stretch } from './time-axis';
import type { ValueAxis } from './value-axis';
import type { CurveQuantity } from './water-curve';

type CurveStyle = { line: string; band: string; dash?: string; width: number };

const styles: Record<CurveQuantity, CurveStyle> = {
  freeChlorine: { line: 'text-teal', band: 'text-band', width: 2.6 },
  pH: { line: 'text-plum', band: 'text-plum-band', dash: '9 3.5', width: 2 },
  cyanuricAcid: { line: 'text-ochre', band: 'text-ochre-band', dash: '11 3 1.6 3', width: 2 },
};

/**
 * Ahead: the likely range filled, the line at its full weight. Behind, as the plans of their time promised it: the range
 * drawn by its two edges, the line thinner. Told apart by shape, not by colour.
 */
export function Curve({ quantity, thicker = 0 }: { quantity: CurveQuantity; thicker?: number }) {
  const { line, band, dash, width } = styles[quantity];
  const dashes = dash === undefined ? {} : { strokeDasharray: dash };
  return (
    <>
      <Area
        {...still}
        dataKey={bandOf('behind', quantity)}
        className={line}
        stroke="currentColor"
        strokeOpacity={0.6}
        strokeWidth={0.9}
        fill="none"
        zIndex={layer.band}
      />
      <Area
        {...still}
        dataKey={bandOf('ahead', quantity)}
        className={band}
        stroke="none"
        fill="currentColor"
        fillOpacity={1}
        zIndex={layer.band}
      />
      {(['behind', 'ahead'] as const).map((side) => (
        <Line
          key={side}
          {...still}
          {...dashes}
          dataKey={middleOf(side, quantity)}
          className={line}
          stroke="currentColor"
          strokeWidth={side === 'ahead' ? width + thicker : width * 0.65}
          strokeLinejoin="round"
          dot={false}
          zIndex={layer.curve}
        />
      ))}
    </>
  );
}

/** A limit that holds over a stretch of time. */
export type Limit = Stretch & { value: number; forbidden: 'above' | 'below' };

const HATCH_HEIGHT = 6;

/** Limits as inked lines, hatched on the side where the water may not be. */
export function LimitLines({ limits, axis }: { limits: readonly Limit[]; axis: ValueAxis }) {
  return limits.map(({ from, to, value, forbidden }) => (
    <Fragment key={`${forbidden} ${from}`}>
      <ReferenceArea
        x1={from}
        x2={to}
        y1={value}
        y2={value + ((forbidden === 'above' ? 1 : -1) * HATCH_HEIGHT) / axis.perUnit}
        fill={HATCH}
        fillOpacity={0.55}
        ifOverflow="hidden"
        zIndex={layer.limit}
      />
      <ReferenceLine
        segment={[
          { x: from, y: value },
          { x: to, y: value },
        ]}
        stroke="currentColor"
        strokeWidth={1.25}
        ifOverflow="hidden"
        zIndex={layer.limit}
      />
    </Fragment>
  ));
}

/** The lowest level of free chlorine moves with the stabilizer, so it is a line of its own. */
export function LowestLevelLine({ axis }: { axis: ValueAxis }) {
  const level = (row: ChartRow) => waterOf(row)?.lowestLevel;
  const hatched = (row: ChartRow) => {
    const value = level(row);
    return value === undefined ? undefined : [value - HATCH_HEIGHT / axis.perUnit, value];
  };
  return (
    <>
      <Area {...still} dataKey={hatched} stroke="none" fill={HATCH} fillOpacity={0.55} zIndex={layer.limit} />
      <Line {...still} dataKey={level} stroke="currentColor" strokeWidth={1.25} dot={false} zIndex={layer.limit} />
    </>
  );
}
