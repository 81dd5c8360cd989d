'use client';

import { useTranslations } from 'next-intl';
import { useEffect, useRef, useState } from 'react';
import { textLink } from '@/components/ui/text-link';
import { useSampleWeek } from '@/lib/client/sample-week/use-sample-week';
import { isSameWater, type SampleWater, type SampleWeek, startingSample } from '@/lib/schemas/sample-water';
import type { UnitSystem } from '@/lib/units/unit';
import { SampleAnswer } from './sample-answer';
import { SampleControls } from './sample-controls';
import { SampleLayout } from './sample-layout';
import { SampleSheet } from './sample-sheet';

export type LiveSampleProps = {
  start: SampleWeek | undefined;
  unitSystem: UnitSystem;
  /** Where the sliders stood when this took their place, and the one that was being moved. */
  begin: { water: SampleWater; moved: string | undefined };
};

/** The sheet that follows the sliders. */
export default function LiveSample({ start, unitSystem, begin }: LiveSampleProps) {
  const t = useTranslations('start.sample');
  const [water, setWater] = useState(begin.water);
  const { week, waiting, failed } = useSampleWeek(water, start);
  const frame = useRef<HTMLDivElement>(null);
  useEffect(() => {
    if (begin.moved !== undefined) frame.current?.querySelector<HTMLElement>(`[name="${begin.moved}"]`)?.focus();
  }, [begin.moved]);
  const moved = !isSameWater(water, startingSample);
  return (
    <div ref={frame}>
      <SampleLayout
        controls={<SampleControls water={water} unitSystem={unitSystem} onChange={setWater} />}
        answer={
          <>
            <div role="status" aria-busy={waiting}>
              {failed ? <p className="text-body">{t('failed')}</p> : null}
              {week === undefined || failed ? null : <SampleAnswer week={week} unitSystem={unitSystem} />}
              {week === undefined && !failed ? <p className="text-body">{t('working')}</p> : null}
            </div>
            {moved ? (
              <button
                type="button"
                className={`mt-1 inline-flex min-h-11 cursor-pointer items-center text-body ${textLink}`}
                onClick={() => setWater(startingSample)}
              >
                {t('putBack')}
              </button>
            ) : null}
          </>
        }
        sheet={
          week === undefined || failed ? null : (
            <SampleSheet week={week} before={moved ? start : undefined} unitSystem={unitSystem} />
          )
        }
      />
    </div>
  );
}
