import { type WeekDose, weekDose } from '@/lib/projection/events';
import type { PlanContext } from './context';
import type { Evening } from './evenings';
import type { FastOption, TabletOption } from './products';

/** One candidate: on each evening so many tablets to load, or so many measures of one fast product. */
export type Draft = { tablets: readonly number[]; fast: FastOption | null; measures: readonly number[] };

/** What the drafts of a search may use: evenings, how many of them, and tablets. */
export type Choice = { evenings: readonly Evening[]; visits: number; tablets: TabletOption | null };

export function emptyDraft({ evenings }: Choice): Draft {
  const none = evenings.map(() => 0);
  return { tablets: none, fast: null, measures: none };
}

/** Tells drafts apart. */
export function keyOf({ tablets, fast, measures }: Draft): string {
  return `${tablets.join()} ${fast?.product.id ?? ''} ${measures.join()}`;
}

/** The doses of a draft as the projection takes them, after what was given. */
export function weekDosesOf({ tablets, fast, measures }: Draft, choice: Choice, context: PlanContext): WeekDose[] {
  const { volume } = context.scenario.pool;
  const doses: WeekDose[] = [...context.given];
  choice.evenings.forEach(({ at }, evening) => {
    const count = tablets[evening]!;
    if (count > 0 && choice.tablets) doses.push(tabletDose(choice.tablets, count, at));
    if (measures[evening]! > 0 && fast)
      doses.push(weekDose(at, fast.dose(measures[evening]! * fast.measure, at), volume));
  });
  return doses;
}

/** New tablets that begin to erode at an instant [ms]. */
export function tabletDose({ tabletMass, strength }: TabletOption, count: number, at: number): WeekDose {
  return { at, kind: 'tablets', load: { tabletMass, strength, count, erodedShare: 0 } };
}

export function sumOf(counts: readonly number[]): number {
  let sum = 0;
  for (const count of counts) sum += count;
  return sum;
}

/** Measures beyond what the shelf holds of the fast product: they have to be bought. */
export function measuresToBuy({ fast, measures }: Draft): number {
  if (!fast) return 0;
  const held = Math.floor(fast.stock / fast.measure + 1e-9);
  return Math.max(0, sumOf(measures) - held);
}

/** Evenings on which something goes in. */
export function visitsOf({ tablets, measures }: Draft): number {
  let visits = 0;
  for (let evening = 0; evening < measures.length; evening++)
    if (measures[evening]! > 0 || tablets[evening]! > 0) visits++;
  return visits;
}
