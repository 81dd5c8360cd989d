/**
 * The curve of the drawing on the start page. It has no chemistry in it and no figures are ever shown from it: it only has
 * the shape that a week has. Height 0 is the lowest level, 1 the swim limit; hours run from Monday morning.
 */
export const weekHours = 168;
const sunrise = 6;
const sunset = 21;

/** Hours of the evening doses (Wednesday and Friday) and how far each lifts the line. */
export const drawnDoses = [
  { hour: 2 * 24 + 20, lift: 0.42 },
  { hour: 4 * 24 + 20, lift: 0.3 },
] as const;

/** The quick check before Saturday's swim narrows the range again. */
export const drawnCheck = 5 * 24 + 9;

const startHeight = 0.7;
const lossPerDay = 0.155;

export type DrawnPoint = { hour: number; height: number; low: number; high: number };

function sunAt(hour: number): number {
  const ofDay = hour % 24;
  if (ofDay <= sunrise || ofDay >= sunset) return 0;
  return Math.sin((Math.PI * (ofDay - sunrise)) / (sunset - sunrise));
}

/** Mean of `sunAt` over a day, so that a whole day loses `lossPerDay`. */
const meanSun = (2 / Math.PI) * ((sunset - sunrise) / 24);

export const drawnWeek: readonly DrawnPoint[] = drawWeek();

function drawWeek(): DrawnPoint[] {
  const points: DrawnPoint[] = [];
  let height = startHeight;
  for (let hour = 0; hour <= weekHours; hour += 1) {
    const sinceTest = hour < drawnCheck ? hour : hour - drawnCheck;
    const half = 0.07 + 0.016 * Math.sqrt(sinceTest);
    points.push({ hour, height, low: height - half, high: height + half });
    height -= (lossPerDay / 24) * (sunAt(hour + 0.5) / meanSun);
    for (const dose of drawnDoses) if (hour >= dose.hour && hour < dose.hour + 3) height += dose.lift / 3;
  }
  return points;
}

/** The drawing reaches this far above the swim limit and below the lowest level. */
const top = 1.7;
const bottom = -0.8;

/** Share of the width, in per cent. */
export const across = (hour: number) => round((hour / weekHours) * 100);

/** Share of the height, in per cent from the top. */
export const down = (height: number) => round(((top - height) / (top - bottom)) * 100);

export const lineOf = (points: readonly { hour: number; height: number }[]) =>
  `M${points.map(({ hour, height }) => `${across(hour)} ${down(height)}`).join('L')}`;

export const bandOf = (points: readonly DrawnPoint[]) => {
  const upper = points.map(({ hour, high }) => `${across(hour)} ${down(high)}`);
  const lower = [...points].reverse().map(({ hour, low }) => `${across(hour)} ${down(low)}`);
  return `M${[...upper, ...lower].join('L')}Z`;
};

function round(share: number): number {
  return Math.round(share * 100) / 100;
}
