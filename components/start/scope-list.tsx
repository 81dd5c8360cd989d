import { Check, Minus, X } from 'lucide-react';
import { useTranslations } from 'next-intl';

type Answer = 'all' | 'part' | 'none';

/** In the order of care.md 1: what is made for it first, what is the wrong tool last. */
const pools = [
  { pool: 'chlorine', answer: 'all' },
  { pool: 'ozone', answer: 'all' },
  { pool: 'salt', answer: 'part' },
  { pool: 'small', answer: 'part' },
  { pool: 'plaster', answer: 'none' },
  { pool: 'otherSystem', answer: 'none' },
  { pool: 'indoor', answer: 'none' },
  { pool: 'spa', answer: 'none' },
  { pool: 'tiny', answer: 'none' },
  { pool: 'shared', answer: 'none' },
  { pool: 'natural', answer: 'none' },
] as const;

const signs: Record<Answer, React.ReactNode> = {
  all: <Check aria-hidden="true" className="mt-px size-5 shrink-0" />,
  part: <Minus aria-hidden="true" className="mt-px size-5 shrink-0" />,
  none: <X aria-hidden="true" className="mt-px size-5 shrink-0" />,
};

export const scopeAnchor = 'for-your-pool';

/** Which pools the sheet is for. The words answer; the sign before them only repeats it. */
export function ScopeList() {
  const t = useTranslations('start.scope');
  return (
    <section id={scopeAnchor} aria-labelledby="scope-title" className="border-t-todo border-ink pt-5 pb-6">
      <div className="md:grid md:grid-cols-[1fr_2fr] md:gap-7">
        <div>
          <h2 id="scope-title" className="font-display text-[22px] leading-[27px] font-section">
            {t('title')}
          </h2>
          <p className="mt-1.5 max-w-reading text-[16px] leading-[23px] text-pretty md:text-[15.5px]">{t('lead')}</p>
        </div>
        <dl className="mt-4 border-t border-ink text-body md:mt-0">
          {pools.map(({ pool, answer }) => (
            <div key={pool} className="border-b border-rule py-2.5 sm:grid sm:grid-cols-[2fr_3fr] sm:gap-4">
              <dt className="font-strong">{t(pool)}</dt>
              <dd className="mt-0.5 flex gap-2.5 sm:mt-0">
                {signs[answer]}
                <span className="min-w-0 flex-1">{t(`${pool}Answer`)}</span>
              </dd>
            </div>
          ))}
        </dl>
      </div>
    </section>
  );
}
