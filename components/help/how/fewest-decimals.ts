/** As many decimals as a figure has, four significant ones at the most where it never ends: 48 is 48, 0.1 / 24 is 0.004167. */
export function fewestDecimals(value: number): number {
  for (let decimals = 0; decimals < 8; decimals++) {
    const scaled = value * 10 ** decimals;
    if (Math.abs(scaled - Math.round(scaled)) < 1e-7 * Math.max(1, Math.abs(scaled)) && isShort(value, decimals))
      return decimals;
  }
  return value === 0 ? 0 : Math.max(0, 3 - Math.floor(Math.log10(Math.abs(value))));
}

/** Whether writing it with so many decimals loses nothing. */
function isShort(value: number, decimals: number): boolean {
  return Math.abs(Math.round(value * 10 ** decimals) / 10 ** decimals - value) < 1e-9 * Math.max(1e-3, Math.abs(value));
}
