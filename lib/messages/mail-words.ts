import { createTranslator } from 'next-intl';
import type { Language } from '@/lib/schemas/languages';
import { catalogues } from './catalogue';

/** The words of mail, outside of any request: it is sent in the language of whoever gets it. */
export function mailWords(language: Language) {
  return createTranslator({ locale: language, messages: catalogues[language], namespace: 'mail' });
}
