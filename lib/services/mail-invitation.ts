import 'server-only';
import type { DatabaseOrTransaction, Transaction } from '@/db/client';
import { findHousehold } from '@/db/queries/households';
import { countHouseholdMails } from '@/db/queries/outgoing-mails';
import { findAccount } from '@/db/queries/people';
import { linkTo } from '@/lib/auth/link-token';
import { dayWithYear } from '@/lib/calendar/format';
import { dayOf } from '@/lib/calendar/household-day';
import { AppError } from '@/lib/errors';
import { languageOf } from '@/lib/schemas/languages';
import type { HouseholdPeople } from '@/lib/schemas/member';
import type { Role } from '@/lib/schemas/week-sheet';
import type { ServiceContext } from './context';
import { queueMail, sendsMail } from './queue-mail';

const DAY = 24 * 3_600_000;
/** Whoever could send mail to strangers without end would. */
const MOST_A_DAY = 20;

type Mailed = { id: string; name: string; email: string; role: Role; token: string; expiresAt: Date };

/**
 * Sends the link of an invitation in the household's language, and in the name of somebody who reads mail themselves.
 * Errors: `conflict`, with what to do instead.
 */
export async function mailInvitation(
  tx: Transaction,
  { access, now }: ServiceContext,
  { id, name, email, role, token, expiresAt }: Mailed,
): Promise<void> {
  const { householdId, householdName, personId, personName, timeZone } = access;
  const from = await invitationMailFrom(tx, personId);
  if (from === 'nowhere')
    throw new AppError('conflict', 'This server sends no mail. Make a link, and send it yourself.');
  if (from === 'after-confirmation')
    throw new AppError('conflict', 'Confirm your own address first, or make a link and send it yourself.');
  if ((await countHouseholdMails(tx, householdId, new Date(now.getTime() - DAY))) >= MOST_A_DAY)
    throw new AppError('conflict', 'So many mails have gone out today. Make a link, and send it yourself.');
  const locale = (await findHousehold(tx, householdId))?.locale ?? 'en';
  const day = dayWithYear(dayOf(expiresAt.getTime(), timeZone), locale);
  const letter = { about: 'invitation', name, inviter: personName, household: householdName, role, day } as const;
  await queueMail(tx, {
    letter: { ...letter, link: linkTo('invitation', token) },
    email,
    language: languageOf(locale),
    now,
    about: { householdId, subjectId: id },
  });
}

/** Whether an invitation of this person can go by mail. */
export async function invitationMailFrom(
  db: DatabaseOrTransaction,
  personId: string,
): Promise<HouseholdPeople['mailFrom']> {
  if (!sendsMail()) return 'nowhere';
  return (await findAccount(db, personId))?.emailConfirmedAt ? 'here' : 'after-confirmation';
}
