import { dayOf } from '@/lib/calendar/household-day';
import type { PlanContext } from './context';
import { type Choice, type Draft, visitsOf } from './draft';
import { openEvenings } from './evenings';
import { type Options, optionsOf } from './products';
import { type Response, responseOf } from './response';
import { type Sketches, sketchesOf } from './sketch';

/** Sketches of a week's chlorine, and what they were drawn with. */
export type WeekSketch = {
  context: PlanContext;
  options: Options;
  choice: Choice;
  response: Response;
  sketches: Sketches;
};

/**
 * Sketches of a week's chlorine.
 *
 * @param alone those of the same week without what goes in beside chlorine: their drafts are what these start from, too
 */
export function sketchWeek(context: PlanContext, alone?: WeekSketch): WeekSketch {
  const options = optionsOf(context);
  const choice: Choice = {
    evenings: openEvenings(context),
    visits: Math.max(0, context.scenario.preferences.visits - visitsGiven(context)),
    tablets: options.tablets,
  };
  const response = responseOf(context, choice);
  const fast = options.fast.length > 0 ? options.fast : [null];
  const earlier = alone && draftsFor(choice, options, alone);
  return { context, options, choice, response, sketches: sketchesOf(response, { choice, fast }, earlier) };
}

/**
 * The drafts of another sketch of the same week, on the evenings that are left of it: what stood on one that is gone is left
 * out, and where the visits are fewer now, each way to leave one out.
 */
function draftsFor({ evenings, visits }: Choice, options: Options, { choice, sketches }: WeekSketch): Draft[] {
  const before = evenings.map(({ at }) => choice.evenings.findIndex((evening) => evening.at === at));
  const moved = (counts: readonly number[]) => before.map((evening) => counts[evening] ?? 0);
  return sketches.best.flatMap(({ draft: { tablets, fast, measures } }) => {
    const same = options.fast.find(({ product }) => product.id === fast?.product.id) ?? null;
    return within(visits, { tablets: moved(tablets), fast: same, measures: moved(measures) });
  });
}

/** A draft that keeps to the visits, or each that comes of leaving out as many as are too many. */
function within(visits: number, draft: Draft): Draft[] {
  if (visitsOf(draft) <= visits) return [draft];
  return draft.measures.flatMap((count, evening) => {
    if (count === 0 && draft.tablets[evening] === 0) return [];
    const without = (counts: readonly number[]) => counts.map((each, index) => (index === evening ? 0 : each));
    return within(visits, { ...draft, tablets: without(draft.tablets), measures: without(draft.measures) });
  });
}

/** Evenings already used: days since the reading on which something was given. */
function visitsGiven({ given, start, scenario }: PlanContext): number {
  const since = given.filter(({ at }) => at >= start.takenAt);
  return new Set(since.map(({ at }) => dayOf(at, scenario.pool.timeZone))).size;
}
