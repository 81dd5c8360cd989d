'use client';

import { useTranslations } from 'next-intl';
import { chlorineWeekAxis } from '@/components/charts/lane-axes';
import { PaperChlorine } from '@/components/charts/paper-chlorine';
import { NIGHT, PaperPatterns } from '@/components/charts/paper-patterns';
import { ChartPatterns } from '@/components/charts/patterns';
import { isOn, xOf } from '@/components/charts/time-axis';
import { ticksOf, type ValueAxis, yOf } from '@/components/charts/value-axis';
import { chartDoses, chartTests } from '@/components/week-sheet/chart-input';
import { useSheet } from '@/components/week-sheet/sheet-context';
import { useChlorinePhrases } from '@/components/week-sheet/use-chart-phrases';
import { useDoseWords } from '@/components/week-sheet/use-dose-words';
import { useTimes } from '@/components/week-sheet/use-times';
import { useUnits } from '@/components/week-sheet/use-units';
import { PaperDay } from './paper-day';
import { usePaper } from './paper-context';
import { GUTTER, laneTop, PLOT, WHOLE } from './paper-size';

/** The lanes of the week: hours, sun, free chlorine between its limits, high and low of each day. */
export function PaperLanes() {
  const { sheet, picture } = useSheet();
  const { state, mayAdd } = usePaper();
  const { label } = useChlorinePhrases();
  const { axis, days, nights, now, points } = picture;
  const tests = chartTests(sheet.readings, 'freeChlorine');
  const measured = tests.map(({ value, between }) => between?.high ?? value);
  const value = chlorineWeekAxis(points, sheet.pool.swimLimit, measured, laneTop.highLow - laneTop.chlorine);
  const endsAt = 'end' in state && mayAdd ? state.end.at : undefined;
  const x = (instant: number) => xOf(axis, PLOT, instant);
  return (
    <>
      <ChartPatterns />
      <svg width={GUTTER + PLOT} height={WHOLE} viewBox={`0 0 ${GUTTER + PLOT} ${WHOLE}`} role="img" aria-label={label}>
        <PaperPatterns />
        <Gutter value={value} />
        <g transform={`translate(${GUTTER} 0)`}>
          {nights.map(({ from, to }) => (
            <rect
              key={from}
              x={x(from)}
              y={laneTop.sun}
              width={x(to) - x(from)}
              height={laneTop.highLow - laneTop.sun}
              fill={NIGHT}
            />
          ))}
          {[axis.from, ...days.map(({ to }) => to)].map((at) => (
            <path fill="none" key={at} d={`M${x(at)} 4V${WHOLE}`} className="stroke-ink" strokeWidth="0.5" />
          ))}
          {days.map((day) => (
            <PaperDay key={day.day} day={day} />
          ))}
          <g transform={`translate(0 ${laneTop.chlorine})`}>
            <Chlorine value={value} tests={tests} endsAt={endsAt} />
          </g>
          {isOn(axis, now) && (
            <path
              fill="none"
              d={`M${x(now)} ${laneTop.sun}V${laneTop.highLow}`}
              className="stroke-ink"
              strokeWidth="1.2"
            />
          )}
          {endsAt !== undefined && isOn(axis, endsAt) && (
            <path
              fill="none"
              d={`M${x(endsAt)} ${laneTop.sun}V${laneTop.highLow}`}
              className="stroke-ink"
              strokeWidth="2.2"
              strokeDasharray="7 4"
            />
          )}
        </g>
        {[laneTop.sun, laneTop.chlorine, laneTop.highLow].map((top) => (
          <path fill="none" key={top} d={`M0 ${top}H${GUTTER + PLOT}`} className="stroke-ink" strokeWidth="0.8" />
        ))}
      </svg>
    </>
  );
}

function Chlorine({
  value,
  tests,
  endsAt,
}: {
  value: ValueAxis;
  tests: ReturnType<typeof chartTests>;
  endsAt: number | undefined;
}) {
  const t = useTranslations('week-print.chart');
  const { sheet, picture } = useSheet();
  const { mayAdd } = usePaper();
  const { phrases } = useChlorinePhrases();
  const words = useDoseWords();
  const times = useTimes();
  const units = useUnits();
  const { swimLimit, swimLimitSetBy } = sheet.pool;
  const limit = units.number(swimLimit);
  const shown = sheet.doses.filter(({ status }) => mayAdd || status !== 'planned');
  return (
    <PaperChlorine
      ground={{ axis: picture.axis, width: PLOT, value }}
      points={picture.points}
      now={picture.now}
      limits={picture.swimLimits}
      swimLimit={swimLimit}
      swimHours={picture.swimHours}
      doses={chartDoses(shown, words)}
      tests={tests}
      planEndsAt={picture.planEndsAt}
      endsAt={endsAt}
      phrases={{
        limit: [
          swimLimitSetBy === null ? t('limit', { limit }) : t('limitPerson', { limit, name: swimLimitSetBy }),
          t('limitNote'),
        ],
        lowest: phrases.lowest,
        tests: phrases.tests,
        likely: t('likely'),
        made: t('made', { time: times.clock(picture.now) }),
        end: [t('end1'), t('end2')],
      }}
    />
  );
}

/** Names of the lanes, and the figures of free chlorine. */
function Gutter({ value }: { value: ValueAxis }) {
  const t = useTranslations('week-print.lane');
  const units = useUnits();
  const name = (top: number, words: string) => (
    <text x="0" y={top + 15} fontSize="14" className="fill-ink font-display font-headline">
      {words}
    </text>
  );
  const note = (top: number, words: string) => (
    <text x="0" y={top} fontSize="11.5" className="fill-ink">
      {words}
    </text>
  );
  return (
    <>
      {name(laneTop.sun, t('sun'))}
      {note(laneTop.sun + 29, t('sunUnit'))}
      {name(laneTop.chlorine + 2, t('free'))}
      {name(laneTop.chlorine + 18, t('chlorine'))}
      {note(laneTop.chlorine + 47, units.unitOf('freeChlorine'))}
      {note(laneTop.highLow + 13, t('high'))}
      {note(laneTop.highLow + 27, t('low'))}
      {ticksOf(value).map((level) => (
        <text
          key={level}
          x={GUTTER - 6}
          y={laneTop.chlorine + yOf(value, level) + 4}
          fontSize="11.5"
          textAnchor="end"
          className="fill-ink"
        >
          {units.number(level)}
        </text>
      ))}
    </>
  );
}
