import type { Catalogue } from './catalogue';

declare module 'next-intl' {
  interface AppConfig {
    Locale: 'en';
    Messages: Catalogue;
  }
}
