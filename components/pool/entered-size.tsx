'use client';

import { useTranslations } from 'next-intl';
import { NumberTextField } from '@/components/ui/number-text-field';
import { Segments } from '@/components/ui/segments';
import { volumeUnits } from '@/lib/schemas/pool-size';
import type { FieldProblems } from './field-problems';
import { confirmation, lengthUnit, type SizeDraft, unitQuestionOf } from './size-draft';
import { UnitQuestion } from './unit-question';

/** The volume as it stands on the builder's sheet, with its unit. */
export function EnteredSize({
  draft,
  change,
  problems,
}: {
  draft: SizeDraft;
  change: (part: Partial<SizeDraft>) => void;
  problems: FieldProblems;
}) {
  const t = useTranslations('pool.size');
  const unitName = useTranslations('pool.unit.name');
  const question = unitQuestionOf(draft);
  return (
    <div className="grid max-w-form gap-4 pt-3.5">
      <div>
        <NumberTextField
          label={t('volume')}
          name="volume"
          value={draft.volume}
          onChange={(event) => change({ volume: event.target.value })}
          problem={problems.volume}
        />
        <Segments
          className="mt-2.5"
          hideLabel
          label={t('unit')}
          choices={volumeUnits.map((unit) => ({ value: unit, label: unitName(unit) }))}
          value={draft.unit}
          onChange={(unit) => change({ unit })}
        />
        {question === undefined ? null : (
          <UnitQuestion
            question={question}
            value={question.value}
            typed={draft.volume}
            unit={draft.unit}
            onLikelier={(unit) => change({ unit, confirmed: confirmation(draft.volume, unit) })}
            onConfirm={() => change({ confirmed: confirmation(draft.volume, draft.unit) })}
          />
        )}
      </div>
      <Segments
        label={t('sure.question')}
        choices={[
          { value: 'known', label: t('sure.known') },
          { value: 'guessed', label: t('sure.guessed') },
        ]}
        value={draft.sure === null ? null : draft.sure ? 'known' : 'guessed'}
        onChange={(sure) => change({ sure: sure === 'known' })}
        hint={draft.sure === false ? t('sure.guessedNote') : t('sure.note')}
        problem={problems.sure}
      />
      <NumberTextField
        label={t('meanDepth')}
        aside={t('optional')}
        name="meanDepth"
        value={draft.meanDepth}
        onChange={(event) => change({ meanDepth: event.target.value })}
        unit={unitName(lengthUnit(draft.system))}
        hint={t('meanDepthNote')}
        problem={problems.meanDepth}
      />
    </div>
  );
}
