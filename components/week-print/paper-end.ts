/**
 * What ends a page: a check, or the plan itself. Doses that go in as the page says change nothing it says; one that is left
 * out ends it at its own hour, so the first of them before the end is told with it.
 */
export type PaperEnd = { at: number; why: 'quick' | 'full' | 'plan'; doseBefore: number | undefined };

type Ground = {
  planEndsAt: number;
  /** Tests that are asked for and not made, and doses of which nobody has said whether they went in [ms]. */
  checks: readonly { at: number; kind: 'quick' | 'full' }[];
  doses: readonly number[];
};

/** Until when a page on paper is good: to the first thing after which the sheet may say something else. */
export function paperEnd({ planEndsAt, checks, doses }: Ground): PaperEnd {
  const ends = checks.map(({ at, kind }) => ({ at, why: kind }));
  const first = [...ends, { at: planEndsAt, why: 'plan' as const }].reduce((a, b) => (b.at < a.at ? b : a));
  // At one instant a test comes before a dose, because it may do away with it.
  const before = doses.filter((at) => at < first.at);
  return { ...first, doseBefore: before.length === 0 ? undefined : Math.min(...before) };
}
