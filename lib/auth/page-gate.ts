import 'server-only';
import { headers } from 'next/headers';
import { redirect } from 'next/navigation';
import { cache } from 'react';
import { chooseSessionHousehold } from '@/db/queries/sessions';
import { AppError } from '@/lib/errors';
import type { Language } from '@/lib/schemas/languages';
import { proveHousehold } from './household-access';
import { type HouseholdVisit, householdVisitOf, openVisit, type Visit } from './visit';

const openPage = cache(async () => openVisit(await headers()));

/** Who looks at a page that is about no household yet. */
export async function openPageVisit(): Promise<Visit> {
  return openPage();
}

/** What to speak on a page. */
export async function pageLanguage(): Promise<Language> {
  return (await openPage()).language;
}

/** What a page is about, looked up once however many parts of it ask; null when nobody is signed in. */
export const findHousehold = cache(async (): Promise<HouseholdVisit | null> => {
  const visit = await openPage();
  if (!visit.signedIn) return null;
  try {
    return await householdVisitOf(visit);
  } catch (error) {
    if (!(error instanceof AppError)) throw error;
  }
  // The membership this device looked at is over. A page only shows, and says which household it shows: any other will do.
  const { personId, sessionId } = visit.signedIn;
  const { db, now } = visit;
  try {
    const access = await proveHousehold(db, { personId, householdId: null, now });
    await chooseSessionHousehold(db, sessionId, access.householdId);
    return { db, now, access };
  } catch (error) {
    if (error instanceof AppError) return null;
    throw error;
  }
});

/** For pages of a household: sends away who is signed out, and an owner to the first run until it is finished. */
export async function requireHousehold(): Promise<HouseholdVisit> {
  const visit = await findHousehold();
  if (!visit) redirect('/sign-in');
  if (!visit.access.poolCompleted) redirect('/first-run');
  return visit;
}

/** For the first run: sends away who is signed out, and to the week sheet once it is finished. */
export async function requireFirstRun(): Promise<HouseholdVisit> {
  const visit = await findHousehold();
  if (!visit) redirect('/sign-in');
  if (visit.access.poolCompleted) redirect('/week');
  return visit;
}
