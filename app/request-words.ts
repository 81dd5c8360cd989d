import { getRequestConfig } from 'next-intl/server';
import { pageLanguage } from '@/lib/auth/page-gate';
import { catalogues } from '@/lib/messages/catalogue';

/**
 * Words for a page: in the language of who is signed in, else in that of the device, so that no language stands in any
 * address. Times are told in the household's own zone by lib/calendar; the zone here only keeps server and browser from
 * disagreeing.
 */
export default getRequestConfig(async () => {
  const locale = await pageLanguage();
  return { locale, timeZone: 'UTC', messages: catalogues[locale] };
});
