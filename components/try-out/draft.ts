import type { TriedSky } from '@/lib/client/try-it/skies';
import { skies } from '@/lib/client/try-it/skies';
import type { TryOutChanges } from '@/lib/schemas/try-out';
import { parseDecimal } from '@/lib/units/parse';

/** What somebody is trying, as it was typed and chosen. */
export type Draft = {
  /** The day that swimmers and sky are tried for; undefined for the first choice of the sheet. */
  day: string | undefined;
  swimmers: Readonly<Record<string, string>>;
  sky: Readonly<Record<string, TriedSky>>;
  tablets: string | undefined;
  /** The dose whose evening is being chosen. */
  moving: string | undefined;
  moves: Readonly<Record<string, string>>;
};

export const emptyDraft: Draft = {
  day: undefined,
  swimmers: {},
  sky: {},
  tablets: undefined,
  moving: undefined,
  moves: {},
};

/** As the sheet and its plan have it. */
export type DraftGround = {
  days: readonly { day: string; swimmerHours: number }[];
  /** Slow tablets that the plan still loads, and the most that it may. */
  tablets: number;
  mostTablets: number;
};

export const MOST_SWIMMER_HOURS = 1000;

/** Swimmer-hours as typed; undefined for what is no such number. */
export function swimmersOf(text: string): number | undefined {
  const value = parseDecimal(text);
  return value !== undefined && value >= 0 && value <= MOST_SWIMMER_HOURS ? value : undefined;
}

/** Tablets as typed: whole ones, and no more than the rules allow. */
export function tabletsOf(text: string, most: number): number | undefined {
  const value = parseDecimal(text);
  return value !== undefined && Number.isInteger(value) && value >= 0 && value <= most ? value : undefined;
}

/** What of a draft differs from the sheet; undefined while nothing does. What cannot be read changes nothing yet. */
export function changesOf(draft: Draft, { days, tablets, mostTablets }: DraftGround): TryOutChanges | undefined {
  const swimmers = days.flatMap(({ day, swimmerHours }) => {
    const tried = swimmersOf(draft.swimmers[day] ?? '');
    return tried === undefined || tried === swimmerHours ? [] : [{ day, swimmerHours: tried }];
  });
  const sky = days.flatMap(({ day }) => {
    const tried = draft.sky[day];
    return tried === undefined ? [] : [{ day, sky: skies[tried] }];
  });
  const count = draft.tablets === undefined ? undefined : tabletsOf(draft.tablets, mostTablets);
  const moves = Object.entries(draft.moves).map(([doseId, toDay]) => ({ doseId, toDay }));
  const changes = { swimmers, sky, tablets: count === undefined || count === tablets ? null : count, moves };
  return swimmers.length + sky.length + moves.length > 0 || changes.tablets !== null ? changes : undefined;
}

/** A record without one of its keys. */
export function without<Value>(record: Readonly<Record<string, Value>>, key: string): Record<string, Value> {
  return Object.fromEntries(Object.entries(record).filter(([each]) => each !== key));
}
