'use client';

import { useTranslations } from 'next-intl';
import { useId } from 'react';
import type { ClearDay, HourSpan } from '@/lib/client/clear-day';
import { Engravings } from './drawing/engravings';
import { px } from './drawing/outline-path';
import { hourText } from './hours';
import { usePoolSetting } from './setting';
import { Span } from './span';

const height = 96;

/** How strong the sun is through a clear midsummer day, and between which hours it reaches the water. */
export function SunHours({
  day,
  span,
  onChange,
}: {
  /** Undefined while the place is not known. */
  day: ClearDay | undefined;
  span: HourSpan;
  onChange: (span: HourSpan) => void;
}) {
  const t = useTranslations('pool.sun');
  const { locale } = usePoolSetting();
  const id = useId();
  const strongest = Math.max(...(day ?? [1]));
  return (
    <Span
      from={span.from}
      to={span.to}
      step={0.5}
      onChange={(end, hour) => {
        // The two ends keep half an hour between them.
        const next = { ...span, [end]: hour };
        if (next.to - next.from >= 0.5) onChange(next);
      }}
      labels={{ from: t('sunFrom'), to: t('sunTo') }}
      write={(hour) => hourText(hour, locale)}
      words={t('hours', { hours: hoursText(span) })}
      midnight={t('midnight')}
      above={height}
    >
      {(place) => (
        <>
          <Engravings id={id} />
          {[
            [0, span.from],
            [span.to, 24],
          ].map(([from = 0, to = 0]) => (
            <rect
              key={from}
              x={px(place(from))}
              y="4"
              width={px(place(to) - place(from))}
              height={height - 4}
              fill={`url(#${id}-hatch)`}
              opacity="0.22"
            />
          ))}
          {day?.map((weight, index) => {
            const hour = index / 4 + 0.125;
            if (index % 2 === 1 || weight < strongest / 60) return null;
            const lit = hour >= span.from && hour < span.to;
            return (
              <path
                key={hour}
                d={`M${px(place(hour + 0.125))} ${height}v${px((-weight / strongest) * (height - 16))}`}
                className="fill-none stroke-ink"
                strokeWidth={lit ? 5 : 1.4}
                opacity={lit ? 0.82 : 0.6}
              />
            );
          })}
        </>
      )}
    </Span>
  );
}

/** Whole hours, or a half: half-hour steps have no other. */
export function hoursText({ from, to }: HourSpan): string {
  const hours = to - from;
  return Number.isInteger(hours) ? `${hours}` : `${Math.floor(hours)}½`;
}
