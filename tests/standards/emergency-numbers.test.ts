import { expect, it } from 'vitest';
import {
  emergencyCountries,
  emergencyCountryOf,
  emergencyNumbers,
  isEmergencyCountry,
} from '@/lib/standards/emergency-numbers';

// The first three as found in reference/care-sources.md, A8.
it.each([
  ['US', { emergency: '911', poison: '1-800-222-1222' }],
  ['AU', { emergency: '000', poison: '13 11 26' }],
  ['CH', { emergency: '112', poison: '145' }],
  ['EU', { emergency: '112', poison: null }],
  ['GB', { emergency: '999', poison: '111' }],
] as const)('knows whom to call in %s', (country, numbers) => {
  expect(emergencyNumbers(country)).toEqual(numbers);
});

it.each([
  ['en-US', 'US'],
  ['en-us', 'US'],
  ['de-CH', 'CH'],
  ['de-AT', 'EU'],
  ['zh-Hant-NZ', 'NZ'],
  ['en-US,en;q=0.9', 'US'],
  ['fr-CA,fr;q=0.8', 'CA'],
])('finds the country of %s', (locale, country) => {
  expect(emergencyCountryOf(locale)).toBe(country);
});

// A wrong number is worse than none.
it.each(['en', '', 'en-ZA', 'ja-JP', 'es-EU', 'de,en-US', '*', 'es-419'])(
  'does not guess a number for %j',
  (locale) => {
    expect(emergencyNumbers(emergencyCountryOf(locale))).toEqual({ emergency: null, poison: null });
  },
);

it('takes only its own countries from an address', () => {
  for (const country of emergencyCountries) expect(isEmergencyCountry(country)).toBe(true);
  expect(isEmergencyCountry('us')).toBe(false);
  expect(isEmergencyCountry('<b>')).toBe(false);
});
