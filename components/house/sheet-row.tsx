import { useTranslations } from 'next-intl';

/** One line of a list of names and what stands for them. What nobody wrote down can be written on paper. */
export function SheetRow({ name, children }: { name: string; children: React.ReactNode }) {
  const t = useTranslations('house.sheet');
  return (
    <div className="grid grid-cols-[7.5rem_1fr] items-baseline gap-x-3 py-1 text-body print:grid-cols-[6.5rem_1fr] print:py-0.5">
      <dt className="text-ink-2">{name}</dt>
      <dd className="min-w-0 font-strong break-words">
        {children ?? (
          <>
            <span className="font-text text-ink-2 print:hidden">{t('missing')}</span>
            <span aria-hidden="true" className="hidden h-4 border-b border-ink print:block" />
          </>
        )}
      </dd>
    </div>
  );
}
