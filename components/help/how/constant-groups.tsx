import { useLocale, useTranslations } from 'next-intl';
import type { ListedConstant, ListedGroup } from '@/lib/client/worked-out/constants';
import { formatNumber } from '@/lib/units/format';
import { fewestDecimals } from './fewest-decimals';

/** Groups of constants, each figure with its source. */
export function ConstantGroups({ groups }: { groups: readonly ListedGroup[] }) {
  const t = useTranslations('how-constants');
  return (
    <div>
      {groups.map((group) => (
        <section key={group.id} aria-labelledby={group.id} className="border-t border-rule-2 py-3.5">
          <h3 id={group.id} className="font-display text-name">
            {t(`group.${group.id}`)}
          </h3>
          <ul className="mt-1">
            {group.constants.map((constant) => (
              <ConstantRow key={constant.of} constant={constant} group={group} />
            ))}
          </ul>
        </section>
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
          <span className="block font-display text-small text-ink-2">{constant.formula}</span>
        )}
      </span>
      <span className="font-emphasis">{t(`unit.${constant.unit}`, { value })}</span>
      <span className="col-span-2 text-small text-ink-2 md:col-span-1">
        {typeof source === 'string'
          ? t(`source.${source}`)
          : t('marked', { kind: t(`kind.${source.kind}`), text: source.text })}
      </span>
    </li>
  );
}
