import { useTranslations } from 'next-intl';
import { FormsFigure } from './forms-figure';
import { RangeFigure } from './range-figure';
import { TestFigure } from './test-figure';

/** Why it works this way: the weekly test, the mix of three, the honest range. */
export function ThreeReasons() {
  const t = useTranslations('start.why');
  const reasons = [
    { title: t('testTitle'), words: t('testWords'), figure: <TestFigure /> },
    { title: t('mixTitle'), words: t('mixWords'), figure: <FormsFigure /> },
    { title: t('rangeTitle'), words: t('rangeWords'), figure: <RangeFigure /> },
  ];
  return (
    <div className="mt-8 grid border-t-todo border-ink md:mt-11 md:grid-cols-3">
      {reasons.map(({ title, words, figure }) => (
        <section
          key={title}
          className="grid content-start border-b border-rule-2 py-5 last:border-b-0 md:grid-rows-[auto_1fr_auto] md:border-b-0 md:border-l md:border-rule md:px-7 md:pt-5.5 md:pb-8 md:first:border-l-0 md:first:pl-0 md:last:pr-0"
        >
          <h2 className="font-display text-[22px] leading-[27px] font-section">{title}</h2>
          <p className="mt-1.5 text-[16px] leading-[23px] text-pretty md:text-[15.5px]">{words}</p>
          <div className="mt-4 md:mt-5">{figure}</div>
        </section>
      ))}
    </div>
  );
}
