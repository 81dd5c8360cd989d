import 'server-only';
import type { StoredDose } from '@/db/queries/plan-doses';

const HOUR = 3_600_000;
/** Longer than the longest dose takes; after that nobody can be said to be adding it. */
const claimLastsFor = 2 * HOUR;

type Named = Pick<StoredDose, 'day' | 'substance' | 'form'> & { productId?: string | null | undefined };

/** Whether two plan versions mean one dose: the same product on the same day. */
export function isSameDose(a: Named, b: Named): boolean {
  const sameProduct = (a.productId ?? null) === (b.productId ?? null);
  return a.day === b.day && sameProduct && a.substance === b.substance && a.form === b.form;
}

/** Whether somebody says that they are adding it right now. */
export function claimLasts({ claimedAt }: Pick<StoredDose, 'claimedAt'>, now: Date): boolean {
  return claimedAt !== null && now.getTime() - claimedAt.getTime() < claimLastsFor;
}

/** Whether two people ticked it and nobody has measured free chlorine since: perhaps it went in twice. */
export function isDoubtful({ doubtfulAt }: Pick<StoredDose, 'doubtfulAt'>, chlorineTakenAt: Date | null): boolean {
  return doubtfulAt !== null && (chlorineTakenAt === null || doubtfulAt > chlorineTakenAt);
}

/** Whether it went into the water. */
export function wentIn({ status }: Pick<StoredDose, 'status'>): boolean {
  return status === 'given' || status === 'changed';
}
