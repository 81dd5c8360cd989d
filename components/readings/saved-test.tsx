'use client';

import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { PhotosOf } from '@/components/photos/photos-of';
import { Button } from '@/components/ui/button';
import { buttonClass } from '@/components/ui/button-class';
import { StandingLine, VerdictFrame } from '@/components/ui/verdict-frame';
import { bold } from '@/components/week-sheet/bold';
import { SheetProvider, useSheet } from '@/components/week-sheet/sheet-context';
import { SheetStates } from '@/components/week-sheet/sheet-states';
import { useVerdictWords } from '@/components/week-sheet/use-verdict-words';
import { parseInstant } from '@/lib/calendar/wall-time';
import type { PlannedWeek } from '@/lib/client/readings';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import type { RecordedReading } from '@/lib/schemas/reading';
import { PlanChangeList } from './plan-change-list';
import { planChanges } from './plan-changes';
import { useReadingSetting } from './reading-setting';
import { useReadingWords } from './reading-words';
import { ShopPurchases } from './shop-purchases';
import { useTimeWords } from './use-time-words';

export type SavedTestProps = {
  reading: RecordedReading;
  /** Undefined when the new sheet could not be fetched. */
  week: PlannedWeek | undefined;
  /** The plan as it stood before; null when there was none. */
  before: readonly PlanDose[] | null;
  onCorrect: () => void;
  /** The question about zero, where it is still open. */
  children?: React.ReactNode;
};

/** After saving: the swim state first, then what changed in the plan. */
export function SavedTest({ reading, week, before, onCorrect, children }: SavedTestProps) {
  const t = useTranslations('readings.saved');
  const times = useTimeWords();
  const setting = useReadingSetting();
  const takenAt = parseInstant(reading.takenAt) ?? 0;
  const words = useReadingWords();
  const { measured, missing } = words(reading);
  const saved = (
    <header className="border-b-stop border-ink pb-2.5">
      <p className="font-display text-section">{t('title')}</p>
      <p className="text-small text-ink-2">
        {t('by', {
          when: times.dayAndTime(takenAt),
          name: reading.recordedBy ?? reading.doneBy ?? '',
          method: t(`method.${reading.method}`),
        })}
      </p>
    </header>
  );
  return (
    <div className="mx-auto grid max-w-reading gap-4 px-margin pt-3 pb-6">
      {week === undefined ? (
        <>
          {saved}
          <p role="status" className="text-body">
            {t('noSheet')}
          </p>
        </>
      ) : (
        <SheetProvider sheet={week.sheet} start={undefined}>
          <SavedVerdict />
          {saved}
          {children}
          <SheetStates onCorrect={onCorrect} />
          <Changes doses={week.doses} before={before} />
          {reading.method === 'slip' ? <ShopPurchases week={week} /> : null}
        </SheetProvider>
      )}
      <div className="border-t border-rule pt-3 text-body">
        <p>
          <span className="mr-1">{t.rich('entered', { values: measured, b: bold })}</span>
          {missing === '' ? null : <span>{t('missing', { names: missing })}</span>}
        </p>
        <Button variant="quiet" className="-ml-1.5" onClick={onCorrect}>
          {t('correct')}
        </Button>
        <div className="mt-1.5">
          <PhotosOf kind="strip" about={reading.id} setting={setting} />
        </div>
      </div>
      <div className="sticky bottom-tabs border-t border-ink bg-paper-lift py-3 md:static md:border-t-0 md:bg-transparent">
        <PageLink
          href="/week"
          className={buttonClass({ variant: 'primary', size: 'large', wide: true, className: 'md:w-auto' })}
        >
          {t('seeWeek')}
        </PageLink>
      </div>
    </div>
  );
}

function SavedVerdict() {
  const t = useTranslations('verdict');
  const { sheet } = useSheet();
  const { state, headline, reasons } = useVerdictWords();
  return (
    <VerdictFrame state={sheet.verdict.state} word={state} headline={headline}>
      {sheet.verdict.state === 'fine' ? (
        <>
          <StandingLine>{t.rich('standing', { b: bold })}</StandingLine>
          {sheet.verdict.adviseDailyCheck ? <p className="mt-1.5 text-small text-ink-2">{t('dailyCheck')}</p> : null}
        </>
      ) : (
        <ul className="grid gap-1">
          {reasons.map(({ code, words }) => (
            <li key={code}>{words}</li>
          ))}
        </ul>
      )}
    </VerdictFrame>
  );
}

function Changes({ doses, before }: { doses: readonly PlanDose[]; before: readonly PlanDose[] | null }) {
  const t = useTranslations('readings.saved');
  const { sheet, picture } = useSheet();
  if (sheet.plan === null) return null;
  const { changed, kept } = planChanges(before ?? [], doses, picture.now, sheet.household.timeZone);
  const first = before === null;
  const toBuy = doses.some((dose) => dose.status === 'planned' && dose.toBuy);
  return (
    <section className="border-t border-rule pt-3">
      <h2 className="font-display text-section">{t(first ? 'firstPlan' : 'changes')}</h2>
      <p className="text-body text-ink-2">
        {changed.length === 0
          ? t(kept === 0 ? 'nothingPlanned' : 'nothingChanged')
          : t(first ? 'firstCount' : 'changed', { count: changed.length, kept })}
      </p>
      <PlanChangeList changes={changed} first={first} />
      {toBuy ? null : <p className="border-t border-ink pt-3 text-body font-emphasis">{t('nothingToBuy')}</p>}
    </section>
  );
}
