/** As many decimals as a figure has, up to four; else four significant figures: 48 is 48, 0.1 / 24 is 0.004167. */
export function fewestDecimals(value: number): number {
  for (let decimals = 0; decimals <= 4; decimals++) {
    const scaled = value * 10 ** decimals;
    if (Math.abs(scaled - Math.round(scaled)) < 1e-9 * Math.abs(scaled)) return decimals;
  }
  return value === 0 ? 0 : Math.max(0, 3 - Math.floor(Math.log10(Math.abs(value))));
}
