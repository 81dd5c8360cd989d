import { isKept, readKept } from '@/lib/client/device-store';
import { untilFetched } from '@/components/ui/until-fetched';
import type { ReadingHousehold } from './reading-setting';
import type { TestDraft } from './test-draft-schema';

type Owner = Pick<ReadingHousehold, 'personId' | 'householdId'>;

/** Under which name a test is kept on this device while it is written down. */
export function draftName({ personId, householdId }: Owner): string {
  return `wadewell.test.${personId}.${householdId}`;
}

/** The test that was begun on this device. What checks it comes with zod, and only where one was begun. */
export async function keptDraft(owner: Owner): Promise<TestDraft | undefined> {
  const name = draftName(owner);
  if (!isKept(name)) return undefined;
  const { testDraftSchema } = await untilFetched(() => import('./test-draft-schema'));
  return readKept(name, testDraftSchema);
}
