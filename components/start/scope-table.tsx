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
  all: <Check aria-hidden="true" className="size-5" />,
  part: <Minus aria-hidden="true" className="size-5" />,
  none: <X aria-hidden="true" className="size-5" />,
};

export const scopeAnchor = 'for-your-pool';

/** Which pools the sheet is for. The words answer; the sign before them only repeats it. */
export function ScopeTable() {
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
        <table className="mt-4 w-full border-collapse text-left text-body md:mt-0">
          <thead>
            <tr className="border-b border-ink text-small text-ink-2">
              <th scope="col" className="w-2/5 py-2 pr-4 font-text">
                {t('poolColumn')}
              </th>
              <th scope="col" className="py-2 font-text">
                {t('answerColumn')}
              </th>
            </tr>
          </thead>
          <tbody>
            {pools.map(({ pool, answer }) => (
              <tr key={pool} className="border-b border-rule align-top">
                <th scope="row" className="py-2.5 pr-4 font-strong">
                  {t(pool)}
                </th>
                <td className="py-2.5">
                  <span className="flex gap-2.5">
                    {signs[answer]}
                    <span className="min-w-0 flex-1">{t(`${pool}Answer`)}</span>
                  </span>
                </td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </section>
  );
}
