/** Widths on paper [px]: inside margins of 12 mm both A4 and Letter have 700. */
export const GUTTER = 70;
export const PLOT = 630;

/** Tops of the lanes [px], and how high they are in all. */
export const laneTop = { sun: 34, chlorine: 72, highLow: 226 } as const;
export const WHOLE = 258;
