/** Multiples of the reference loop, by piece. */
export type Ratios = Readonly<Record<string, number>>;

/** A piece may cost so many times what was committed before the check fails. */
export const ALLOWED = 1.5;

export type Verdict = { name: string; passed: boolean; words: string };

/**
 * Compares what was measured with what is committed. A piece without a committed ratio fails, and so does a committed
 * ratio whose piece is gone: the file always stands for the pieces that are there.
 */
export function verdictsOn(measured: Ratios, committed: Ratios): Verdict[] {
  const names = [...new Set([...Object.keys(committed), ...Object.keys(measured)])];
  return names.map((name) => verdictOn(name, measured[name], committed[name]));
}

function verdictOn(name: string, measured: number | undefined, committed: number | undefined): Verdict {
  if (measured === undefined) return { name, passed: false, words: 'is committed and was not measured' };
  if (committed === undefined) return { name, passed: false, words: 'has no committed ratio' };
  const times = measured / committed;
  return { name, passed: times <= ALLOWED, words: `${times.toFixed(2)} times the committed ratio` };
}
