'use client';

import type { PoolSizeAnswer } from '@/lib/schemas/pool-size';
import { usePoolSetting } from './setting';
import { sizeDraftOf } from './size-draft';
import { SizeDrawing } from './size-drawing';

/** The drawing of a pool that was measured; nothing in it can be pulled. */
export function SavedDrawing({ size }: { size: PoolSizeAnswer }) {
  const { system, locale } = usePoolSetting();
  return <SizeDrawing draft={sizeDraftOf(size, system, locale)} words={undefined} whenNear />;
}
