import { type Companion, companionsOf } from './companions/companion';
import type { CompanionNeed } from './companions/need';
import { contextOf } from './context';
import { byMedian } from './cost';
import { remember } from './remember';
import { sketchWeek, type WeekSketch } from './week-sketch';

/** How many sketches of the week are asked when a companion could go in, and for how many moments it is sketched anew. */
const SKETCHES_ASKED = 4;
const MOST_MOMENTS = 2;
/** A companion that takes an evening from chlorine and closes more of the swim hours than this waits for a better week. */
export const MOST_HOURS_LOST = 0.25;

export type CompanionWeek = {
  sketch: WeekSketch;
  companion: Companion | null;
  /** What the week needs and cannot have yet: no evening is left, chlorine needs them, or an earlier dose is untested. */
  waiting: CompanionNeed | null;
};

/**
 * The week with what goes in beside chlorine, at the moment that leaves chlorine the cheapest week; without it where that
 * would close the pool.
 */
export function companionWeek(alone: WeekSketch): CompanionWeek {
  const { sketches, choice, context, response } = alone;
  const contextWith = remember(
    ({ dose }: Companion) => contextOf(context.scenario, { companion: dose, wishes: context.wishes }),
    ({ planned }) => momentKey(planned),
  );
  // The pump runs for it, and may bring out more of the tablets than the water takes.
  const fits = (companion: Companion) => contextWith(companion).belowMaximumFrom <= companion.dose.at;

  const asked = sketches.best
    .slice(0, SKETCHES_ASKED)
    .map(({ draft }) => companionsOf(byMedian(draft, choice, context), alone));
  // What is needed is what the best of them needs; the others only say when else it could go in.
  const { needs } = asked[0]!;
  const isNeeded = ({ planned }: Companion) => needs.some(({ reason }) => reason === planned.reason);
  const without: CompanionWeek = { sketch: alone, companion: null, waiting: needs[0] ?? null };
  const moments = new Map<string, Companion>();
  for (const { companions } of asked) {
    if (moments.size === MOST_MOMENTS) break;
    const companion = companions.find((each) => isNeeded(each) && fits(each));
    if (companion && !moments.has(momentKey(companion.planned))) moments.set(momentKey(companion.planned), companion);
  }
  const openWithout = response.openShareOf(sketches.best[0]!.draft);
  const weeks = [...moments.values()]
    .map((companion) => ({ companion, sketch: sketchWeek(contextWith(companion), alone), waiting: null }))
    .filter(({ sketch }) => bestOf(sketch).open >= openWithout - MOST_HOURS_LOST)
    .sort((a, b) => bestOf(a.sketch).cost - bestOf(b.sketch).cost);
  return weeks[0] ?? without;
}

function bestOf({ sketches, response }: WeekSketch) {
  const { draft, cost } = sketches.best[0]!;
  return { cost, open: response.openShareOf(draft) };
}

function momentKey({ at, substance }: Companion['planned']): string {
  return `${at} ${substance}`;
}
