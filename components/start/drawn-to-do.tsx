import { useTranslations } from 'next-intl';
import { ProductGlyph, type ProductForm } from './product-glyph';

type Task = { when?: string; what: string; note?: string; form?: ProductForm; quiet?: boolean };

/** The lane of what to do: one column a day under the curve on a desk, a row a day on a phone. */
export function DrawnToDo({ days }: { days: readonly string[] }) {
  const t = useTranslations('start.reading');
  const nothing: Task = { what: t('nothing'), note: t('nothingNote'), quiet: true };
  const granules: Task = { when: t('lastLight'), what: t('granules'), form: 'granules' };
  const tasks: readonly Task[] = [
    { when: t('morning'), what: t('tablets'), note: t('inFeeder'), form: 'tablets' },
    nothing,
    granules,
    nothing,
    granules,
    { when: t('beforeSwim'), what: t('quickCheck'), note: t('checkNote') },
    { when: t('evening'), what: t('fullTest'), note: t('fullTestNote') },
  ];
  return (
    <>
      <p className="border-t-todo border-ink pt-3 md:border-b md:border-b-ink">
        <b className="block font-display text-name">{t('doList')}</b>
        <span className="mt-0.5 block pr-3 text-fine text-ink-2">{t('doListNote')}</span>
      </p>
      <ol className="border-b border-ink md:grid md:grid-cols-7 md:border-t-todo">
        {tasks.map((task, index) => (
          <li
            key={days[index]}
            className="grid grid-cols-[7.25rem_1fr] items-baseline border-t border-rule py-2.5 text-small first:border-t-0 md:block md:border-t-0 md:border-l md:py-3 md:pr-1.5 md:pl-2.5"
          >
            <span className="font-display text-name md:sr-only">{days[index]}</span>
            <span className="min-w-0">
              {task.when === undefined ? null : <span className="block text-fine text-ink-2">{task.when}</span>}
              <b
                className={
                  task.quiet
                    ? 'block font-emphasis'
                    : 'flex items-center gap-1.5 font-display text-name lg:text-[20px] lg:leading-6'
                }
              >
                {task.form === undefined ? null : <ProductGlyph form={task.form} className="size-4" />}
                {task.what}
              </b>
              {task.note === undefined ? null : <span className="block text-fine text-ink-2">{task.note}</span>}
            </span>
          </li>
        ))}
      </ol>
    </>
  );
}
