import { z } from 'zod';
import { wallToInstant } from '@/lib/calendar/wall-time';
import { isTimeZone, zoneStretch } from '@/lib/calendar/zone-offset';
import { type ClearDay, clearDay, exposureOf, type HourSpan, spanOf, sunlitHours } from '@/lib/client/clear-day';
import { covers } from '@/lib/schemas/pool';
import type { SetupState } from '@/lib/schemas/pool-profile';
import { formatNumber } from '@/lib/units/format';
import { parseDecimal } from '@/lib/units/parse';

type SunAnswers = NonNullable<SetupState['profile']['sun']>;

export const sunDraftSchema = z.object({
  placeName: z.string(),
  latitude: z.string(),
  north: z.boolean(),
  longitude: z.string(),
  east: z.boolean(),
  timeZone: z.string(),
  /** As dragged; null while nobody has touched it. */
  span: z.object({ from: z.number(), to: z.number() }).nullable(),
  cover: z.enum(covers).nullable(),
  waterFeatures: z.boolean(),
});
export type SunDraft = z.infer<typeof sunDraftSchema>;

export function emptySun(timeZone: string): SunDraft {
  return {
    placeName: '',
    latitude: '',
    north: true,
    longitude: '',
    east: true,
    timeZone,
    span: null,
    cover: null,
    waterFeatures: false,
  };
}

export function sunDraftOf(sun: SunAnswers, locale: string): SunDraft {
  return {
    placeName: sun.placeName ?? '',
    ...placeText(sun.latitude, sun.longitude, locale),
    timeZone: sun.timeZone,
    span: null,
    cover: sun.cover,
    waterFeatures: sun.waterFeatures,
  };
}

/** A place to a tenth of a degree, about ten kilometres: never an address. */
export function placeText(latitude: number, longitude: number, locale: string) {
  const text = (degrees: number) => formatNumber(Math.abs(degrees), { decimals: 1, locale });
  return {
    latitude: text(latitude),
    north: latitude >= 0,
    longitude: text(longitude),
    east: longitude >= 0,
  };
}

/** Typed degrees to a tenth, negative in the south and west. */
function placeOf({ latitude, north, longitude, east }: SunDraft) {
  const degrees = (text: string, positive: boolean) => {
    const value = parseDecimal(text);
    return value === undefined ? undefined : (Math.round(value * 10) / 10) * (positive ? 1 : -1);
  };
  return { latitude: degrees(latitude, north), longitude: degrees(longitude, east) };
}

/** The clear day over this pool; undefined while its place is not known. */
export function clearDayOf(draft: SunDraft): ClearDay | undefined {
  const { latitude, longitude } = placeOf(draft);
  if (latitude === undefined || longitude === undefined || !isTimeZone(draft.timeZone)) return undefined;
  return Math.abs(latitude) > 90 || Math.abs(longitude) > 180
    ? undefined
    : clearDay(latitude, longitude, draft.timeZone);
}

/** The hours of sun as they stand in the picture: dragged, else what was saved, else the whole day. */
export function sunSpan(draft: SunDraft, day: ClearDay | undefined, saved: SunAnswers | null): HourSpan {
  if (draft.span) return draft.span;
  if (!day) return { from: 6, to: 21 };
  return saved ? spanOf(day, saved.sunExposure) : sunlitHours(day);
}

/** What the fields say, as the schema of the answers wants it. */
export function sunAnswersOf(draft: SunDraft, saved: SunAnswers | null): unknown {
  const day = clearDayOf(draft);
  const exposure = draft.span || !saved ? day && exposureOf(day, sunSpan(draft, day, saved)) : saved.sunExposure;
  const placeName = draft.placeName.trim();
  return {
    ...placeOf(draft),
    timeZone: draft.timeZone.trim(),
    sunExposure: exposure ?? 1,
    cover: draft.cover ?? undefined,
    waterFeatures: draft.waterFeatures,
    ...(placeName === '' ? {} : { placeName }),
  };
}

/** How far clocks may run from the sun [h]: behind it by an hour or two at most, ahead of it by three in the west of China. */
const clockFromSun = { least: -2, most: 3.5 };

/** Whether a place can lie in a time zone at all; 'flip' when it would on the other side of Greenwich. */
export function zoneFit(draft: SunDraft): 'fits' | 'flip' | 'off' {
  const { longitude } = placeOf(draft);
  if (longitude === undefined || !isTimeZone(draft.timeZone)) return 'fits';
  const offsets = (['2026-01-15', '2026-07-15'] as const).map(
    (day) => zoneStretch(wallToInstant(day, '12:00', draft.timeZone).instant, draft.timeZone).offset / 3_600_000,
  );
  const standard = Math.min(...offsets);
  const fits = (degrees: number) => {
    const ahead = standard - degrees / 15;
    return ahead >= clockFromSun.least && ahead <= clockFromSun.most;
  };
  if (fits(longitude)) return 'fits';
  return fits(-longitude) ? 'flip' : 'off';
}
