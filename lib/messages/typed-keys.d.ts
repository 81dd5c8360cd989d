import type { Language } from '@/lib/schemas/languages';
import type { Catalogue } from './english';

declare module 'next-intl' {
  interface AppConfig {
    Locale: Language;
    Messages: Catalogue;
  }
}
