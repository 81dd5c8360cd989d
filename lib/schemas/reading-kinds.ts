/** Apart from the schema: a page that only names them need not bring what checks a reading. */
export const readingMethods = ['strip', 'drop-kit', 'slip'] as const;
export type ReadingMethod = (typeof readingMethods)[number];

export const readingKinds = ['full', 'quick'] as const;

/** What somebody saw beside the numbers; 'clear' when nothing was said. */
export const waterLooks = ['clear', 'cloudy', 'green'] as const;
