import 'server-only';
import { answerIn } from '@/lib/messages/answers';
import { formerMember } from '@/lib/schemas/former-member';
import type { Language } from '@/lib/schemas/languages';

/** A person's name for whoever reads: somebody whose account is gone has none, and is called so in the reader's language. */
export function shownName<Name extends string | null>(name: Name, language: Language): Name | string {
  return name === formerMember ? answerIn(language, formerMember) : name;
}
