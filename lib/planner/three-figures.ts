/** Rounded down to three figures: what a scale and a jug can tell. */
export function threeFigures(amount: number): number {
  if (!(amount > 0)) return 0;
  const step = 10 ** (Math.floor(Math.log10(amount)) - 2);
  // A step under 1 would print figures that no scale shows.
  return step < 1 ? Math.floor(amount + 1e-9) : Math.floor(amount / step + 1e-9) * step;
}
