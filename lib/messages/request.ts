import { getRequestConfig } from 'next-intl/server';
import { catalogue } from './catalogue';

/**
 * Words for a request. There is one language today, so no locale stands in any address. Times are told in the household's
 * own zone by lib/calendar; the zone here only keeps server and browser from disagreeing.
 */
export default getRequestConfig(async () => ({ locale: 'en', timeZone: 'UTC', messages: catalogue }));
