/** One cursor for all lanes of the week, and one for those of today. */
export const WEEK = 'week-sheet';
export const TODAY = 'today';
