import { useTranslations } from 'next-intl';
import { ProductGlyph } from '@/components/charts/product-glyph';
import type { SampleWeek } from '@/lib/schemas/sample-water';
import type { UnitSystem } from '@/lib/units/unit';
import { dayOf, glyphs, weekDays } from './sample-drawing';
import { useSampleWords } from './use-sample-words';

/** The day of the next full test. */
const SUNDAY = 6;

/** The lane of what to do: one column a day under the curve on a desk, a row a day on a phone. */
export function SampleToDo({ week, unitSystem }: { week: SampleWeek; unitSystem: UnitSystem }) {
  const t = useTranslations('start.sample');
  const words = useSampleWords(unitSystem);
  return (
    <>
      <p className="border-t-todo border-ink pt-3 md:border-b md:border-b-ink">
        <b className="block font-display text-name">{t('doList')}</b>
        <span className="mt-0.5 block pr-3 text-fine text-ink-2">{t('doListNote')}</span>
      </p>
      <ol className="border-b border-ink md:grid md:grid-cols-7 md:border-t-todo">
        {weekDays.map((day) => {
          const doses = week.doses.filter(({ hour }) => dayOf(hour) === day);
          const checked = week.quickChecks.some((hour) => dayOf(hour) === day);
          const quiet = doses.length === 0 && !checked && day !== SUNDAY;
          return (
            <li
              key={day}
              className={`grid-cols-[7.25rem_1fr] items-baseline border-t border-rule py-2.5 text-small first:border-t-0 md:block md:border-t-0 md:border-l md:py-3 md:pr-1.5 md:pl-2.5 ${quiet ? 'hidden' : 'grid'}`}
            >
              <span className="font-display text-name md:sr-only">{words.days[day]}</span>
              <div className="grid min-w-0 gap-2.5">
                {quiet ? <Item what={t('nothing')} note={t('nothingNote')} quiet /> : null}
                {checked ? <Item when={t('beforeSwim')} what={t('quickCheck')} quiet /> : null}
                {doses.map((dose) => (
                  <Item
                    key={dose.form}
                    when={t('lastLight')}
                    glyph={<ProductGlyph mark={glyphs[dose.form]} />}
                    what={words.amount(dose)}
                    note={words.product(dose)}
                  />
                ))}
                {day === SUNDAY ? <Item when={t('evening')} what={t('fullTest')} note={t('fullTestNote')} /> : null}
              </div>
            </li>
          );
        })}
      </ol>
    </>
  );
}

type ItemProps = { when?: string; what: string; note?: string; glyph?: React.ReactNode; quiet?: boolean };

function Item({ when, what, note, glyph, quiet = false }: ItemProps) {
  return (
    <p>
      {when === undefined ? null : <span className="block text-fine text-ink-2">{when}</span>}
      <b
        className={quiet ? 'block font-emphasis' : 'flex items-center gap-1.5 font-display text-name lg:text-[20px]/6'}
      >
        {glyph}
        {what}
      </b>
      {note === undefined ? null : <span className="block text-fine text-ink-2">{note}</span>}
    </p>
  );
}
