import 'server-only';
import { setPersonLanguage } from '@/db/queries/people';
import type { Visit } from '@/lib/auth/visit';
import type { Done } from '@/lib/schemas/account';
import type { LanguageChoice } from '@/lib/schemas/language-choice';

/** Speaks another language: to this device, and on all of them to whoever is signed in on it. */
export async function chooseLanguage(visit: Visit, { language }: LanguageChoice): Promise<Done> {
  if (visit.signedIn) await setPersonLanguage(visit.db, visit.signedIn.personId, language);
  visit.speak(language);
  return { done: true };
}
