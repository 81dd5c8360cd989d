import type { NewReading } from '@/lib/schemas/reading';
import type { UnsentReading } from './checked-readings';
import { unsentLists } from './unsent';
import { type ReadingOwner, unsentReadingsKey } from './unsent-readings-key';

const { all, keep, forget, useAll } = unsentLists<UnsentReading>(
  () => import('./checked-readings').then(({ checkedReadings }) => checkedReadings),
  ({ reading }) => reading.id,
);

export function useUnsentReadings(owner: ReadingOwner): readonly UnsentReading[] {
  return useAll(unsentReadingsKey(owner));
}

export function unsentReadings(owner: ReadingOwner): readonly UnsentReading[] {
  return all(unsentReadingsKey(owner));
}

/** @returns whether the device took it */
export function keepReading(owner: ReadingOwner, reading: NewReading, refusal: string | null = null): Promise<boolean> {
  return keep(unsentReadingsKey(owner), { reading, refusal });
}

export function forgetReading(owner: ReadingOwner, id: string): Promise<void> {
  return forget(unsentReadingsKey(owner), id);
}
