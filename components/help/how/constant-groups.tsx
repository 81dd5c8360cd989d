import { ChevronDown } from 'lucide-react';
import { useLocale, useTranslations } from 'next-intl';
import type { ListedConstant, ListedGroup } from '@/lib/client/worked-out/constants';
import { sourceIn } from '@/lib/messages/source-words';
import { formatNumber } from '@/lib/units/format';
import { fewestDecimals } from './fewest-decimals';
import { Typeset } from './typeset';

const MANY = 4;

/** Groups of constants, each figure with its source. `folded` closes the long ones; they open without any script. */
export function ConstantGroups({
  groups,
  heading: Heading,
  folded = false,
}: {
  groups: readonly ListedGroup[];
  /** What fits under the heading that the groups stand below. */
  heading: 'h2' | 'h3';
  folded?: boolean;
}) {
  const t = useTranslations('how-constants');
  return (
    <div>
      {groups.map((group) => (
        <details
          key={group.id}
          id={group.id}
          open={!folded || group.constants.length <= MANY}
          className="group border-t border-rule-2"
        >
          <summary className="flex min-h-13 cursor-pointer list-none items-center justify-between gap-3 [&::-webkit-details-marker]:hidden">
            <Heading className="font-display text-name">{t(`group.${group.id}`)}</Heading>
            <ChevronDown aria-hidden="true" className="size-5 shrink-0 text-ink-3 group-open:rotate-180" />
          </summary>
          <ul className="pb-2">
            {group.constants.map((constant) => (
              <ConstantRow key={constant.of} constant={constant} group={group} />
            ))}
          </ul>
        </details>
      ))}
    </div>
  );
}

function ConstantRow({ constant, group }: { constant: ListedConstant; group: ListedGroup }) {
  const t = useTranslations('how-constants');
  const locale = useLocale();
  const source = constant.source ?? group.source;
  const value = formatNumber(constant.value, { decimals: fewestDecimals(constant.value), locale });
  return (
    <li
      data-constant={constant.of}
      className="grid grid-cols-[minmax(0,1fr)_auto] gap-x-4 border-t border-rule py-2 text-body first:border-t-0 md:grid-cols-[minmax(0,1.2fr)_minmax(0,0.8fr)_minmax(0,1.6fr)]"
    >
      <span>
        {t(`name.${constant.name}`)}
        {constant.formula === undefined ? null : (
          <span className="block text-small text-ink-2">
            <Typeset notation={constant.formula} />
          </span>
        )}
      </span>
      <span className="font-emphasis">{t(`unit.${constant.unit}`, { value })}</span>
      <span className="col-span-2 text-small text-ink-2 md:col-span-1">
        {typeof source === 'string'
          ? t(`source.${source}`)
          : t('marked', { kind: t(`kind.${source.kind}`), text: sourceIn(locale, source.text) })}
      </span>
    </li>
  );
}
