import { weekDose } from '@/lib/projection/events';
import { pumpShares } from '@/lib/projection/pump';
import type { PlanContext } from './context';
import { type Choice, type Draft, sumOf } from './draft';
import type { FastOption } from './products';
import { type AddedTablets, hourOf, type QuickMember, quickWeek } from './quick-week';
import { remember } from './remember';

/** Free chlorine of a draft, laid out as in QuickWeek. The same memory at every call: read it before the next. */
export type QuickLevels = (draft: Draft) => Float64Array;

/**
 * Levels of drafts by the quick week. Tablets and the pump's longer run after fast doses are reckoned once for each count
 * and choice of evenings; amounts then cost one pass through the week.
 *
 * @param measureRises free chlorine that one measure adds on each evening [mg/L]
 */
export function quickLevels(
  context: PlanContext,
  { evenings, tablets }: Choice,
  members: readonly QuickMember[],
  probeCount: number,
  measureRises: (fast: FastOption) => readonly number[],
): QuickLevels {
  const { forcing, given, scenario, start } = context;
  const quick = quickWeek(context, members, probeCount);
  const hours = evenings.map(({ at }) => hourOf(at, forcing));
  const pump = pumpShares(forcing, given);
  const pumpedOn = evenings.map(({ at }) => {
    const small = weekDose(at, { substance: 'sodium-hypochlorite', amount: 1 }, scenario.pool.volume);
    return differences(pumpShares(forcing, [...given, small]), pump);
  });

  const loadsOf = ({ tablets: counts }: Draft): AddedTablets[] =>
    counts.flatMap((count, evening) => {
      if (count === 0 || !tablets) return [];
      const { tabletMass, strength } = tablets;
      return [{ load: { tabletMass, strength, count, erodedShare: 0 }, from: hours[evening]! }];
    });
  const inFeeder = start.loads.length > 0 || given.some(({ kind }) => kind === 'tablets');
  const sourceOf = remember(
    (draft: Draft) => {
      const shares = pump.slice();
      draft.measures.forEach((each, evening) => {
        if (each > 0) for (const { hour, by } of pumpedOn[evening]!) shares[hour]! += by;
      });
      return quick.sourceOf(loadsOf(draft), shares);
    },
    ({ tablets: counts, measures }) => {
      // Without tablets nothing hangs on the pump.
      if (sumOf(counts) === 0 && !inFeeder) return '';
      return counts.map((count, evening) => (measures[evening]! > 0 ? '+' : count)).join();
    },
  );

  const rises = new Float64Array(context.hours.length);
  const levels = new Float64Array(context.hours.length * members.length);
  return (draft) => {
    rises.fill(0);
    if (draft.fast) {
      const each = measureRises(draft.fast);
      for (let evening = 0; evening < hours.length; evening++)
        rises[hours[evening]!]! += draft.measures[evening]! * each[evening]!;
    }
    quick.run(rises, sourceOf(draft), sumOf(draft.tablets), levels);
    return levels;
  };
}

/** Where two series differ, and by how much. */
function differences(series: Float64Array, from: Float64Array): { hour: number; by: number }[] {
  return Array.from(series, (value, hour) => ({ hour, by: value - from[hour]! })).filter(({ by }) => by !== 0);
}
