export type Age = { count: number; unit: 'minute' | 'hour' | 'day' };

/**
 * Time from one instant to another [ms] as a whole number and its unit, for words like "15 hours ago": minutes below an
 * hour, hours below two days, then days of 24 hours; always rounded down, never negative.
 */
export function ageOf(from: number, to: number): Age {
  const minutes = Math.max(0, Math.floor((to - from) / 60_000));
  if (minutes < 60) return { count: minutes, unit: 'minute' };
  const hours = Math.floor(minutes / 60);
  return hours < 48 ? { count: hours, unit: 'hour' } : { count: Math.floor(hours / 24), unit: 'day' };
}
