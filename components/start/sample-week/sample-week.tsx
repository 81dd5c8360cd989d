import { useTranslations } from 'next-intl';
import { type SampleWeek as Week, startingSample } from '@/lib/schemas/sample-water';
import type { UnitSystem } from '@/lib/units/unit';
import { SampleAnswer } from './sample-answer';
import { SampleControls } from './sample-controls';
import { SampleLayout } from './sample-layout';
import { SampleSheet } from './sample-sheet';
import { SampleSlot } from './sample-slot';

/** A week sheet to try, before there is a pool: drawn by the server, and by the browser as soon as somebody moves something. */
export function SampleWeek({ week, unitSystem }: { week: Week | undefined; unitSystem: UnitSystem }) {
  const t = useTranslations('start.sample');
  return (
    <SampleSlot start={week} unitSystem={unitSystem}>
      <SampleLayout
        controls={
          <div>
            <SampleControls water={startingSample} unitSystem={unitSystem} />
            <noscript>
              <p className="text-small text-ink-2">
                {t('noScripts', { volume: startingSample.volume, sunshine: startingSample.sunshine })}
              </p>
            </noscript>
          </div>
        }
        answer={week === undefined ? t('working') : <SampleAnswer week={week} unitSystem={unitSystem} />}
        sheet={week === undefined ? null : <SampleSheet week={week} unitSystem={unitSystem} />}
      />
    </SampleSlot>
  );
}
