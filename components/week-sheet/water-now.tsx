'use client';

import { ChartSpline, Clock } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { waterAt } from '@/components/charts/water-curve';
import { ageOf } from '@/lib/calendar/age';
import { bold } from './bold';
import { type Check, nextCheck } from './checks';
import { capitalised } from './capitalised';
import { useSheet } from './sheet-context';
import { instantOf } from './sheet-times';
import { useTimes } from './use-times';
import { useUnits } from './use-units';

/** What is known of the water at this moment: level, likely range, age of the last reading. Framed, it is the smaller print. */
export function WaterNow({ framed = false, children }: { framed?: boolean; children?: React.ReactNode }) {
  const { sheet, picture } = useSheet();
  const water = waterAt(picture.points, picture.now);
  return (
    <>
      {water && <Level framed={framed} />}
      {/* On a phone the standing line comes before the likely range, on a desk after it. */}
      <div className="flex flex-col md:flex-col-reverse">
        {children}
        <div className="mt-3 grid gap-1 text-small text-ink-2 md:mt-1.5 md:flex md:flex-wrap md:gap-x-5.5">
          {water && <LikelyRange />}
          <LastReading reading={sheet.lastReading} />
        </div>
      </div>
    </>
  );
}

function Level({ framed }: { framed: boolean }) {
  const t = useTranslations('week.water');
  const { sheet, picture } = useSheet();
  const units = useUnits();
  const { pool } = sheet;
  const water = waterAt(picture.points, picture.now);
  if (water === undefined) return null;
  const level = water.freeChlorine.middle;
  const side = level < water.lowestLevel ? 'under' : level > water.swimLimit ? 'over' : 'between';
  const setBy = pool.swimLimitSetBy === null ? t('label') : t('person', { name: pool.swimLimitSetBy });
  const check = nextCheck(sheet.checks);
  return (
    <p className={framed ? 'mt-1.5 text-body text-pretty' : 'mt-1.5 font-display text-lead text-pretty md:mt-0'}>
      {t(side, {
        value: units.quantity(level, 'freeChlorine'),
        lowest: units.figure(water.lowestLevel, 'freeChlorine'),
        limit: units.number(water.swimLimit),
        setBy,
      })}
      {check && sheet.verdict.state === 'fine' && <CheckWanted check={check} />}
    </p>
  );
}

function CheckWanted({ check: { at, kind } }: { check: Check }) {
  const t = useTranslations('week.water');
  const { picture } = useSheet();
  const times = useTimes();
  const instant = instantOf(at);
  const when = times.partAt(instant);
  const sentence =
    instant < picture.now
      ? t(kind === 'full' ? 'openFull' : 'openQuick', { when })
      : t(kind === 'full' ? 'wantsFull' : 'wantsQuick', { when: capitalised(when) });
  return <> {sentence}</>;
}

function LikelyRange() {
  const t = useTranslations('week.water');
  const { picture } = useSheet();
  const units = useUnits();
  const likely = waterAt(picture.points, picture.now)?.freeChlorine;
  if (likely === undefined) return null;
  return (
    <p className="flex gap-2.5">
      <ChartSpline aria-hidden="true" className="mt-px size-4.5 shrink-0 md:hidden" />
      <span>
        {t.rich('likely', {
          low: units.figure(likely.low, 'freeChlorine'),
          high: units.figure(likely.high, 'freeChlorine'),
          b: bold,
        })}
      </span>
    </p>
  );
}

function LastReading({ reading }: { reading: ReturnType<typeof useSheet>['sheet']['lastReading'] }) {
  const t = useTranslations('week');
  const { picture } = useSheet();
  const age = reading && ageOf(instantOf(reading.takenAt), picture.now);
  return (
    <p className="flex gap-2.5">
      <Clock aria-hidden="true" className="mt-px size-4.5 shrink-0 md:hidden" />
      <span>
        {age
          ? t.rich('water.lastReading', {
              age: t(`water.ago.${age.unit}`, { count: age.count }),
              method: t(`method.${reading.method}`),
              by: reading.doneBy ?? 'none',
              b: bold,
            })
          : t.rich('water.noReading', { b: bold })}
      </span>
    </p>
  );
}
