import { OctagonAlert } from 'lucide-react';
import { useTranslations } from 'next-intl';

/** The one thing that has no steps: go. */
export function LeaveFrame() {
  const t = useTranslations('help.emergency.leave');
  return (
    <div className="relative break-inside-avoid border-stop border-terra-ink bg-paper-lift py-3 pr-3.5 pl-8.5 text-body before:absolute before:inset-y-0 before:left-0 before:w-4.25 before:bg-hatch-stop">
      <p className="flex items-center gap-2 font-severity text-terra-ink">
        <OctagonAlert aria-hidden="true" className="size-5.25 shrink-0" />
        {t('when')}
      </p>
      <p className="my-0.5 font-display text-[23px] leading-[27px] font-headline">{t('title')}</p>
      <p>{t('words')}</p>
    </div>
  );
}
