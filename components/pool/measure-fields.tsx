'use client';

import { useTranslations } from 'next-intl';
import { NumberTextField } from '@/components/ui/number-text-field';
import type { FieldProblems } from './field-problems';
import { type LengthField, lengthUnit, type SizeDraft } from './size-draft';

/** The field of each measure, and where the schema of the answers names its problem. */
const outlineFields: Record<SizeDraft['shape'], readonly (readonly [LengthField, string])[]> = {
  rectangle: [
    ['length', 'outline.length'],
    ['width', 'outline.width'],
  ],
  oval: [
    ['length', 'outline.length'],
    ['width', 'outline.width'],
  ],
  round: [['diameter', 'outline.diameter']],
  freeform: [
    ['length', 'outline.length'],
    ['width', 'outline.widthA'],
    ['secondWidth', 'outline.widthB'],
  ],
};
const floorFields: Record<'flat' | 'sloping', readonly (readonly [LengthField, string])[]> = {
  flat: [['depth', 'floor.depth']],
  sloping: [
    ['shallow', 'floor.shallow'],
    ['deep', 'floor.deep'],
  ],
};

/** Two to five tape measures, in metres or feet. */
export function MeasureFields({
  draft,
  change,
  problems,
}: {
  draft: SizeDraft;
  change: (part: Partial<SizeDraft>) => void;
  problems: FieldProblems;
}) {
  const t = useTranslations('pool.size.measure');
  const unitName = useTranslations('pool.unit.name');
  const fields = [...outlineFields[draft.shape], ...floorFields[draft.floor === 'flat' ? 'flat' : 'sloping']];
  return (
    <div className="grid grid-cols-2 gap-x-3 gap-y-2.5">
      {fields.map(([field, path]) => (
        <NumberTextField
          key={field}
          name={field}
          label={t(draft.shape === 'freeform' && field === 'width' ? 'firstWidth' : field)}
          value={draft[field]}
          onChange={(event) => change({ [field]: event.target.value })}
          unit={unitName(lengthUnit(draft.system))}
          problem={problems[path] ?? problems[field]}
        />
      ))}
    </div>
  );
}
