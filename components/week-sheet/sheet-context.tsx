'use client';

import { createContext, use, useMemo } from 'react';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { pictureOf, type SheetPicture } from './sheet-picture';

type Sheet = {
  sheet: WeekSheet;
  picture: SheetPicture;
  /** The first day of the week that was asked for; undefined for the week of now. */
  start: string | undefined;
  /** Paper hangs for days: nothing on it is "today". */
  onPaper: boolean;
};

const SheetContext = createContext<Sheet | undefined>(undefined);

/** Hands one reply, and what its lanes draw from, to every part of the page: they never disagree about now. */
export function SheetProvider({
  sheet,
  start,
  onPaper = false,
  children,
}: {
  sheet: WeekSheet;
  start: string | undefined;
  onPaper?: boolean;
  children: React.ReactNode;
}) {
  const value = useMemo(() => ({ sheet, picture: pictureOf(sheet), start, onPaper }), [sheet, start, onPaper]);
  return <SheetContext value={value}>{children}</SheetContext>;
}

export function useSheet(): Sheet {
  const value = use(SheetContext);
  if (value === undefined) throw new Error('A part of the week sheet stands outside SheetProvider.');
  return value;
}
