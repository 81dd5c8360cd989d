'use client';

import { useTranslations } from 'next-intl';
import { Skeleton } from '@/components/ui/skeleton';
import type { SituationKind, Situations } from '@/lib/schemas/situation';
import { cautionsBefore } from '@/lib/client/cautions-before';
import { BeginSituation } from './begin-situation';
import { Cautions } from './cautions';

type Props = {
  kind: SituationKind;
  /** Undefined while they are fetched; the cautions do not wait for them. */
  situations: Situations | undefined;
  loading: boolean;
};

/** A kind that is not open: what protects first, then its questions, then the button that begins it. */
export function ClosedSituation({ kind, situations, loading }: Props) {
  const t = useTranslations('situations');
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] gap-4">
      <Cautions cautions={cautionsBefore(kind)} />
      <p className="max-w-reading text-pretty">{t(`about.${kind}`)}</p>
      {situations ? (
        // Over and begun again, it is another one.
        <BeginSituation key={situations.past[0]?.id ?? 'first'} kind={kind} open={situations.open} />
      ) : loading ? (
        <Skeleton label={t('loading')} className="h-40" />
      ) : null}
    </div>
  );
}
