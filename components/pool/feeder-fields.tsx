'use client';

import { useTranslations } from 'next-intl';
import { NumberTextField } from '@/components/ui/number-text-field';
import { Segments } from '@/components/ui/segments';
import { Select } from '@/components/ui/select';
import { feederIngredients, feederKinds } from '@/lib/schemas/pool';
import type { FieldProblems } from './field-problems';
import { tabletUnit, type WaterDraft } from './water-draft';

/** Where slow tablets go, and what the label of that place says may go in. */
export function FeederFields({
  draft,
  change,
  problems,
}: {
  draft: WaterDraft;
  change: (part: Partial<WaterDraft>) => void;
  problems: FieldProblems;
}) {
  const t = useTranslations('pool.water.feeder');
  const ingredients = useTranslations('pool.ingredient');
  const units = useTranslations('units');
  return (
    <div className="grid gap-3.5">
      <Segments
        label={t('label')}
        choices={(['inline', 'floating', 'none'] as const satisfies readonly (typeof feederKinds)[number][]).map(
          (kind) => ({ value: kind, label: t(kind) }),
        )}
        value={draft.feederKind}
        onChange={(feederKind) => change({ feederKind })}
        hint={draft.feederKind === 'none' ? t('noneNote') : t('note')}
        problem={problems['feeder.kind']}
      />
      {draft.feederKind === null || draft.feederKind === 'none' ? null : (
        <>
          <Select
            label={t('ingredient')}
            name="feederIngredient"
            placeholder={t('choose')}
            options={feederIngredients.map((value) => ({ value, label: ingredients(`${value}.name`) }))}
            value={draft.ingredient}
            onChange={(ingredient) => change({ ingredient })}
            hint={t('ingredientNote')}
            problem={problems['feeder.ingredient']}
          />
          <div className="grid grid-cols-2 gap-x-3 gap-y-3.5 sm:grid-cols-3">
            <NumberTextField
              label={t('capacity')}
              name="feederCapacity"
              unit={t('tablets')}
              value={draft.capacity}
              onChange={(event) => change({ capacity: event.target.value })}
              problem={problems['feeder.capacity']}
            />
            <NumberTextField
              label={t('now')}
              name="feederTablets"
              unit={t('tablets')}
              value={draft.tablets}
              onChange={(event) => change({ tablets: event.target.value })}
              problem={problems['feeder.loaded']}
            />
            {draft.tablets.trim() === '' || draft.tablets.trim() === '0' ? null : (
              <NumberTextField
                label={t('mass')}
                name="feederTabletMass"
                unit={units(tabletUnit(draft.system), { value: '' }).trim()}
                value={draft.tabletMass}
                onChange={(event) => change({ tabletMass: event.target.value })}
              />
            )}
          </div>
        </>
      )}
    </div>
  );
}
