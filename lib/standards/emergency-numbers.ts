/** Places for which at least the emergency number is certain; `other` is everywhere else. */
export const emergencyCountries = ['US', 'CA', 'GB', 'EU', 'CH', 'AU', 'NZ', 'other'] as const;
export type EmergencyCountry = (typeof emergencyCountries)[number];

export type EmergencyNumbers = {
  /** Ambulance, fire and police; null where we do not know it and must not guess. */
  emergency: string | null;
  /** The line that advises on poisoning; null where it is regional or unknown: it stands on the label. */
  poison: string | null;
};

/**
 * Numbers to call when someone is hurt, by country.
 *
 * Found in public sources (reference/care-sources.md, A8): US poison help 1-800-222-1222, Australian poisons information
 * 13 11 26, Swiss poison line 145, and 112 as the emergency number of the European Union. From memory, each in use for
 * decades: 911 in the United States and Canada, 999 and the advice line 111 in the United Kingdom, 000 in Australia, 111
 * in New Zealand, 112 in Switzerland. A number that was neither is left out.
 */
const numbers: Record<EmergencyCountry, EmergencyNumbers> = {
  US: { emergency: '911', poison: '1-800-222-1222' },
  CA: { emergency: '911', poison: null },
  GB: { emergency: '999', poison: '111' },
  EU: { emergency: '112', poison: null },
  CH: { emergency: '112', poison: '145' },
  AU: { emergency: '000', poison: '13 11 26' },
  NZ: { emergency: '111', poison: null },
  other: { emergency: null, poison: null },
};

export function emergencyNumbers(country: EmergencyCountry): EmergencyNumbers {
  return numbers[country];
}

const euMembers = 'AT BE BG HR CY CZ DK EE FI FR DE GR HU IE IT LV LT LU MT NL PL PT RO SK SI ES SE'.split(' ');

/**
 * The country of a locale such as "en-US" or "de-CH".
 *
 * @param locale BCP 47 tag; without a region, or with one that is not listed, the answer is `other`: a wrong number is
 *   worse than none.
 */
export function emergencyCountryOf(locale: string): EmergencyCountry {
  const region = /^[a-z]{2,3}(?:-[a-z]{4})?-([a-z]{2})\b/i.exec(locale)?.[1]?.toUpperCase();
  if (region === undefined) return 'other';
  if (euMembers.includes(region)) return 'EU';
  return emergencyCountries.find((country) => country === region && country !== 'EU') ?? 'other';
}

/** Whether a text names one of the countries. */
export function isEmergencyCountry(text: string): text is EmergencyCountry {
  return emergencyCountries.some((country) => country === text);
}
