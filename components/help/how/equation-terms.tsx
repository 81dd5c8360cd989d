import { useTranslations } from 'next-intl';
import type { Equation } from './equations';
import { Typeset } from './typeset';

/** An equation read across in words, with its symbols under them; on a phone it is read downwards. */
export function EquationTerms({ equation, name }: { equation: Equation; name: string }) {
  const t = useTranslations('how');
  return (
    <section
      aria-label={name}
      className="border-b border-rule-2 md:grid md:grid-cols-[110px_minmax(0,1fr)] md:grid-rows-[1fr_auto]"
    >
      <div className="hidden md:row-span-2 md:grid md:grid-rows-subgrid">
        <p className="py-3">
          <b className="block font-display text-name">{t('inWords')}</b>
          <span className="text-small text-ink-2">{t('readAcross')}</span>
        </p>
        <p className="border-t border-rule py-3 font-display text-name">{t('inSymbols')}</p>
      </div>
      <ol className="py-1 md:row-span-2 md:grid md:auto-cols-auto md:grid-flow-col md:grid-rows-subgrid md:py-0">
        {equation.terms.map(({ sign, word, symbol }, index) => (
          <li
            key={index}
            className="grid grid-cols-[22px_minmax(0,1fr)_minmax(0,1.2fr)] items-baseline gap-x-2 border-t border-rule py-2.5 first:border-t-0 md:relative md:row-span-2 md:grid-cols-1 md:grid-rows-subgrid md:gap-0 md:border-t-0 md:border-l md:py-0 md:first:border-l-0"
          >
            <span
              className={
                sign === undefined
                  ? 'md:hidden'
                  : 'font-display text-name md:absolute md:top-2.5 md:-left-[9px] md:bg-paper md:px-1'
              }
            >
              {sign}
            </span>
            <span className="font-display text-name md:px-3 md:py-3">{t(`term.${word}`)}</span>
            <span className="text-section md:border-t md:border-rule md:px-3 md:py-3">
              <Typeset notation={symbol} />
            </span>
          </li>
        ))}
      </ol>
      {equation.further === undefined ? null : (
        <>
          <p className="hidden border-t border-rule py-3 font-display text-name md:block">{t('further')}</p>
          <ul className="flex flex-wrap gap-x-8 gap-y-1 border-t border-rule py-3 text-section md:px-3">
            {equation.further.map((notation) => (
              <li key={notation}>
                <Typeset notation={notation} />
              </li>
            ))}
          </ul>
        </>
      )}
    </section>
  );
}
