import { methods } from '@/lib/api/methods';
import { publicRoute } from '@/lib/api/routes';
import { doneSchema } from '@/lib/schemas/account';
import { languageChoiceSchema } from '@/lib/schemas/language-choice';
import { chooseLanguage } from '@/lib/services/choose-language';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  PUT: publicRoute({ input: languageChoiceSchema, reply: doneSchema, handle: chooseLanguage }),
});
