'use client';

import { useTranslations } from 'next-intl';
import { useIsPhone } from '@/components/week-sheet/use-is-phone';
import type { OpenSituation, SituationKind, Situations } from '@/lib/schemas/situation';
import { Answered } from './answered';
import { Cautions } from './cautions';
import { useHousehold } from './situation-context';
import { SituationEnd } from './situation-end';
import { everyDay } from './step-days';
import { StepList } from './step-list';
import { TreatmentSheet } from './treatment-sheet';
import { TreatmentTables } from './treatment-tables';
import { instantOf } from './use-situation-times';

/** Kinds in which chlorine is raised and read again. */
const charted: readonly SituationKind[] = ['clearing', 'combined-chlorine', 'quick-raise', 'accident'];

type Props = { open: OpenSituation; situations: Situations; onEnded: () => void };

/** A procedure: cautions, the way it leads, free chlorine and mornings, steps by day, and how it ends. */
export function OpenSituationView({ open, situations: { now: iso, chart }, onEnded }: Props) {
  const t = useTranslations('situations.chart');
  const { timeZone } = useHousehold();
  const isPhone = useIsPhone();
  const now = instantOf(iso);
  const days = charted.includes(open.situation.kind) ? everyDay(open, now, timeZone) : [];
  const drawn = chart !== null && days.length > 0;
  const columns = drawn && isPhone === false;
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] gap-4">
      <Cautions cautions={open.procedure.cautions} />
      <Answered open={open} />
      {drawn && (
        <div>
          <TreatmentSheet open={open} chart={chart} days={days} now={now} withSteps={columns} />
          <TreatmentTables open={open} chart={chart} now={now} until={days.at(-1)?.to ?? now} />
        </div>
      )}
      {!columns && <StepList open={open} now={now} />}
      <SituationEnd open={open} onEnded={onEnded} />
      {drawn && <p className="text-fine text-ink-2">{t('colophon')}</p>}
    </div>
  );
}
