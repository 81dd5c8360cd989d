'use client';

import { useTranslations } from 'next-intl';
import { xOf } from '@/components/charts/time-axis';
import { highAndLowOf } from '@/components/week-sheet/high-and-low';
import { useSheet } from '@/components/week-sheet/sheet-context';
import { hourMarksOf, type SheetDay } from '@/components/week-sheet/sheet-times';
import { useTimes } from '@/components/week-sheet/use-times';
import { useUnits } from '@/components/week-sheet/use-units';
import { dayHeading } from '@/lib/calendar/format';
import { laneTop, PLOT } from './paper-size';

const HOUR = 3_600_000;
/** Below this share of the reference sun a stroke would be a speck. */
const SPECK = 0.03;
const TALLEST = 24;
const SMALL = 11.5;

/** A day's column in the lanes: its name and hours, its sun, its high and low water. */
export function PaperDay({ day }: { day: SheetDay }) {
  const { sheet, picture } = useSheet();
  const { timeZone, locale } = sheet.household;
  const t = useTranslations('week.lane');
  const units = useUnits();
  const x = (instant: number) => xOf(picture.axis, PLOT, instant);
  const left = x(day.from) + 5;
  const hourWords = { '06': t('six'), '12': t('noon'), '18': t('eighteen') };
  return (
    <g>
      <text x={left} y="15" fontSize="14" className="fill-ink font-display font-headline">
        {dayHeading(day.day, locale)}
      </text>
      {hourMarksOf(day, timeZone).map(({ hour, at }) => (
        <g key={hour}>
          <path fill="none" d={`M${x(at)} ${laneTop.sun - 4}v4`} className="stroke-ink" strokeWidth="0.8" />
          <text x={x(at)} y={laneTop.sun - 6} fontSize={SMALL} textAnchor="middle" className="fill-ink">
            {hourWords[hour]}
          </text>
        </g>
      ))}
      {day.sun.map((share, hour) =>
        share < SPECK ? null : (
          <path
            fill="none"
            key={hour}
            d={`M${x(day.from + (hour + 0.5) * HOUR)} ${laneTop.chlorine - 3}v${-share * TALLEST}`}
            className="stroke-ink"
            strokeWidth="1.3"
          />
        ),
      )}
      <text
        x={left}
        y={laneTop.sun + 11}
        fontSize={SMALL}
        className="fill-ink stroke-paper [paint-order:stroke] [stroke-width:3px]"
      >
        {t('fullSun', {
          hours: units.number(
            day.sun.reduce((sum, share) => sum + share, 0),
            1,
          ),
        })}
      </text>
      <HighAndLow day={day} left={left} />
    </g>
  );
}

function HighAndLow({ day, left }: { day: SheetDay; left: number }) {
  const t = useTranslations('week.lane');
  const { sheet, picture } = useSheet();
  const times = useTimes();
  const units = useUnits();
  const extremes = highAndLowOf(day, picture.points, sheet.household.timeZone);
  if (extremes === undefined)
    return (
      <text x={left} y={laneTop.highLow + 20} fontSize={SMALL} className="fill-ink">
        {t('noHighLow')}
      </text>
    );
  return (['high', 'low'] as const).map((which, index) => (
    <text key={which} x={left} y={laneTop.highLow + 13 + index * 14} fontSize={SMALL} className="fill-ink">
      <tspan className="font-strong">{units.figure(extremes[which].value, 'freeChlorine')}</tspan>
      <tspan dx="5">{times.partShort(extremes[which].part)}</tspan>
    </text>
  ));
}
