'use client';

import { shareOf } from '@/components/charts/time-axis';
import { useSheet } from './sheet-context';

/** Hairlines between the days, through every lane. */
export function DayRules() {
  const { axis, days } = useSheet().picture;
  const ends = [axis.from, ...days.map(({ to }) => to)];
  return ends.map((at) => (
    <div
      key={at}
      aria-hidden="true"
      className="absolute top-1.5 bottom-0 border-l border-rule"
      style={at === axis.to ? { right: 0 } : { left: `${shareOf(axis, at) * 100}%` }}
    />
  ));
}
