/** Rows of values by member, each as long as the week. */
export type Band = { p10: number[]; p50: number[]; p90: number[] };

/**
 * The 10th, 50th and 90th percentile over the members at each hour, at position p (n + 1) of the sorted values: for
 * members drawn like the truth, the truth then lies between the outer two in 80 % of cases whatever the size.
 *
 * @param rows one row of values for each member, all of one length
 */
export function bandOf(rows: readonly ArrayLike<number>[]): Band {
  const length = rows[0]?.length ?? 0;
  const band: Band = { p10: [], p50: [], p90: [] };
  const sorted = new Float64Array(rows.length);
  for (let hour = 0; hour < length; hour++) {
    rows.forEach((row, member) => (sorted[member] = row[hour]!));
    sorted.sort();
    band.p10.push(quantile(sorted, 0.1));
    band.p50.push(quantile(sorted, 0.5));
    band.p90.push(quantile(sorted, 0.9));
  }
  return band;
}

/** Quantile of sorted values at position p (n + 1), held at the ends. */
export function quantile(sorted: ArrayLike<number>, share: number): number {
  const position = Math.min(sorted.length, Math.max(1, share * (sorted.length + 1))) - 1;
  const below = Math.floor(position);
  const above = Math.min(sorted.length - 1, below + 1);
  return sorted[below]! + (position - below) * (sorted[above]! - sorted[below]!);
}
