'use client';

import { useTranslations } from 'next-intl';
import { Segments } from '@/components/ui/segments';
import { poolFloors, poolShapes } from '@/lib/schemas/pool-size';
import type { SizeDraft } from './size-draft';

const pictures: Record<SizeDraft['shape'], React.ReactNode> = {
  rectangle: <rect x="2" y="4" width="38" height="18" />,
  oval: <ellipse cx="21" cy="13" rx="19" ry="9.5" />,
  round: <circle cx="21" cy="13" r="11" />,
  freeform: <path d="M2 14C2 7 7 4 13 4S18 8 22 8s4-3 9-3 9 4 9 9-4 8-9 8-7-1-10-1-5 1-9 1S2 20 2 14Z" />,
};

/** Which shape it is from above. */
export function ShapeChoice({
  value,
  onChange,
}: {
  value: SizeDraft['shape'];
  onChange: (shape: SizeDraft['shape']) => void;
}) {
  const t = useTranslations('pool.size.shape');
  return (
    <Segments
      hideLabel
      size="small"
      label={t('label')}
      choices={poolShapes.map((shape) => ({
        value: shape,
        label: t(shape),
        picture: (
          <svg
            width="42"
            height="26"
            viewBox="0 0 42 26"
            aria-hidden="true"
            className="mt-2 fill-none stroke-current"
            strokeWidth="1.6"
          >
            {pictures[shape]}
          </svg>
        ),
      }))}
      value={value}
      onChange={onChange}
    />
  );
}

export function FloorChoice({
  value,
  onChange,
}: {
  value: SizeDraft['floor'];
  onChange: (floor: SizeDraft['floor']) => void;
}) {
  const t = useTranslations('pool.size.floor');
  return (
    <Segments
      label={t('label')}
      choices={poolFloors.map((floor) => ({ value: floor, label: t(floor) }))}
      value={value}
      onChange={onChange}
    />
  );
}
