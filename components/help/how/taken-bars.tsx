'use client';

import { useTranslations } from 'next-intl';
import { useId } from 'react';
import { type Axis, roundHeight, type Taken } from '@/lib/client/worked-out/examples/curve';
import { percentOf, shareOf } from './curve-path';

/** What took chlorine in each hour, hung from a line: waves for the water, strokes for the sun, solid for swimmers. */
export function TakenBars({ across, taken }: { across: Axis; taken: Taken }) {
  const t = useTranslations('how-examples');
  const id = useId();
  const fills = [`url(#${id}water)`, `url(#${id}sun)`, 'currentColor'];
  const strokes = ['stroke-teal', 'stroke-ink', 'stroke-ink'];
  const names = taken[0]?.parts.map(({ name }) => name) ?? [];
  const tallest = Math.max(...taken.map(({ parts }) => parts.reduce((sum, { value }) => sum + value, 0)));
  const highest = roundHeight(tallest, [0.2, 0.4, 0.8, 1.6, 3.2]);
  return (
    <div className="ml-12 md:ml-14" aria-hidden="true">
      <p className="flex flex-wrap items-center gap-x-5 gap-y-0.5 border-b border-rule-2 pt-1 pb-1.5 text-chart">
        <b className="font-strong">{t('taken')}</b>
        {names.map((name, index) => (
          <span key={name} className="inline-flex items-center gap-1.5">
            <svg width="17" height="13" className="text-ink">
              <rect x=".7" y=".7" width="15.6" height="11.6" fill={fills[index]} className={strokes[index]} />
            </svg>
            {t(`figure.${name}`)}
          </span>
        ))}
      </p>
      <svg className="h-24 w-full text-ink">
        <defs>
          <pattern id={`${id}water`} width="9" height="5" patternUnits="userSpaceOnUse">
            <path d="M0 2.5q2.25 -2 4.5 0t4.5 0" className="fill-none stroke-teal" strokeWidth="0.9" />
          </pattern>
          <pattern id={`${id}sun`} width="3" height="6" patternUnits="userSpaceOnUse">
            <path d="M1.5 0V6" className="fill-none stroke-ink" strokeWidth="1.1" />
          </pattern>
        </defs>
        {taken.map(({ at, parts }) => {
          let top = 0;
          return parts.map(({ name, value }, index) => {
            const from = top;
            top += value;
            return value < 0.004 ? null : (
              <rect
                key={`${at}${name}`}
                x={percentOf(shareOf(at, across) + 0.15 / taken.length)}
                width={percentOf(0.7 / taken.length)}
                y={percentOf(from / highest)}
                height={percentOf(value / highest)}
                fill={fills[index]}
                className={strokes[index]}
                strokeWidth="1"
              />
            );
          });
        })}
      </svg>
    </div>
  );
}
