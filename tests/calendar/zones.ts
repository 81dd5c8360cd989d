/** Seven zones that differ in what can go wrong: both hemispheres, half hours, no changes at all, a change at midnight. */
export const zones = [
  'America/New_York',
  'Europe/Madrid',
  'Australia/Sydney',
  'Australia/Lord_Howe',
  'Asia/Kathmandu',
  'America/Santiago',
  'Pacific/Auckland',
] as const;

const formats = new Map<string, Intl.DateTimeFormat>();

/** Local date and time by the runtime's own formatter: another road to the same answer. "2026-03-29 02:00:00" */
export function localByIntl(instant: number, timeZone: string): string {
  const format =
    formats.get(timeZone) ?? new Intl.DateTimeFormat('sv-SE', { timeZone, dateStyle: 'short', timeStyle: 'medium' });
  formats.set(timeZone, format);
  return format.format(instant);
}
