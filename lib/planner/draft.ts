import { type WeekDose, weekDose } from '@/lib/projection/events';
import type { PlanContext } from './context';
import type { Evening } from './evenings';
import type { FastOption, TabletOption } from './products';

/** One candidate: how many tablets on which evening, and how many measures of one fast product on each evening. */
export type Draft = {
  tablets: number;
  tabletEvening: number;
  fast: FastOption | null;
  measures: readonly number[];
};

/** What the drafts of a search may use: evenings, how many of them, and tablets. */
export type Choice = { evenings: readonly Evening[]; visits: number; tablets: TabletOption | null };

export function emptyDraft({ evenings }: Choice): Draft {
  return { tablets: 0, tabletEvening: 0, fast: null, measures: evenings.map(() => 0) };
}

/** Tells drafts apart. */
export function keyOf({ tablets, tabletEvening, fast, measures }: Draft): string {
  const evening = tablets > 0 ? tabletEvening : 0;
  return `${tablets} ${evening} ${fast?.product.id ?? ''} ${measures.join()}`;
}

/** The doses of a draft as the projection takes them, after what was given. */
export function weekDosesOf(draft: Draft, choice: Choice, context: PlanContext): WeekDose[] {
  const { volume } = context.scenario.pool;
  const doses: WeekDose[] = [...context.given];
  const { tablets } = choice;
  const { fast } = draft;
  if (draft.tablets > 0 && tablets) {
    const { tabletMass, strength } = tablets;
    const at = choice.evenings[draft.tabletEvening]!.at;
    doses.push({ at, kind: 'tablets', load: { tabletMass, strength, count: draft.tablets, erodedShare: 0 } });
  }
  draft.measures.forEach((measures, evening) => {
    if (measures === 0 || !fast) return;
    const { at } = choice.evenings[evening]!;
    doses.push(weekDose(at, fast.dose(measures * fast.measure, at), volume));
  });
  return doses;
}

export function fastEvenings(draft: Draft): number {
  return draft.measures.filter((measures) => measures > 0).length;
}

/** Measures beyond what the shelf holds of the fast product: they have to be bought. */
export function measuresToBuy({ fast, measures }: Draft): number {
  if (!fast) return 0;
  const held = Math.floor(fast.stock / fast.measure + 1e-9);
  return Math.max(0, measures.reduce((sum, each) => sum + each, 0) - held);
}

export function visitsOf(draft: Draft): number {
  return fastEvenings(draft) + (draft.tablets > 0 ? 1 : 0);
}
