import 'server-only';
import { randomUUID } from 'node:crypto';
import type { DatabaseOrTransaction } from '@/db/client';
import { insertOutgoingMail } from '@/db/queries/outgoing-mails';
import { environment } from '@/lib/env';
import { type Letter, writeMail } from '@/lib/mail/write-mail';
import type { Language } from '@/lib/schemas/languages';

/** Of whom a mail tells: it goes with them. */
type About = { householdId: string; subjectId: string } | { personId: string };

/** Whether mail leaves this server at all. */
export function sendsMail(): boolean {
  return environment().mail.way !== 'none';
}

/** Writes a mail that leaves once this transaction is through; nothing where no mail leaves. */
export async function queueMail(
  tx: DatabaseOrTransaction,
  {
    letter,
    email,
    language,
    now,
    about,
  }: { letter: Letter; email: string; language: Language; now: Date; about: About },
): Promise<void> {
  if (!sendsMail()) return;
  const id = randomUUID();
  await insertOutgoingMail(tx, {
    id,
    ...about,
    email,
    language,
    ...writeMail(letter, language),
    createdAt: now,
    nextTryAt: now,
  });
}
