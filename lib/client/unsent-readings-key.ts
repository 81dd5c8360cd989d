/** Whose tests they are: they were taken by one person for one household, and go nowhere else. */
export type ReadingOwner = { personId: string; householdId: string };

/** Under which name tests wait on this device. */
export function unsentReadingsKey({ personId, householdId }: ReadingOwner): string {
  return `wadewell.unsent-readings.${personId}.${householdId}`;
}

/** Whether anything waits, without the code that reads it. */
export function mayWait(owner: ReadingOwner): boolean {
  try {
    return window.localStorage.getItem(unsentReadingsKey(owner)) !== null;
  } catch {
    return false;
  }
}
