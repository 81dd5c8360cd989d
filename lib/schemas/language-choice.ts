import { z } from 'zod';
import { languages } from './languages';

export const languageChoiceSchema = z.strictObject({
  language: z.enum(languages, { error: 'Choose English or Spanish.' }),
});
export type LanguageChoice = z.output<typeof languageChoiceSchema>;
