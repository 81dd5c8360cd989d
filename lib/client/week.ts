import { queryOptions } from '@tanstack/react-query';
import { fetchJson } from './fetch-json';

export const weekSheetReply = () => import('@/lib/schemas/week-sheet').then(({ weekSheetSchema }) => weekSheetSchema);

const MINUTE = 60_000;

export const weekKeys = {
  all: ['week'] as const,
  /** The week that begins on a day; without one, the week of now. */
  starting: (start: string | undefined) => [...weekKeys.all, start ?? 'now'] as const,
};

/**
 * The week sheet. Asked again every minute and whenever the page comes back into view: the swim verdict holds for the
 * moment it was worked out, and someone else may have ticked a dose meanwhile.
 */
export const weekSheet = (start: string | undefined) =>
  queryOptions({
    queryKey: weekKeys.starting(start),
    queryFn: ({ signal }) =>
      fetchJson(start === undefined ? '/api/week' : `/api/week?${new URLSearchParams({ start })}`, weekSheetReply, {
        signal,
      }),
    staleTime: MINUTE,
    refetchInterval: MINUTE,
    refetchOnWindowFocus: 'always',
  });
