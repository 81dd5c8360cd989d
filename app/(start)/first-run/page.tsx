import { redirect } from 'next/navigation';
import { requireFirstRun } from '@/lib/auth/page-gate';
import { readPool } from '@/lib/services/read-pool';

/** Takes up the first run where it was left. */
export default async function FirstRunPage() {
  const visit = await requireFirstRun();
  const { nextStep } = await readPool(visit);
  redirect(`/first-run/${nextStep ?? 'label'}`);
}
