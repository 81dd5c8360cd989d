import type { Weekday } from './household-day';

/**
 * Regions whose weeks do not begin on a Monday, from the week data of Unicode CLDR 48. A table and not the runtime's own
 * `Intl.Locale` week data: that is missing in some browsers and of different age in others, and the server and the
 * browser have to draw the same week.
 */
const otherThanMonday: readonly { first: Weekday; regions: ReadonlySet<string> }[] = [
  { first: 5, regions: new Set(['MV']) },
  {
    first: 6,
    regions: new Set(['AF', 'BH', 'DJ', 'DZ', 'EG', 'IQ', 'IR', 'JO', 'KW', 'LY', 'OM', 'QA', 'SD', 'SY']),
  },
  {
    first: 7,
    regions: new Set(
      (
        'AG AS BD BR BS BT BW BZ CA CO DM DO ET GT GU HK HN ID IL IN IS JM JP KE KH KR LA MH MM MO MT MX MZ NI NP PA PE PH ' +
        'PK PR PT PY SA SG SV TH TT TW UM US VE VI WS YE ZA ZW'
      ).split(' '),
    ),
  },
];

/** First day of the week where a locale is at home: 7 (Sunday) for 'en-US', 1 (Monday) for 'en-GB'; 'en' counts as 'en-US'. */
export function firstWeekday(locale: string): Weekday {
  const region = new Intl.Locale(locale).maximize().region ?? '';
  return otherThanMonday.find(({ regions }) => regions.has(region))?.first ?? 1;
}
