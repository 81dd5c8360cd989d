'use client';

import { useTranslations } from 'next-intl';
import { isOn, shareOf } from '@/components/charts/time-axis';
import { Lane, Nights, NowRule, placeOf } from './lane';
import { LaneName } from './lane-name';
import { useSheet } from './sheet-context';
import type { SheetDay } from './sheet-times';
import { SunBars } from './sun-bars';
import { SwimmerHeads } from './swimmer-heads';
import { useUnits } from './use-units';

/** The line on which the sun bars stand, from the top of the lane [px]. */
const BASE = 47;

/** Sun on the water hour by hour, rain, and who is expected in it. */
export function SunLane() {
  const t = useTranslations('week');
  const { picture } = useSheet();
  const { axis, days, nights, now } = picture;
  const today = days.find(({ from, to }) => now >= from && now < to);
  return (
    <Lane name="sun" gutter={<LaneName name={t('lane.sun')} note={t('lane.sunUnit')} />}>
      <Nights axis={axis} nights={nights} />
      <div role="img" aria-label={t('chart.sunLabel')}>
        {days.map((day) => (
          <DayOfSun key={day.day} day={day} />
        ))}
        <div className="absolute inset-x-0 border-t border-rule-2" style={{ top: BASE }} />
        {isOn(axis, now) && <NowRule left={shareOf(axis, now)} top={belowWords(now, today)} />}
      </div>
    </Lane>
  );
}

const HOUR = 3_600_000;
/** How far into a day its hours of sun are written, and from when on its rain [h]. */
const WORDS_END = 9;
const RAIN_BEGINS = 13;
/** Under those words [px]. */
const WORDS_FOOT = 22;

/** Where the line of now begins: under the words of the day where it would cross them. */
export function belowWords(now: number, day: SheetDay | undefined): number {
  if (day === undefined) return 0;
  const hours = (now - day.from) / HOUR;
  return hours < WORDS_END || (day.rain >= 0.5 && hours > RAIN_BEGINS) ? WORDS_FOOT : 0;
}

function DayOfSun({ day }: { day: SheetDay }) {
  const t = useTranslations('week.lane');
  const { picture } = useSheet();
  const units = useUnits();
  const fullSun = day.sun.reduce((sum, share) => sum + share, 0);
  return (
    <div className="absolute inset-y-0" style={placeOf(picture.axis, day)}>
      <SunBars day={day} base={BASE} tallest={36} width={2.4} />
      <span className="absolute top-1.5 left-2.25 text-figure text-ink-2">
        {t('fullSun', { hours: units.number(fullSun, 1) })}
      </span>
      {day.rain >= 0.5 && (
        <span className="absolute top-1.5 right-2.25 text-figure text-ink-2">
          {t('rain', { amount: units.rain(day.rain) })}
        </span>
      )}
      <SwimmerHeads day={day} top={BASE} />
    </div>
  );
}
